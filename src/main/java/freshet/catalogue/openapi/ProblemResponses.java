package freshet.catalogue.openapi;

import freshet.answer.FaultCode;
import freshet.http.problem.ProblemType;
import freshet.http.problem.Problems;
import io.swagger.v3.oas.models.media.Content;
import io.swagger.v3.oas.models.media.MediaType;
import io.swagger.v3.oas.models.media.Schema;
import io.swagger.v3.oas.models.responses.ApiResponse;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** The problems any calculation may answer with. */
final class ProblemResponses {

    private static final Map<Integer, ProblemType> STATUSES = new LinkedHashMap<>();

    static {
        for (int status : new int[] {400, 404, 405, 406, 413, 414, 415, 422, 431, 500, 503}) {
            STATUSES.put(status, ProblemType.ofStatus(status));
        }
    }

    private ProblemResponses() {}

    static Map<String, ApiResponse> all() {
        Map<String, ApiResponse> responses = new LinkedHashMap<>();
        STATUSES.forEach((status, type) -> responses.put("Problem" + status, response(type)));
        return responses;
    }

    static Map<String, ApiResponse> references() {
        Map<String, ApiResponse> references = new LinkedHashMap<>();
        STATUSES.keySet()
                .forEach(status -> references.put(
                        Integer.toString(status), new ApiResponse().$ref("#/components/responses/Problem" + status)));
        return references;
    }

    static void addSchemas(Map<String, Schema<?>> schemas) {
        schemas.put("Problem", problem());
        schemas.put("Fault", fault());
        schemas.put("Notice", notice());
    }

    private static ApiResponse response(ProblemType type) {
        return new ApiResponse()
                .description(type.title() + ". " + type.explanation())
                .content(new Content()
                        .addMediaType(Problems.MEDIA_TYPE, new MediaType().schema(Schemas.reference("Problem"))));
    }

    private static Schema<Object> problem() {
        Schema<Object> schema = Schemas.describe(
                Schemas.ofType("object"),
                "A problem after RFC 9457. The compact view has type, title, status, and field and code of the first"
                        + " fault with fault_count.");
        schema.addProperty("type", Schemas.text("Address of the explanation, for example /problems/invalid"));
        schema.addProperty("title", Schemas.text("One line"));
        schema.addProperty("status", Schemas.describe(Schemas.ofType("integer"), "HTTP status"));
        schema.addProperty("detail", Schemas.text("What is wrong with this request"));
        schema.addProperty("instance", Schemas.text("Path of the request"));
        schema.addProperty("errors", Schemas.describe(Schemas.listOf("Fault"), "Every fault of the inputs at once"));
        schema.addProperty("field", Schemas.text("Compact view: the first faulty input"));
        schema.addProperty("code", Schemas.text("Compact view: what is wrong with it"));
        schema.addProperty(
                "fault_count", Schemas.describe(Schemas.ofType("integer"), "Compact view: number of faults"));
        List.of("type", "title", "status").forEach(schema::addRequiredItem);
        return schema;
    }

    private static Schema<Object> fault() {
        Schema<Object> schema = Schemas.describe(Schemas.ofType("object"), "One thing wrong with a request");
        schema.addProperty("field", Schemas.text("The input, by the name the caller used"));
        schema.addProperty(
                "code",
                Schemas.choice(
                        Arrays.stream(FaultCode.values()).map(FaultCode::code).toList()));
        schema.addProperty("detail", Schemas.text("How to mend it"));
        schema.addProperty("pointer", Schemas.text("JSON pointer into the body"));
        schema.addProperty("minimum", Schemas.describe(Schemas.ofType("number"), "Least allowed value, in unit"));
        schema.addProperty("maximum", Schemas.describe(Schemas.ofType("number"), "Greatest allowed value, in unit"));
        schema.addProperty("unit", Schemas.text("UCUM unit of the bounds"));
        schema.addProperty(
                "allowed",
                Schemas.describe(Schemas.items(Schemas.ofType("array"), Schemas.ofType("string")), "Allowed"));
        schema.addProperty("nearest", Schemas.text("The nearest known name or value"));
        List.of("field", "code", "detail").forEach(schema::addRequiredItem);
        return schema;
    }

    private static Schema<Object> notice() {
        Schema<Object> schema =
                Schemas.describe(Schemas.ofType("object"), "Something the reader of an answer must know");
        schema.addProperty("code", Schemas.text("What it is"));
        schema.addProperty("field", Schemas.text("The input or output it speaks of"));
        schema.addProperty("detail", Schemas.text("One sentence"));
        List.of("code", "field", "detail").forEach(schema::addRequiredItem);
        return schema;
    }
}
