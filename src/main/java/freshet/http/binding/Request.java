package freshet.http.binding;

import freshet.answer.Fault;
import freshet.answer.Refusal;
import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * A request that was read without a fault.
 *
 * @param <T> the request record
 * @param inputs the inputs of the calculation
 * @param controls how the answer is wanted
 * @param fingerprint differs between inputs that differ; the same on every machine
 */
public record Request<T extends Record>(T inputs, Controls controls, long fingerprint) {

    /**
     * Reads inputs and controls from a query string.
     *
     * @throws Refusal with every fault
     */
    public static <T extends Record> Request<T> fromQuery(Shape<T> shape, @Nullable String query) {
        List<Fault> faults = new ArrayList<>(0);
        Draft<T> inputs = new Draft<>(shape, faults);
        Draft<Controls> controls = new Draft<>(Controls.SHAPE, faults);
        new QueryBinder(controls, inputs, faults).read(query);
        return finish(inputs, controls, faults);
    }

    /**
     * Reads inputs from a JSON object and controls from the query string.
     *
     * @throws Refusal with every fault
     * @throws UnreadableBody if the body is not one JSON object
     */
    public static <T extends Record> Request<T> fromJson(Shape<T> shape, byte[] body, @Nullable String query) {
        List<Fault> faults = new ArrayList<>(0);
        Draft<T> inputs = new Draft<>(shape, faults);
        Draft<Controls> controls = new Draft<>(Controls.SHAPE, faults);
        new QueryBinder(controls, null, faults).read(query);
        JsonBinder.read(body, inputs);
        return finish(inputs, controls, faults);
    }

    private static <T extends Record> Request<T> finish(Draft<T> inputs, Draft<Controls> controls, List<Fault> faults) {
        inputs.complete();
        controls.complete();
        if (!faults.isEmpty()) {
            throw new Refusal(faults);
        }
        return new Request<>(inputs.create(), controls.create(), inputs.fingerprint());
    }
}
