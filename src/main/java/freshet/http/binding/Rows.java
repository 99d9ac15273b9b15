package freshet.http.binding;

import freshet.answer.Refusal;
import freshet.http.media.Bytes;
import freshet.http.problem.ProblemException;
import java.io.IOException;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * The rows of a series, one after the other, as its body holds them.
 *
 * @param <T> the request record
 */
public interface Rows<T extends Record> {

    /** Longest row, in bytes. */
    int LONGEST_ROW = 16 * 1024;

    /** Names of what each row carries through to its answer. */
    List<String> carried();

    /**
     * Goes to the next row.
     *
     * @return false at the end
     * @throws Refusal if a row shows that the whole series cannot be answered
     * @throws UnreadableBody if there is no way to tell where the next row begins
     * @throws ProblemException if there are more rows than a body of this kind may hold
     */
    boolean next() throws IOException;

    /**
     * The inputs of the row.
     *
     * @throws Refusal with every fault of the row
     * @throws UnreadableBody if the row is not what its medium promises
     * @throws ProblemException if the row is too long
     */
    T inputs();

    /** Appends what the row carries under a name of {@link #carried()}, as a cell of a table. */
    void carryCell(int column, char separator, Bytes out);

    /** Appends the same as a JSON text; false, and nothing appended, if the row has none. */
    boolean carryText(int column, Bytes out);

    /** JSON pointer of the row; null if the body is not JSON. */
    @Nullable
    String pointer();
}
