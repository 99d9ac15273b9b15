package freshet.http.media;

import freshet.answer.Refusal;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;

/** What a response record declares, read once: its outputs in the order in which answers hold them. */
public final class Table {

    private final Column[] columns;
    private final Numbers numbers;

    private Table(Class<? extends Record> type) {
        columns = Arrays.stream(type.getRecordComponents())
                .map(ColumnReader::read)
                .toArray(Column[]::new);
        numbers = new Numbers(columns);
    }

    /**
     * Reads a response record.
     *
     * @throws IllegalStateException if an output says nothing of itself or is of an unknown kind
     */
    public static Table of(Class<? extends Record> type) {
        return new Table(type);
    }

    /** The outputs. */
    public List<Column> columns() {
        return List.of(columns);
    }

    /** The names of the outputs, and {@code more} after them. */
    public List<String> columnNames(List<String> more) {
        return Stream.concat(Arrays.stream(columns).map(Column::name), more.stream())
                .toList();
    }

    /** Whether every output is a single value. */
    public boolean flat() {
        return Arrays.stream(columns).allMatch(Column::single);
    }

    /**
     * Passes all values of {@code result} on to {@code sink}.
     *
     * @throws Refusal if a number is too large to be printed
     */
    void read(Record result, Sink sink) {
        double[] values = numbers.of(result);
        int next = 0;
        for (Column column : columns) {
            if (column.kind() == Column.Kind.NUMBER) {
                column.number(values[next++], sink);
            } else {
                column.read(result, sink);
            }
        }
    }
}
