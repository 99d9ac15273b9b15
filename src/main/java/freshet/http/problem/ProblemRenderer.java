package freshet.http.problem;

import freshet.answer.Fault;
import java.io.ByteArrayOutputStream;
import java.math.BigDecimal;
import java.util.OptionalDouble;
import tools.jackson.core.JsonGenerator;
import tools.jackson.core.ObjectWriteContext;
import tools.jackson.core.StreamWriteFeature;
import tools.jackson.core.json.JsonFactory;

/** The bytes of a problem; the only place that makes them. */
public final class ProblemRenderer {

    private static final int LONGEST_INSTANCE = 200;
    private static final int MOST_FAULTS = 100;
    private static final JsonFactory FACTORY = JsonFactory.builder()
            .enable(StreamWriteFeature.WRITE_BIGDECIMAL_AS_PLAIN)
            .build();

    private ProblemRenderer() {}

    /** A JSON object, a line feed at its end; {@code instance} is the path of the request. */
    public static byte[] render(Problem problem, String instance, boolean compact) {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream(512);
        try (JsonGenerator json = FACTORY.createGenerator(ObjectWriteContext.empty(), bytes)) {
            json.writeStartObject();
            json.writeStringProperty("type", "/problems/" + problem.type().id());
            json.writeStringProperty("title", problem.type().title());
            json.writeNumberProperty("status", problem.status());
            if (compact) {
                firstFault(problem, json);
            } else {
                whole(problem, instance, json);
            }
            json.writeEndObject();
            json.writeRaw('\n');
        }
        return bytes.toByteArray();
    }

    private static void firstFault(Problem problem, JsonGenerator json) {
        if (!problem.faults().isEmpty()) {
            json.writeStringProperty("field", problem.faults().get(0).field());
            json.writeStringProperty("code", problem.faults().get(0).code().code());
        }
        json.writeNumberProperty("fault_count", problem.faults().size());
    }

    private static void whole(Problem problem, String instance, JsonGenerator json) {
        json.writeStringProperty("detail", problem.detail());
        json.writeStringProperty("instance", instance.substring(0, Math.min(LONGEST_INSTANCE, instance.length())));
        if (problem.faults().isEmpty()) {
            return;
        }
        json.writeArrayPropertyStart("errors");
        for (int i = 0; i < Math.min(MOST_FAULTS, problem.faults().size()); i++) {
            String pointer =
                    problem.pointers().isEmpty() ? "" : problem.pointers().get(i);
            fault(problem.faults().get(i), pointer, json);
        }
        json.writeEndArray();
    }

    private static void fault(Fault fault, String pointer, JsonGenerator json) {
        json.writeStartObject();
        json.writeStringProperty("field", fault.field());
        json.writeStringProperty("code", fault.code().code());
        json.writeStringProperty("detail", fault.detail());
        if (!pointer.isEmpty()) {
            json.writeStringProperty("pointer", pointer);
        }
        bound("minimum", fault.minimum(), json);
        bound("maximum", fault.maximum(), json);
        fault.unit().ifPresent(unit -> json.writeStringProperty("unit", unit));
        if (!fault.allowed().isEmpty()) {
            json.writeArrayPropertyStart("allowed");
            fault.allowed().forEach(json::writeString);
            json.writeEndArray();
        }
        fault.nearest().ifPresent(name -> json.writeStringProperty("nearest", name));
        json.writeEndObject();
    }

    private static void bound(String name, OptionalDouble value, JsonGenerator json) {
        value.ifPresent(number ->
                json.writeNumberProperty(name, BigDecimal.valueOf(number).stripTrailingZeros()));
    }
}
