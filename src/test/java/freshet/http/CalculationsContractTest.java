package freshet.http;

import static io.restassured.RestAssured.given;
import static org.assertj.core.api.Assertions.assertThat;

import freshet.http.binding.Input;
import freshet.http.binding.Rule;
import freshet.http.binding.Spelling;
import freshet.http.media.Column;
import io.restassured.response.Response;
import io.restassured.specification.RequestSpecification;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Consumer;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.boot.test.web.server.LocalServerPort;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

/** What holds for every calculation, whatever it computes. */
@HttpTest
class CalculationsContractTest {

    private static final JsonMapper JSON = JsonMapper.builder().build();

    @LocalServerPort
    private int port;

    @Autowired
    private Calculations calculations;

    @Test
    void everyCalculationOfTheGroundFloorIsThere() {
        assertThat(calculations.all())
                .extracting(Calculation::path)
                .contains(
                        "ammonia/speciation",
                        "ammonia/limits",
                        "nitrite/speciation",
                        "nitrite/protection",
                        "nitrification/load",
                        "nitrification/capacity",
                        "nitrification/sizing",
                        "nitrification/demand",
                        "nitrate/accumulation",
                        "nitrate/trajectory",
                        "dilution/volume");
    }

    @TestFactory
    List<DynamicTest> getAndPostGiveTheSameBytes() {
        return each(calculation -> {
            Response get = get(calculation, example(calculation));
            Response post = post(calculation, body(calculation, example(calculation)));
            assertThat(get.statusCode()).as(get.asString()).isEqualTo(200);
            assertThat(post.asString()).isEqualTo(get.asString());
            assertThat(post.header("Cache-Control")).isEqualTo("no-store");
        });
    }

    @TestFactory
    List<DynamicTest> anAnswerIsWholeAndSaysHowItWasMade() {
        return each(calculation -> {
            Response response = get(calculation, example(calculation));
            String text = response.asString();
            assertThat(text).endsWith("}\n").doesNotContain("null", "NaN", "Infinity");
            assertThat(response.contentType()).isEqualTo("application/json");
            assertThat(response.header("Content-Length")).isEqualTo(Integer.toString(response.asByteArray().length));
            assertThat(response.header("Transfer-Encoding")).isNull();
            assertThat(response.header("Link"))
                    .contains(
                            "</v1/methods/" + JSON.readTree(text).get("method").asString() + ">; rel=\"describedby\"")
                    .contains("</openapi.yaml>; rel=\"service-desc\"");
            JsonNode answer = JSON.readTree(text);
            assertThat(answer.propertyNames()).contains("method", "method_version", "reference", "validity");
            assertThat(answer.get("reference").asString()).hasSizeBetween(3, 80);
        });
    }

    @TestFactory
    List<DynamicTest> keysStandInTheOrderOfTheResponseRecord() {
        return each(calculation -> {
            List<String> declared =
                    calculation.outputs().columns().stream().map(Column::name).toList();
            List<String> answered = List.copyOf(
                    JSON.readTree(get(calculation, example(calculation)).asString())
                            .propertyNames());
            List<String> outputs = answered.stream().filter(declared::contains).toList();
            assertThat(declared).containsSubsequence(outputs);
            assertThat(answered.subList(0, outputs.size())).isEqualTo(outputs);
        });
    }

    @TestFactory
    List<DynamicTest> anUnchangedAnswerIs304() {
        return each(calculation -> {
            String tag = get(calculation, example(calculation)).header("ETag");
            assertThat(tag).matches("\"[0-9a-f]{16}\"");
            Response again = to(calculation)
                    .header("If-None-Match", tag)
                    .queryParams(example(calculation))
                    .get(calculation.address());
            assertThat(again.statusCode()).isEqualTo(304);
            assertThat(again.asByteArray()).isEmpty();
            assertThat(again.header("ETag")).isEqualTo(tag);
            assertThat(again.header("Cache-Control")).isEqualTo("public, max-age=300");
            assertThat(again.header("Vary")).isEqualTo("Accept");
        });
    }

    @TestFactory
    List<DynamicTest> headHasTheHeadersOfGetAndNoBody() {
        return each(calculation -> {
            Response get = get(calculation, example(calculation));
            Response head = to(calculation).queryParams(example(calculation)).head(calculation.address());
            assertThat(head.asByteArray()).isEmpty();
            for (String header : List.of("Content-Length", "Content-Type", "ETag", "Cache-Control", "Vary", "Link")) {
                assertThat(head.header(header)).as(header).isEqualTo(get.header(header));
            }
        });
    }

    @TestFactory
    List<DynamicTest> theCompactViewIsSmallAndHasNoReference() {
        return each(calculation -> {
            Map<String, Object> query = example(calculation);
            query.put("view", "compact");
            Response response = get(calculation, query);
            JsonNode answer = JSON.readTree(response.asString());
            assertThat(answer.propertyNames()).doesNotContain("reference", "notices");
            assertThat(response.header("Link")).isNull();
            boolean scalar = calculation.outputs().columns().stream()
                    .allMatch(column -> column.rows().isEmpty());
            if (scalar) {
                assertThat(response.asByteArray()).hasSizeLessThanOrEqualTo(1024);
            }
        });
    }

    @TestFactory
    List<DynamicTest> eachMissingInputIsNamed() {
        return each(calculation -> {
            for (Input input : calculation.inputs().inputs()) {
                if (input.required()) {
                    Map<String, Object> query = example(calculation);
                    input.spellings().forEach(spelling -> query.remove(spelling.name()));
                    assertThat(faults(get(calculation, query), 422)).contains(input.name() + " missing");
                    assertThat(faults(post(calculation, body(calculation, query)), 422))
                            .contains(input.name() + " missing");
                }
            }
            assertThat(faults(get(calculation, Map.of()), 422)).isNotEmpty();
        });
    }

    @TestFactory
    List<DynamicTest> eachNumberIsHeldToItsBounds() {
        return each(calculation -> {
            for (Input input : calculation.inputs().inputs()) {
                if (input.numeric()) {
                    Spelling last = input.spellings().get(input.spellings().size() - 1);
                    assertThat(faults(with(calculation, input, last, input.maximum() * 1.01 + 1), 422))
                            .contains(last.name() + " above-maximum");
                    assertThat(faults(with(calculation, input, last, input.minimum() - 1), 422))
                            .contains(last.name() + " below-minimum");
                }
            }
        });
    }

    @TestFactory
    List<DynamicTest> whatIsNotANumberIsRefused() {
        return each(calculation -> {
            for (Input input : calculation.inputs().inputs()) {
                if (input.numeric()) {
                    for (String text : List.of("NaN", "Infinity", ".5", "+5", "7,5", "0x1p3", "five", "1e", "--1")) {
                        Map<String, Object> query = without(calculation, input);
                        query.put(input.name(), text);
                        assertThat(faults(get(calculation, query), 400)).contains(input.name() + " not-a-number");
                    }
                    Map<String, Object> query = without(calculation, input);
                    query.put(input.name(), "1e999");
                    assertThat(faults(get(calculation, query), 422)).contains(input.name() + " above-maximum");
                    query.put(input.name(), "");
                    assertThat(faults(get(calculation, query), 422)).contains(input.name() + " missing");
                }
            }
        });
    }

    @TestFactory
    List<DynamicTest> oneOfSeveralInputsIsAskedForAndNoMoreThanOneTaken() {
        return each(calculation -> {
            for (Rule rule : calculation.inputs().rules()) {
                Map<String, Object> none = example(calculation);
                rule.names().forEach(none::remove);
                if (rule.kind() == Rule.Kind.EXACTLY_ONE || rule.kind() == Rule.Kind.EXACTLY_TWO) {
                    assertThat(faults(get(calculation, none), 422)).anyMatch(fault -> fault.endsWith("one-required"));
                }
                if (rule.kind() != Rule.Kind.TOGETHER) {
                    Map<String, Object> all = new LinkedHashMap<>(none);
                    rule.names()
                            .forEach(name -> all.put(
                                    name, calculation.inputs().input(name).example()));
                    assertThat(faults(get(calculation, all), 422)).anyMatch(fault -> fault.endsWith("conflict"));
                }
            }
        });
    }

    @TestFactory
    List<DynamicTest> unknownAndRepeatedNamesAreRefused() {
        return each(calculation -> {
            Map<String, Object> query = example(calculation);
            String first = query.keySet().iterator().next();
            query.put(first + "x", "1");
            assertThat(faults(get(calculation, query), 400)).contains(first + "x unknown");
            assertThat(faults(
                            to(calculation)
                                    .urlEncodingEnabled(false)
                                    .get(calculation.address() + "?" + calculation.example() + "&"
                                            + calculation.example()),
                            400))
                    .contains(first + " repeated");
        });
    }

    private Response with(Calculation<?, ?> calculation, Input input, Spelling spelling, double canonical) {
        Map<String, Object> query = without(calculation, input);
        query.put(spelling.name(), Float.toString((float) spelling.given(canonical)));
        return get(calculation, query);
    }

    private static Map<String, Object> without(Calculation<?, ?> calculation, Input input) {
        Map<String, Object> query = example(calculation);
        input.spellings().forEach(spelling -> query.remove(spelling.name()));
        return query;
    }

    private List<DynamicTest> each(Consumer<Calculation<?, ?>> check) {
        return calculations.all().stream()
                .filter(calculation -> calculation.inputs().flat() && !calculation.readOnly())
                .map(calculation -> DynamicTest.dynamicTest(calculation.path(), () -> check.accept(calculation)))
                .toList();
    }

    private RequestSpecification to(Calculation<?, ?> calculation) {
        return given().port(port).accept("*/*");
    }

    private Response get(Calculation<?, ?> calculation, Map<String, Object> query) {
        return to(calculation).queryParams(query).get(calculation.address());
    }

    private Response post(Calculation<?, ?> calculation, String body) {
        return to(calculation).contentType("application/json").body(body).post(calculation.address());
    }

    private static List<String> faults(Response response, int status) {
        JsonNode problem = JSON.readTree(response.asString());
        assertThat(response.statusCode()).as(response.asString()).isEqualTo(status);
        assertThat(response.contentType()).isEqualTo("application/problem+json");
        assertThat(response.header("Cache-Control")).isEqualTo("no-store");
        List<String> faults = new ArrayList<>();
        problem.get("errors")
                .forEach(fault -> faults.add(
                        fault.get("field").asString() + " " + fault.get("code").asString()));
        return faults;
    }

    private static Map<String, Object> example(Calculation<?, ?> calculation) {
        Map<String, Object> query = new LinkedHashMap<>();
        for (String pair : calculation.example().split("&")) {
            query.put(pair.substring(0, pair.indexOf('=')), pair.substring(pair.indexOf('=') + 1));
        }
        return query;
    }

    private static String body(Calculation<?, ?> calculation, Map<String, Object> query) {
        List<String> members = new ArrayList<>();
        query.forEach((name, value) -> {
            boolean quoted = calculation.inputs().input(name).enumerated();
            members.add("\"" + name + "\":" + (quoted ? "\"" + value + "\"" : value));
        });
        return "{" + String.join(",", members) + "}";
    }
}
