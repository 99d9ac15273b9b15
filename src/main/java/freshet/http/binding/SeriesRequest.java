package freshet.http.binding;

import freshet.answer.Fault;
import freshet.answer.FaultCode;
import freshet.answer.Refusal;
import freshet.http.binding.SeriesControls.Format;
import java.io.IOException;
import java.io.InputStream;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.jspecify.annotations.Nullable;

/**
 * What the query of a series says.
 *
 * @param <T> the request record
 */
public final class SeriesRequest<T extends Record> {

    private final Draft<T> constants;
    private final SeriesControls controls;

    private SeriesRequest(Draft<T> constants, SeriesControls controls) {
        this.constants = constants;
        this.controls = controls;
    }

    /**
     * Reads values for all rows and controls from a query string.
     *
     * @throws Refusal with every fault
     */
    public static <T extends Record> SeriesRequest<T> fromQuery(Shape<T> shape, @Nullable String query) {
        List<Fault> faults = new ArrayList<>(0);
        Draft<T> constants = new Draft<>(shape, faults);
        Draft<SeriesControls> controls = new Draft<>(SeriesControls.SHAPE, faults);
        new QueryBinder(controls, constants, faults).read(query);
        return new SeriesRequest<>(constants, controls.finish());
    }

    /** How the answers are wanted. */
    public SeriesControls controls() {
        return controls;
    }

    /**
     * The rows of a body.
     *
     * @param results names of the columns of an answer
     * @throws Refusal if the series cannot be answered, whatever the rows hold
     * @throws UnreadableBody if the body does not begin as its medium promises
     */
    public Rows<T> rows(Format format, Set<String> results, InputStream body) throws IOException {
        if (controls.atomic() && format != Format.JSON) {
            throw new Refusal(
                    "atomic",
                    FaultCode.CONFLICT,
                    "Only a series in JSON is answered whole or not at all; others stream.");
        }
        return switch (format) {
            case JSON -> new JsonRows<>(constants, body);
            case CSV -> new CsvRows<>(constants, results, controls.decimalComma(), body);
            case NDJSON -> new NdjsonRows<>(constants, body);
        };
    }
}
