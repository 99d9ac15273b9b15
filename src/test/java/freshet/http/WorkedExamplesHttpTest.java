package freshet.http;

import static io.restassured.RestAssured.given;
import static org.assertj.core.api.Assertions.assertThat;

import java.io.InputStream;
import java.util.List;
import java.util.Objects;
import java.util.stream.StreamSupport;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import org.springframework.boot.test.web.server.LocalServerPort;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

/** Every worked example of the normative definitions comes back over HTTP. */
@HttpTest
class WorkedExamplesHttpTest {

    private static final JsonMapper JSON = JsonMapper.builder().build();
    private static final Percentage TOLERANCE = Percentage.withPercentage(2e-3);

    @LocalServerPort
    private int port;

    @TestFactory
    List<DynamicTest> everyWorkedExampleIsReproduced() {
        return StreamSupport.stream(examples().spliterator(), false)
                .map(example -> DynamicTest.dynamicTest(
                        example.get("path").asString() + " " + example.get("id").asString(), () -> check(example)))
                .toList();
    }

    @Test
    void noExampleIsLost() {
        assertThat(examples()).hasSize(36);
    }

    private void check(JsonNode example) {
        String text = given().port(port)
                .contentType("application/json")
                .body(example.get("in").toString())
                .post("/v1/" + example.get("path").asString())
                .asString();
        JsonNode answer = JSON.readTree(text);
        example.get("out").forEachEntry((name, expected) -> {
            assertThat(answer.has(name)).as(name + " in " + text).isTrue();
            if (expected.isNumber()) {
                assertThat(answer.get(name).asDouble()).as(name).isCloseTo(expected.asDouble(), TOLERANCE);
            } else {
                assertThat(answer.get(name)).as(name).isEqualTo(expected);
            }
        });
        assertThat(answer.findValuesAsString("code"))
                .containsAll(example.get("notices")
                        .valueStream()
                        .map(JsonNode::asString)
                        .toList());
    }

    private static JsonNode examples() {
        InputStream resource = WorkedExamplesHttpTest.class.getResourceAsStream("/definitions/worked-examples.json");
        return JSON.readTree(Objects.requireNonNull(resource)).get("examples");
    }
}
