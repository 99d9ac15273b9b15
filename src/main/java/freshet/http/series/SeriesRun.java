package freshet.http.series;

import freshet.answer.Answer;
import freshet.answer.Fault;
import freshet.answer.FaultCode;
import freshet.http.binding.Rows;
import freshet.http.media.Bytes;
import freshet.http.media.RowWriter;
import freshet.http.problem.Problem;
import freshet.http.problem.ProblemException;
import freshet.http.problem.ProblemType;
import freshet.http.problem.Problems;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import org.jspecify.annotations.Nullable;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;

/** One pass through the rows of a series; a bad row spoils nothing but itself. */
final class SeriesRun<I extends Record> {

    private static final Logger LOG = LoggerFactory.getLogger(SeriesRun.class);

    private final Rows<I> rows;
    private final Function<I, Answer<?>> step;
    private final RowWriter writer;
    private final SeriesOutput out;
    private final List<Fault> faults = new ArrayList<>();
    private final List<String> pointers = new ArrayList<>();
    private boolean failed;
    private long number;
    private long bad;

    SeriesRun(Rows<I> rows, Function<I, Answer<?>> step, RowWriter writer, SeriesOutput out) {
        this.rows = rows;
        this.step = step;
        this.writer = writer;
        this.out = out;
    }

    /**
     * Answers all rows.
     *
     * @param atomic whether one bad row refuses all of them
     * @throws ProblemException if it does
     */
    void run(boolean atomic) throws IOException {
        writer.start(rows.carried(), out.bytes());
        while (rows.next()) {
            number++;
            Problem problem = answer();
            if (problem != null && atomic) {
                collect(problem);
            } else if (problem != null) {
                writer.problem(rows, number, problem, out.bytes());
            }
            if (!atomic) {
                out.rowEnds();
            }
        }
        if (bad > 0) {
            throw new ProblemException(new Problem(
                    ProblemType.INVALID,
                    ProblemType.INVALID.status(),
                    bad + " of " + number + " rows are bad, so none is answered (atomic=true).",
                    faults,
                    pointers));
        }
        writer.end(out.bytes());
        out.end();
    }

    /** Answers the row, or tells why not. */
    private @Nullable Problem answer() {
        Bytes bytes = out.bytes();
        int before = bytes.length();
        try {
            writer.answer(rows, step.apply(rows.inputs()), bytes);
            return null;
        } catch (RuntimeException refused) {
            bytes.dropTo(before);
            Problem problem = Problems.of(refused, rows.pointer());
            if (problem.type() == ProblemType.INTERNAL && !failed) {
                LOG.error("Row {} of a series failed; further rows of it that do are not logged", number, refused);
                failed = true;
            }
            return problem;
        }
    }

    private void collect(Problem problem) {
        bad++;
        if (problem.faults().isEmpty()) {
            faults.add(new Fault("items", FaultCode.NOT_ALLOWED, problem.detail()));
            pointers.add(String.valueOf(rows.pointer()));
        }
        faults.addAll(problem.faults());
        pointers.addAll(problem.pointers());
    }
}
