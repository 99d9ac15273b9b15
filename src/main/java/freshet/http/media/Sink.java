package freshet.http.media;

import java.util.List;

/** Takes the outputs of one response record, in the order in which the record declares them. */
interface Sink {

    /** A quantity that does not exist here. */
    void absent(Column column);

    /** A number smaller than 1e15 in size. */
    void number(Column column, double value);

    /** A whole number, true or false, or one of an enumeration, as answers spell it. */
    void word(Column column, String value);

    /** Numbers, or lists of numbers. */
    default void numbers(Column column, List<?> values) {
        throw new IllegalStateException("Only flat answers are written so");
    }

    /** Further records. */
    void rows(Column column, List<? extends Record> records);
}
