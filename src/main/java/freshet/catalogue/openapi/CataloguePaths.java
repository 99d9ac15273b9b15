package freshet.catalogue.openapi;

import freshet.catalogue.CatalogueSchemas;
import io.swagger.v3.oas.models.Operation;
import io.swagger.v3.oas.models.PathItem;
import io.swagger.v3.oas.models.media.Content;
import io.swagger.v3.oas.models.media.MediaType;
import io.swagger.v3.oas.models.media.Schema;
import io.swagger.v3.oas.models.parameters.Parameter;
import io.swagger.v3.oas.models.responses.ApiResponse;
import io.swagger.v3.oas.models.responses.ApiResponses;
import java.util.Map;

/** The operations of the catalogue. */
final class CataloguePaths {

    static final String TAG = "catalogue";

    private CataloguePaths() {}

    static void add(Map<String, PathItem> paths, Map<String, Schema<?>> schemas) {
        schemas.putAll(CatalogueSchemas.all());
        paths.put(
                "/v1/methods",
                new PathItem()
                        .get(operation("listMethods", "Every published method", "Methods")
                                .addParametersItem(parameter("query", "calculation")
                                        .description("Only methods that this calculation uses")
                                        .example("ammonia/speciation"))));
        paths.put(
                "/v1/methods/{id}",
                new PathItem()
                        .get(identified(operation("getMethod", "One published method", "Method"), "emerson-1975")));
        paths.put(
                "/v1/constants",
                new PathItem().get(operation("getConstants", "Molar masses and conversion factors", "Constants")));
        paths.put("/problems", new PathItem().get(operation("listProblems", "Every kind of problem", "ProblemTypes")));
        paths.put(
                "/problems/{id}",
                new PathItem()
                        .get(identified(operation("getProblem", "One kind of problem", "ProblemType"), "invalid")));
    }

    private static Operation operation(String id, String summary, String schema) {
        ApiResponse ok = new ApiResponse()
                .description(summary)
                .content(new Content()
                        .addMediaType("application/json", new MediaType().schema(Schemas.reference(schema))));
        return new Operation()
                .operationId(id)
                .summary(summary)
                .addTagsItem(TAG)
                .description(summary + "; it changes with releases only.")
                .responses(new ApiResponses()
                        .addApiResponse("200", ok)
                        .addApiResponse("400", new ApiResponse().$ref("#/components/responses/Problem400"))
                        .addApiResponse("406", new ApiResponse().$ref("#/components/responses/Problem406")));
    }

    private static Operation identified(Operation operation, String example) {
        operation.getResponses().addApiResponse("404", new ApiResponse().$ref("#/components/responses/Problem404"));
        return operation.addParametersItem(
                parameter("path", "id").required(true).description("Its id").example(example));
    }

    private static Parameter parameter(String place, String name) {
        return new Parameter().in(place).name(name).schema(Schemas.ofType("string"));
    }
}
