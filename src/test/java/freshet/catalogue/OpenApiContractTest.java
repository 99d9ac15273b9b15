package freshet.catalogue;

import static io.restassured.RestAssured.given;
import static org.assertj.core.api.Assertions.assertThat;

import freshet.http.Calculation;
import freshet.http.Calculations;
import freshet.http.HttpTest;
import freshet.http.binding.Input;
import freshet.http.binding.Spelling;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import org.assertj.core.data.Offset;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.boot.test.web.server.LocalServerPort;
import org.springframework.web.servlet.mvc.method.annotation.RequestMappingHandlerMapping;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

/** The OpenAPI document says what the service does, and the file in the project is that document. */
@HttpTest
class OpenApiContractTest {

    private static final Path FILE = Path.of("openapi", "openapi.yaml");
    private static final JsonMapper JSON = JsonMapper.builder().build();
    private static final Set<String> UNDOCUMENTED =
            Set.of("/", "/error", "/openapi", "/openapi.yaml", "/openapi/swagger-config", "/docs", "/swagger-ui.html");

    @LocalServerPort
    private int port;

    @Autowired
    private Calculations calculations;

    @Autowired
    private RequestMappingHandlerMapping requestMappingHandlerMapping;

    private JsonNode document = JSON.nullNode();

    @BeforeEach
    void read() {
        document = JSON.readTree(given().port(port).get("/openapi.json").asString());
    }

    @Test
    void theFileInTheProjectIsTheDocument() throws IOException {
        String served = given().port(port).get("/openapi.yaml").asString();
        if (Boolean.getBoolean("freshet.openapi.write")) {
            Files.writeString(FILE, served);
        }
        assertThat(Files.readString(FILE))
                .as("openapi/openapi.yaml is out of date; renew it with:"
                        + " mvn test -Dtest=OpenApiContractTest -Dfreshet.openapi.write=true")
                .isEqualTo(served);
    }

    @Test
    void itIsOpenApi31AndNamesNoServerOfItsOwn() {
        assertThat(document.get("openapi").asString()).startsWith("3.1");
        assertThat(document.get("servers")).hasSize(1);
        assertThat(document.get("servers").get(0).get("url").asString()).isEqualTo("/");
    }

    @Test
    void everyRouteIsDocumentedAndEveryDocumentedRouteExists() {
        Set<String> served = new TreeSet<>();
        calculations.all().forEach(calculation -> {
            served.add(calculation.address());
            if (calculation.hasSeries()) {
                served.add(calculation.seriesAddress());
            }
        });
        requestMappingHandlerMapping
                .getHandlerMethods()
                .keySet()
                .forEach(mapping -> served.addAll(mapping.getPatternValues()));
        served.removeAll(UNDOCUMENTED);
        assertThat(document.get("paths").propertyNames()).containsExactlyInAnyOrderElementsOf(served);
    }

    @Test
    void everyOperationHasAnIdOfItsOwn() {
        List<String> ids = new ArrayList<>();
        document.get("paths")
                .forEach(path -> path.forEach(
                        operation -> ids.add(operation.get("operationId").asString())));
        assertThat(ids).doesNotHaveDuplicates().contains("computeAmmoniaSpeciation", "listMethods");
    }

    @Test
    void everySchemaHasANameAndNoneIsAChoice() {
        String text = document.toString();
        assertThat(text).doesNotContain("\"oneOf\"", "\"anyOf\"", "\"nullable\"", "\"null\"");
        assertThat(anonymousObjects(document.get("paths"))).isEmpty();
    }

    @Test
    void everyReferenceLeadsSomewhere() {
        Set<String> references = new HashSet<>();
        document.findValuesAsString("$ref").forEach(references::add);
        assertThat(references).isNotEmpty();
        references.forEach(
                reference -> assertThat(document.at(reference.substring(1)).isMissingNode())
                        .as(reference)
                        .isFalse());
    }

    @Test
    void namesUnitsAndBoundsAreThoseOfTheBinder() {
        for (Calculation<?, ?> calculation : calculations.all()) {
            JsonNode request = document.at("/components/schemas/" + calculation.noun() + "Request/properties");
            Set<String> documented = new HashSet<>(request.propertyNames());
            for (String group : calculation.inputs().groups().keySet()) {
                assertThat(documented.remove(group)).isTrue();
                group(calculation, group).propertyNames().forEach(name -> documented.add(group + "." + name));
            }
            assertThat(documented)
                    .containsExactlyInAnyOrderElementsOf(calculation.inputs().names());
            for (Input input : calculation.inputs().inputs()) {
                for (Spelling spelling : input.spellings()) {
                    int point = spelling.name().indexOf('.');
                    JsonNode property = point < 0
                            ? request.get(spelling.name())
                            : group(calculation, spelling.name().substring(0, point))
                                    .get(spelling.name().substring(point + 1));
                    assertThat(property.get("description").asString()).isNotBlank();
                    if (input.numeric()) {
                        assertThat(property.get("x-unit").asString())
                                .isEqualTo(spelling.unit().ucum());
                        assertThat(property.get("maximum").asDouble())
                                .isCloseTo(spelling.given(input.maximum()), within(spelling.given(input.maximum())));
                    }
                }
            }
        }
    }

    private JsonNode group(Calculation<?, ?> calculation, String group) {
        String schema = calculation.noun() + Character.toUpperCase(group.charAt(0)) + group.substring(1);
        return document.at("/components/schemas/" + schema + "/properties");
    }

    @Test
    void everyExampleWasReallyAnsweredSo() {
        for (Calculation<?, ?> calculation : calculations.all()) {
            if (calculation.readOnly()) {
                continue;
            }
            String path = "/paths/" + calculation.address().replace("/", "~1");
            JsonNode documented = document.at(path + "/post/responses/200/content/application~1json/example");
            String answered = given().port(port)
                    .contentType("application/json")
                    .body(document.at(path + "/post/requestBody/content/application~1json/example")
                            .toString())
                    .post(calculation.address())
                    .asString();
            assertThat(JSON.readTree(answered)).isEqualTo(documented);
            if (!calculation.inputs().flat()) {
                continue;
            }
            String query = given().port(port)
                    .urlEncodingEnabled(false)
                    .get(calculation.address() + "?" + query(document.at(path + "/get/parameters")))
                    .asString();
            assertThat(query).isEqualTo(answered);
        }
    }

    @Test
    void everyExampleOfASeriesWasReallyAnsweredSo() {
        for (Calculation<?, ?> calculation : calculations.all()) {
            if (calculation.hasSeries()) {
                String path = "/paths/" + calculation.seriesAddress().replace("/", "~1") + "/post";
                JsonNode body = document.at(path + "/requestBody/content/application~1json/example");
                String csv = document.at(path + "/requestBody/content/text~1csv/example")
                        .asString();
                JsonNode documented = document.at(path + "/responses/200/content/application~1json/example");
                assertThat(JSON.readTree(series(calculation, "application/json", body.toString())))
                        .isEqualTo(documented);
                assertThat(JSON.readTree(series(calculation, "text/csv", csv))).isEqualTo(documented);
            }
        }
    }

    private String series(Calculation<?, ?> calculation, String type, String body) {
        return given().port(port)
                .contentType(type)
                .accept("application/json")
                .body(body)
                .post(calculation.seriesAddress())
                .asString();
    }

    @Test
    void everyOperationNamesItsMethodsAndTheirReferences() {
        for (Calculation<?, ?> calculation : calculations.all()) {
            JsonNode operation = document.at(
                    "/paths/" + calculation.address().replace("/", "~1") + (calculation.readOnly() ? "/get" : "/post"));
            assertThat(calculation.methods()).isNotEmpty();
            calculation
                    .methods()
                    .forEach(method -> assertThat(operation.get("description").asString())
                            .contains(method.id())
                            .contains(method.citation().reference()));
            assertThat(operation.get("x-methods")).hasSameSizeAs(calculation.methods());
        }
    }

    @Test
    void theDocumentationWorksWithTheNetworkCutOff() {
        String page = given().port(port).get("/docs").asString()
                + given().port(port).get("/swagger-ui/swagger-initializer.js").asString();
        assertThat(page).contains("swagger-ui").doesNotContain("https://", "http://");
    }

    private static Offset<Double> within(double size) {
        return Offset.offset(Math.abs(size) * 1e-5);
    }

    private static String query(JsonNode parameters) {
        List<String> pairs = new ArrayList<>();
        parameters.forEach(parameter -> {
            if (parameter.has("example")) {
                pairs.add(parameter.get("name").asString() + "="
                        + parameter.get("example").asString());
            }
        });
        return String.join("&", pairs);
    }

    private static List<String> anonymousObjects(JsonNode node) {
        List<String> found = new ArrayList<>();
        if (node.has("schema") && node.get("schema").has("properties")) {
            found.add(node.toString());
        }
        node.forEach(child -> found.addAll(anonymousObjects(child)));
        return found;
    }
}
