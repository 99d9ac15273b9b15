package freshet.http;

import static io.restassured.RestAssured.given;
import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.containsString;
import static org.hamcrest.Matchers.equalTo;
import static org.hamcrest.Matchers.hasItems;
import static org.hamcrest.Matchers.nullValue;

import io.restassured.response.Response;
import io.restassured.response.ValidatableResponse;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.springframework.boot.test.web.server.LocalServerPort;

/** Bad requests get clear answers. */
@HttpTest
class ProblemHttpTest {

    private static final String PATH = "/v1/ammonia/speciation";

    @LocalServerPort
    private int port;

    @Test
    void allFaultsComeAtOnce() {
        get("tan_mg_per_l=7,5&phh=8.1&temperature_f=290&salinity=&method=emerson")
                .statusCode(400)
                .body("type", equalTo("/problems/unreadable"))
                .body("instance", equalTo(PATH))
                .body(
                        "errors.collect { it.field + ' ' + it.code }",
                        equalTo(List.of(
                                "tan_mg_per_l not-a-number",
                                "phh unknown",
                                "temperature_f above-maximum",
                                "salinity missing",
                                "method not-allowed",
                                "ph missing")))
                .body("errors[0].detail", containsString("write 7.5"))
                .body("errors[1].nearest", equalTo("ph"))
                .body("errors[2].detail", containsString("28.4 to 140 °F"))
                .body("errors[2].minimum", equalTo(-2))
                .body("errors[2].maximum", equalTo(60))
                .body("errors[2].unit", equalTo("Cel"))
                .body("errors[4].allowed", hasItems("emerson-1975", "yao-millero-1995"))
                .body("errors[4].nearest", equalTo("emerson-1975"));
    }

    @Test
    void whatWasReadAndRefusedIs422() {
        get("tan_mg_per_l=1&ph=14.5&temperature_c=20")
                .statusCode(422)
                .body("type", equalTo("/problems/invalid"))
                .body("errors[0].pointer", nullValue());
    }

    @Test
    void theCompactProblemFitsAController() {
        Response problem = given().port(port).get(PATH + "?view=compact&ph=14.5&temperature_c=-99");
        problem.then()
                .statusCode(422)
                .body("field", equalTo("ph"))
                .body("code", equalTo("above-maximum"))
                .body("fault_count", equalTo(3))
                .body("detail", nullValue());
        assertThat(problem.asByteArray()).hasSizeLessThanOrEqualTo(300);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "{\"ph\":NaN,\"tan_mg_per_l\":1,\"temperature_c\":20}|ph not-a-number",
                "{\"ph\":.5,\"tan_mg_per_l\":1,\"temperature_c\":20}|ph not-a-number",
                "{\"ph\":+5,\"tan_mg_per_l\":1,\"temperature_c\":20}|ph not-a-number",
                "{\"ph\":\"7\",\"tan_mg_per_l\":1,\"temperature_c\":20}|ph not-a-number",
                "{\"ph\":[7],\"tan_mg_per_l\":1,\"temperature_c\":20}|ph not-a-number",
                "{\"ph\":{\"a\":{}},\"tan_mg_per_l\":1,\"temperature_c\":20}|ph not-a-number",
                "{\"ph\":true,\"tan_mg_per_l\":1,\"temperature_c\":20}|ph not-a-number",
                "{\"ph\":7.00000000000000000000000000000000001,\"tan_mg_per_l\":1,\"temperature_c\":20}|ph not-a-number",
                "{\"ph\":7,\"ph\":7,\"tan_mg_per_l\":1,\"temperature_c\":20}|ph repeated",
                "{\"pH\":7,\"tan_mg_per_l\":1,\"temperature_c\":20}|pH unknown,ph missing",
                "{\"ph\":7,\"tan_mg_per_l\":1,\"temperature_c\":20,\"strict\":true}|strict unknown",
                "{\"ph\":7,\"tan_mg_per_l\":1,\"temperature_c\":20,\"__proto__\":{}}|__proto__ unknown",
            })
    void aBodyThatCannotBeReadIs400(String body, String faults) {
        post(body)
                .statusCode(400)
                .body("errors.collect { it.field + ' ' + it.code }.join(',')", equalTo(faults))
                .body("errors[0].pointer", equalTo("/" + faults.substring(0, faults.indexOf(' '))));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "{\"ph\":null,\"tan_mg_per_l\":1,\"temperature_c\":20}|ph missing",
                "{\"ph\":1e999,\"tan_mg_per_l\":1,\"temperature_c\":20}|ph above-maximum",
                "{\"ph\":7,\"tan_mg_per_l\":1,\"temperature_c\":20,\"temperature_f\":68}|temperature_f conflict",
                "{\"ph\":7,\"tan_mg_per_l\":1,\"temperature_c\":20,\"ph_scale\":\"NBS\"}|ph_scale not-allowed",
                "{\"ph\":7,\"tan_mg_per_l\":1,\"temperature_c\":20,\"method\":3}|method not-allowed",
                "{\"ph\":7,\"tan_mg_per_l\":1,\"temperature_c\":20,\"salinity\":null}|salinity missing",
            })
    void aBodyThatWasReadAndRefusedIs422(String body, String faults) {
        post(body).statusCode(422).body("errors.collect { it.field + ' ' + it.code }.join(',')", equalTo(faults));
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "null", "[]", "3", "\"x\"", "{", "{\"ph\":7,}", "{\"ph\":7} {}", "{'ph':7}", "\u0000"})
    void whatIsNotOneJsonObjectIs400(String body) {
        post(body).statusCode(400).body("type", equalTo("/problems/unreadable"));
    }

    @Test
    void deepNestingAndManyUnknownNamesAreSurvived() {
        post("{\"x\":" + "[".repeat(30_000) + "]".repeat(30_000) + "}").statusCode(400);
        StringBuilder body = new StringBuilder("{");
        for (int i = 0; i < 3000; i++) {
            body.append("\"name").append(i).append("\":").append(i).append(',');
        }
        post(body.append("\"ph\":7}").toString()).statusCode(400).body("errors.size()", equalTo(100));
    }

    @Test
    void inputsInTheQueryOfAPostAreRefused() {
        given().port(port)
                .contentType("application/json")
                .body("{\"ph\":7,\"tan_mg_per_l\":1,\"temperature_c\":20}")
                .post(PATH + "?salinity=3")
                .then()
                .statusCode(400)
                .body("errors[0].field", equalTo("salinity"))
                .body("errors[0].detail", containsString("body"));
    }

    @ParameterizedTest
    @ValueSource(strings = {"text/plain", "application/x-ndjson", "text/csv", "application/json;charset=latin1", "x"})
    void aBodyOfAnotherMediaTypeIs415(String type) {
        given().port(port)
                .header("Content-Type", type)
                .body("{}".getBytes())
                .post(PATH)
                .then()
                .statusCode(415)
                .contentType("application/problem+json");
    }

    @ParameterizedTest
    @CsvSource({
        "application/json, 200",
        "application/*, 200",
        "'text/html,*/*;q=0.1', 200",
        "'application/json;q=0', 406",
        "image/png, 406",
        "garbage, 406",
        "'', 200",
    })
    void theAcceptHeaderIsHeeded(String accept, int status) {
        given().port(port)
                .header("Accept", accept)
                .get(PATH + "?tan_mg_per_l=1&ph=7&temperature_c=20")
                .then()
                .statusCode(status);
    }

    @Test
    void anotherMethodIs405WithTheAllowedOnes() {
        for (String verb : List.of("PUT", "DELETE", "PATCH")) {
            given().port(port)
                    .request(verb, PATH)
                    .then()
                    .statusCode(405)
                    .header("Allow", "GET, HEAD, POST, OPTIONS")
                    .body("type", equalTo("/problems/method-not-allowed"));
        }
        given().port(port)
                .request("DELETE", "/v1/methods")
                .then()
                .statusCode(405)
                .header("Allow", containsString("GET"));
        given().port(port).options(PATH).then().statusCode(200).header("Allow", "GET, HEAD, POST, OPTIONS");
    }

    /** A bound told in another unit is rounded, and must be taken as it is told; -2 and 60 °C. */
    @Test
    void aBoundIsTakenAsItIsToldInAnotherUnit() {
        get("tan_mg_per_l=1&ph=8&temperature_f=28.4").statusCode(200);
        get("tan_mg_per_l=1&ph=8&temperature_f=140").statusCode(200);
        get("tan_mg_per_l=1&ph=8&temperature_f=28.39").statusCode(422);
        get("tan_mg_per_l=1&ph=8&temperature_c=60.0000001").statusCode(422);
    }

    @Test
    void anUnknownPathIs404() {
        for (String path : List.of("/v1", "/v1/", "/v1/ammonia", PATH + "/", PATH + "x", "/favicon.ico")) {
            given().port(port)
                    .accept("text/html")
                    .get(path)
                    .then()
                    .statusCode(404)
                    .contentType("application/problem+json");
        }
    }

    @Test
    void theRequestIdComesBackInAHeaderOnly() {
        Response response =
                given().port(port).header("X-Request-Id", "pump-house-7").get(PATH);
        assertThat(response.header("X-Request-Id")).isEqualTo("pump-house-7");
        assertThat(response.asString()).doesNotContain("pump-house-7");
        assertThat(given().port(port)
                        .header("X-Request-Id", "a b\"<script>")
                        .get(PATH)
                        .header("X-Request-Id"))
                .matches("[0-9a-f]{16}");
    }

    private ValidatableResponse get(String query) {
        return given().port(port)
                .urlEncodingEnabled(false)
                .get(PATH + "?" + query)
                .then();
    }

    private ValidatableResponse post(String body) {
        return given().port(port)
                .contentType("application/json")
                .body(body)
                .post(PATH)
                .then();
    }
}
