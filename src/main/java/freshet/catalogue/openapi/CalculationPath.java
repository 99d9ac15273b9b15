package freshet.catalogue.openapi;

import freshet.http.Calculation;
import freshet.http.binding.Controls;
import freshet.http.binding.Controls.Format;
import freshet.http.binding.Input;
import freshet.http.binding.Spelling;
import io.swagger.v3.oas.models.Operation;
import io.swagger.v3.oas.models.PathItem;
import io.swagger.v3.oas.models.headers.Header;
import io.swagger.v3.oas.models.media.Content;
import io.swagger.v3.oas.models.media.MediaType;
import io.swagger.v3.oas.models.parameters.Parameter;
import io.swagger.v3.oas.models.parameters.RequestBody;
import io.swagger.v3.oas.models.responses.ApiResponse;
import io.swagger.v3.oas.models.responses.ApiResponses;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;

/** The operations of a calculation. */
final class CalculationPath {

    private CalculationPath() {}

    static PathItem of(Calculation<?, ?> calculation) {
        Example example = Example.of(calculation);
        PathItem path = new PathItem();
        if (calculation.inputs().flat()) {
            path.get(get(calculation, example));
        }
        return calculation.readOnly() ? path : path.post(post(calculation, example));
    }

    private static Operation get(Calculation<?, ?> calculation, Example example) {
        Operation operation = operation(calculation, example).operationId("compute" + calculation.noun());
        for (Input input : calculation.inputs().inputs()) {
            for (Spelling spelling : input.spellings()) {
                operation.addParametersItem(
                        parameter(input, spelling, example.inputs().get(spelling.name())));
            }
        }
        CalculationSchemas.rules(calculation.inputs()).forEach(operation::addExtension);
        addControls(operation);
        operation
                .getResponses()
                .addApiResponse(
                        "304", new ApiResponse().description("Unchanged since the answer with this entity tag"));
        return operation;
    }

    private static Operation post(Calculation<?, ?> calculation, Example example) {
        Operation operation = operation(calculation, example).operationId("post" + calculation.noun());
        addControls(operation);
        MediaType body = new MediaType().schema(Schemas.reference(calculation.noun() + "Request"));
        body.setExample(example.inputs());
        return operation.requestBody(
                new RequestBody().required(true).content(new Content().addMediaType("application/json", body)));
    }

    private static Operation operation(Calculation<?, ?> calculation, Example example) {
        MediaType media = new MediaType().schema(Schemas.reference(calculation.noun() + "Response"));
        media.setExample(example.answer());
        ApiResponse ok = new ApiResponse()
                .description(calculation.summary())
                .content(content(calculation, media))
                .addHeaderObject("Link", header("The method (describedby) and this document (service-desc)"))
                .addHeaderObject("ETag", header("Strong entity tag; GET only"))
                .addHeaderObject("Cache-Control", header("public, max-age=300 for GET, no-store for POST"));
        ApiResponses responses = new ApiResponses().addApiResponse("200", ok);
        ProblemResponses.references().forEach(responses::addApiResponse);
        Operation operation = new Operation()
                .addTagsItem(OpenApiConfiguration.topic(calculation))
                .summary(calculation.summary())
                .description(description(calculation))
                .responses(responses);
        operation.addExtension(
                "x-methods",
                calculation.methods().stream()
                        .map(method -> Map.of(
                                "id",
                                method.id(),
                                "reference",
                                method.citation().reference()))
                        .map(TreeMap::new)
                        .toList());
        return operation;
    }

    private static Content content(Calculation<?, ?> calculation, MediaType json) {
        Content content = new Content();
        for (Format format : calculation.formats()) {
            content.addMediaType(
                    format.mediaType(),
                    format == Format.JSON ? json : new MediaType().schema(Schemas.ofType("string")));
        }
        return content;
    }

    private static String description(Calculation<?, ?> calculation) {
        String methods = calculation.methods().stream()
                .map(method -> "* `" + method.id() + "`: " + method.title() + ". "
                        + method.citation().reference())
                .collect(Collectors.joining("\n"));
        String rules = CalculationSchemas.rulesInWords(calculation.inputs());
        return calculation.cautions() + (rules.isEmpty() ? "" : "\n\n" + rules) + "\n\nMethods:\n\n" + methods;
    }

    static Parameter parameter(Input input, Spelling spelling, @Nullable Object example) {
        Parameter parameter = new Parameter()
                .in("query")
                .name(spelling.name())
                .required(CalculationSchemas.alwaysRequired(input) ? true : null)
                .schema(Schemas.of(input, spelling));
        parameter.setDescription(parameter.getSchema().getDescription());
        if (example != null) {
            parameter.setExample(example);
        }
        return parameter;
    }

    private static void addControls(Operation operation) {
        for (Input control : Controls.SHAPE.inputs()) {
            operation.addParametersItem(parameter(control, control.spellings().get(0), null));
        }
    }

    static Header header(String description) {
        return new Header().description(description).schema(Schemas.ofType("string"));
    }
}
