package freshet.catalogue.openapi;

import freshet.http.Calculation;
import freshet.http.binding.Input;
import freshet.http.binding.SeriesControls;
import freshet.http.binding.SeriesControls.Format;
import freshet.http.binding.Spelling;
import io.swagger.v3.oas.models.Operation;
import io.swagger.v3.oas.models.PathItem;
import io.swagger.v3.oas.models.media.Content;
import io.swagger.v3.oas.models.media.MediaType;
import io.swagger.v3.oas.models.media.Schema;
import io.swagger.v3.oas.models.parameters.RequestBody;
import io.swagger.v3.oas.models.responses.ApiResponse;
import io.swagger.v3.oas.models.responses.ApiResponses;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;

/** The series of a calculation. */
final class SeriesPath {

    private static final String DESCRIPTION = """
            One answer row for each input row, in order, in the medium of the body unless another is asked for. Inputs in \
            the query hold for all rows; one that rows give as well is refused. A bad row spoils no other: its answer is \
            an error.

            JSON: at most 10000 items, answered when all are read; `tag` comes back with the answer. CSV and NDJSON \
            stream: read answers while you send, there is no limit of rows, a row may have 16 KiB. CSV: every column is \
            carried through; a column that is nearly an input is refused; results follow, then `validity`, `notice_codes` \
            and `error` (`row 51; ph: not-a-number`, the first row after the header being 1). An empty cell is missing.""";

    private static final String TABLE = "A table after RFC 4180 with a header row";

    private SeriesPath() {}

    static PathItem of(Calculation<?, ?> calculation) {
        Example example = Example.of(calculation);
        Operation operation = new Operation()
                .operationId("compute" + calculation.noun() + "Series")
                .addTagsItem(OpenApiConfiguration.topic(calculation))
                .summary(calculation.summary() + ", row by row")
                .description(DESCRIPTION + "\n\n" + calculation.cautions())
                .requestBody(new RequestBody().required(true).content(request(calculation, example)))
                .responses(responses(calculation, example));
        for (Input control : SeriesControls.SHAPE.inputs()) {
            operation.addParametersItem(
                    CalculationPath.parameter(control, control.spellings().get(0), null));
        }
        for (Input input : calculation.inputs().inputs()) {
            for (Spelling spelling : input.spellings()) {
                operation.addParametersItem(
                        CalculationPath.parameter(input, spelling, null).required(null));
            }
        }
        return new PathItem().post(operation);
    }

    private static ApiResponses responses(Calculation<?, ?> calculation, Example example) {
        ApiResponse ok = new ApiResponse()
                .description("One row for each row")
                .content(content(calculation.noun() + "SeriesResponse", example.answer(), text(TABLE)))
                .addHeaderObject("Link", CalculationPath.header("The methods (describedby) and this document"))
                .addHeaderObject("Cache-Control", CalculationPath.header("no-store"));
        ApiResponses responses = new ApiResponses().addApiResponse("200", ok);
        ProblemResponses.references().forEach(responses::addApiResponse);
        return responses;
    }

    private static Content request(Calculation<?, ?> calculation, Example example) {
        MediaType table = text(TABLE);
        String header = String.join(",", example.inputs().keySet());
        String row = example.inputs().values().stream()
                .map(value -> String.valueOf(value).contains(",") ? "\"" + value + "\"" : String.valueOf(value))
                .collect(Collectors.joining(","));
        table.setExample(header + "\r\n" + row + "\r\n");
        return content(calculation.noun() + "SeriesRequest", example.inputs(), table);
    }

    private static Content content(String schema, Object item, MediaType table) {
        MediaType json = new MediaType().schema(Schemas.reference(schema));
        json.setExample(Map.of("items", List.of(item)));
        return new Content()
                .addMediaType(Format.JSON.mediaType(), json)
                .addMediaType(Format.CSV.mediaType(), table)
                .addMediaType(Format.NDJSON.mediaType(), text("Objects like the items, one on each line"));
    }

    private static MediaType text(String description) {
        return new MediaType().schema(Schemas.text(description));
    }

    /** The schemas it refers to. */
    static void addSchemas(Calculation<?, ?> calculation, Map<String, Schema<?>> schemas) {
        String noun = calculation.noun();
        Schema<Object> row = CalculationSchemas.request(calculation);
        row.setRequired(null);
        row.setDescription("One row; what the query gives for all rows is left out");
        row.addProperty("tag", Schemas.text("Comes back with the answer; at most 128 characters"));
        Schema<Object> answer = CalculationSchemas.response(calculation, schemas);
        answer.setRequired(null);
        answer.setDescription("The answer to one row, or the error that it has instead");
        answer.addProperty("tag", Schemas.text("The tag of the row"));
        answer.addProperty("error", Schemas.reference("Problem"));
        schemas.put(noun + "Item", row);
        schemas.put(noun + "ItemAnswer", answer);
        schemas.put(noun + "SeriesRequest", items(noun + "Item"));
        schemas.put(noun + "SeriesResponse", items(noun + "ItemAnswer"));
    }

    private static Schema<Object> items(String item) {
        Schema<Object> schema = Schemas.describe(Schemas.ofType("object"), "The rows, in order");
        schema.addProperty("items", Schemas.describe(Schemas.listOf(item), "One for each row"));
        schema.addRequiredItem("items");
        return schema;
    }
}
