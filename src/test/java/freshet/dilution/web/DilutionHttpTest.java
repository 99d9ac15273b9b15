package freshet.dilution.web;

import static io.restassured.RestAssured.given;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.hamcrest.Matchers.contains;
import static org.hamcrest.Matchers.equalTo;
import static org.hamcrest.Matchers.nullValue;

import freshet.http.HttpTest;
import io.restassured.response.Response;
import io.restassured.response.ValidatableResponse;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.springframework.boot.test.web.server.LocalServerPort;

/** The water for a change of concentration as a caller sees it. */
@HttpTest
class DilutionHttpTest {

    private static final String VOLUME = "/v1/dilution/volume?volume_l=1000&";
    private static final String DOWN = VOLUME + "concentration_mg_per_l=100&target_mg_per_l=25";
    private static final String UP = VOLUME + "concentration_mg_per_l=10&target_mg_per_l=20&source_mg_per_l=30";
    private static final String MET = VOLUME + "concentration_mg_per_l=20&target_mg_per_l=40&source_mg_per_l=5";

    @LocalServerPort
    private int port;

    @Test
    void theKeysStandInTheirOrder() {
        assertThat(get(DOWN + "&mode=staged&max_stage_percent=50&view=compact")
                        .extract()
                        .asString())
                .startsWith("{\"water_l\":1000,\"exchange_percent\":100,\"stages\":2,\"stage_l\":500,"
                        + "\"concentration_after_mg_per_l\":25,\"extra_water_percent\":33.3333,"
                        + "\"method\":\"dilution-staged\"");
        assertThat(get(DOWN + "&mode=continuous&flow_l_per_hour=100&view=compact")
                        .extract()
                        .asString())
                .startsWith("{\"water_l\":1386.29,\"exchange_percent\":138.629,\"flow_l_per_hour\":100,"
                        + "\"duration_hours\":13.8629,\"concentration_after_mg_per_l\":25,"
                        + "\"extra_water_percent\":84.8392,\"method\":\"dilution-continuous\"");
        assertThat(get(DOWN + "&view=compact").extract().asString())
                .startsWith("{\"water_l\":750,\"exchange_percent\":75,\"stages\":1,\"stage_l\":750,"
                        + "\"concentration_after_mg_per_l\":25,\"extra_water_percent\":0,"
                        + "\"method\":\"dilution-single\"");
    }

    @Test
    void flowAndDurationAreTwoSidesOfOneExchange() {
        double hours = get(DOWN + "&mode=continuous&flow_l_per_hour=100")
                .extract()
                .jsonPath()
                .getDouble("duration_hours");
        assertThat(get(DOWN + "&mode=continuous&duration_hours=" + hours)
                        .extract()
                        .jsonPath()
                        .getDouble("flow_l_per_hour"))
                .isCloseTo(100, within(1e-3));
    }

    @Test
    void aRicherSourceRaisesTheConcentration() {
        get(UP).body("water_l", equalTo(500)).body("concentration_after_mg_per_l", equalTo(20));
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "&mode=staged&max_stage_percent=20", "&mode=continuous&duration_hours=5"})
    void aTargetThatIsMetNeedsNothing(String mode) {
        get(MET + mode)
                .body("water_l", equalTo(0))
                .body("exchange_percent", equalTo(0))
                .body("stages", mode.contains("continuous") ? nullValue() : equalTo(0))
                .body("concentration_after_mg_per_l", equalTo(20))
                .body("extra_water_percent", nullValue())
                .body("notices.code", contains("target-already-met"));
    }

    @Test
    void aLargeExchangeAsksForALookAtTheMixture() {
        get(VOLUME + "concentration_mg_per_l=100&target_mg_per_l=90").body("notices", nullValue());
        get(VOLUME + "concentration_mg_per_l=100&target_mg_per_l=89").body("notices.code", contains("check-blend"));
    }

    @ParameterizedTest
    @CsvSource({
        "concentration_mg_per_l=50&target_mg_per_l=3&source_mg_per_l=5, 5, ",
        "concentration_mg_per_l=5&target_mg_per_l=3&source_mg_per_l=5, 5, ",
        "concentration_mg_per_l=5&target_mg_per_l=8&source_mg_per_l=5, 5, ",
        "concentration_mg_per_l=10&target_mg_per_l=40&source_mg_per_l=30, , 30",
        "concentration_mg_per_l=50&target_mg_per_l=5&source_mg_per_l=5&mode=staged&max_stage_percent=99, 5, ",
        "concentration_mg_per_l=50&target_mg_per_l=5&source_mg_per_l=5&mode=continuous&duration_hours=5, 5, ",
        "concentration_mg_per_l=10&target_mg_per_l=30&source_mg_per_l=30&mode=staged&max_stage_percent=99, , 30",
        "concentration_mg_per_l=10&target_mg_per_l=30&source_mg_per_l=30&mode=continuous&duration_hours=5, , 30",
    })
    void whatTheSourceCannotGiveIsRefusedWithItsBound(String query, Integer minimum, Integer maximum) {
        refused(VOLUME + query, "target_mg_per_l", "unreachable")
                .body("errors[0].minimum", equalTo(minimum))
                .body("errors[0].maximum", equalTo(maximum))
                .body("errors[0].unit", equalTo("mg/L"));
    }

    @Test
    void aFullReplacementGivesTheSourceItself() {
        String toSource = VOLUME + "concentration_mg_per_l=50&target_mg_per_l=5&source_mg_per_l=5";
        get(toSource).body("water_l", equalTo(1000));
        get(toSource + "&mode=staged&max_stage_percent=100")
                .body("stages", equalTo(1))
                .body("water_l", equalTo(1000));
    }

    @Test
    void eachModeAsksForItsOwnInputs() {
        refused(DOWN + "&mode=staged", "max_stage_percent", "missing");
        refused(DOWN + "&mode=continuous", "flow_l_per_hour", "one-required")
                .body("errors[0].allowed", equalTo(List.of("flow_l_per_hour", "duration_hours")));
        refused(DOWN + "&mode=continuous&flow_l_per_hour=5&duration_hours=5", "duration_hours", "conflict");
        refused(DOWN + "&mode=continuous&flow_l_per_hour=0", "flow_l_per_hour", "below-minimum");
    }

    @ParameterizedTest
    @ValueSource(strings = {"0", "4.9e-324", "1e-300", "0.00001"})
    void stagesTooSmallToEverEndAreRefused(String percent) {
        Response response = given().port(port).get(DOWN + "&mode=staged&max_stage_percent=" + percent);
        response.then()
                .statusCode(422)
                .body("errors[0].field", equalTo("max_stage_percent"))
                .body("errors[0].code", equalTo("below-minimum"));
        assertThat(response.asString()).doesNotContain("0.0 %", "E-");
    }

    @ParameterizedTest
    @CsvSource({
        "&max_stage_percent=20&flow_l_per_hour=5&duration_hours=5, max_stage_percent;flow_l_per_hour;duration_hours",
        "&mode=staged&max_stage_percent=50&flow_l_per_hour=5, flow_l_per_hour",
        "&mode=continuous&duration_hours=5&max_stage_percent=20, max_stage_percent",
    })
    void inputsOfAnotherModeAreNamed(String query, String fields) {
        List<String> named = get(DOWN + query)
                .extract()
                .path("notices.findAll { it.code == 'input-not-used' }.collect { it.field }");
        assertThat(named).containsExactly(fields.split(";"));
    }

    private ValidatableResponse get(String path) {
        return given().port(port).get(path).then().statusCode(200);
    }

    private ValidatableResponse refused(String path, String field, String code) {
        return given().port(port)
                .get(path)
                .then()
                .statusCode(422)
                .body("errors.size()", equalTo(1))
                .body("errors[0].field", equalTo(field))
                .body("errors[0].code", equalTo(code));
    }
}
