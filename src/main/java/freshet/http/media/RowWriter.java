package freshet.http.media;

import freshet.answer.Answer;
import freshet.answer.Refusal;
import freshet.http.binding.Rows;
import freshet.http.binding.SeriesControls;
import freshet.http.binding.SeriesControls.Format;
import freshet.http.problem.Problem;
import java.util.List;

/** Writes the answers of a series in one medium. */
public interface RowWriter {

    /** What stands before the rows. */
    void start(List<String> carried, Bytes out);

    /**
     * The answer to a row.
     *
     * @throws Refusal if a number is too large to be printed; then nothing but rubbish was appended
     */
    void answer(Rows<?> row, Answer<?> answer, Bytes out);

    /** Why a row, the first being 1, has no answer. */
    void problem(Rows<?> row, long number, Problem problem, Bytes out);

    /** What stands after the rows. */
    void end(Bytes out);

    /**
     * The writer of one series.
     *
     * @param format its medium
     * @param table the outputs of an answer
     * @param controls how the answers are wanted
     * @param path path of the request
     */
    static RowWriter of(Format format, Table table, SeriesControls controls, String path) {
        return switch (format) {
            case CSV -> new CsvRowWriter(table, controls.decimalComma());
            case JSON -> new JsonRowWriter(table, controls.compact(), path, true);
            case NDJSON -> new JsonRowWriter(table, controls.compact(), path, false);
        };
    }
}
