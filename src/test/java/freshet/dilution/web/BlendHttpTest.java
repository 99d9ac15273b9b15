package freshet.dilution.web;

import static io.restassured.RestAssured.given;
import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.closeTo;
import static org.hamcrest.Matchers.contains;
import static org.hamcrest.Matchers.equalTo;
import static org.hamcrest.Matchers.hasItem;
import static org.hamcrest.Matchers.hasItems;
import static org.hamcrest.Matchers.hasKey;
import static org.hamcrest.Matchers.not;

import freshet.http.HttpTest;
import io.restassured.response.ValidatableResponse;
import org.junit.jupiter.api.Test;
import org.springframework.boot.test.web.server.LocalServerPort;

@HttpTest
class BlendHttpTest {

    private static final String TANK =
            "\"volume_l\":7000,\"temperature_c\":26,\"ph\":7.0,\"alkalinity_mg_per_l_as_caco3\":60";
    private static final String SOURCE =
            "\"volume_l\":3000,\"temperature_c\":24,\"ph\":7.0,\"alkalinity_mg_per_l_as_caco3\":60";

    @LocalServerPort
    private int port;

    @Test
    void chlorineIsCountedAndWarnedOfFirst() {
        blend(
                        TANK + ",\"tan_mg_per_l\":1",
                        SOURCE
                                + ",\"tan_mg_per_l\":0,\"chlorine_mg_per_l_as_cl2\":0.5,\"chloramine_mg_per_l_as_cl2\":1",
                        "")
                .statusCode(200)
                .body("largest_safe_exchange_percent", equalTo(0))
                .body("$", not(hasKey("limited_by")))
                .body("notices[0].code", equalTo("chlorine-in-source"))
                .body("notices[1].code", equalTo("chloramine-frees-ammonia"))
                // 7 x 1.2 x 1.5 mg/L x 3 m3
                .body("thiosulfate_pentahydrate_g.toDouble()", closeTo(37.8, 1e-9))
                // 0.7 of 1 mg/L and 0.3 of 0.19754 mg/L, by mass
                .body("tan_mg_per_l.toDouble()", closeTo(0.7593, 1e-4));
    }

    @Test
    void chlorineInTheTankIsWarnedOf() {
        blend(TANK + ",\"chlorine_mg_per_l_as_cl2\":0.5", SOURCE, "")
                .body("notices[0].code", equalTo("chlorine-in-tank"));
    }

    @Test
    void aLimitThatIsStillOversteppedIsTold() {
        String tan = ",\"tan_mg_per_l\":";
        blend(TANK + tan + 20, SOURCE + tan + 0, ",\"nh3_n_limit_mg_per_l\":0.001")
                .body("notices.code", hasItem("nh3-above-limit"));
        blend(TANK + tan + 0.01, SOURCE + tan + 0, ",\"nh3_n_limit_mg_per_l\":0.1")
                .body("notices.code", not(hasItem("nh3-above-limit")));
    }

    @Test
    void whatOneWaterDoesNotNameIsNotMixedAndNamed() {
        blend(TANK + ",\"no3_n_mg_per_l\":40,\"calcium_mg_per_l\":30", SOURCE + ",\"calcium_mg_per_l\":60", "")
                .statusCode(200)
                .body("$", not(hasItem("no3_n_mg_per_l")))
                .body("calcium_mg_per_l.toDouble()", closeTo(39.0, 0.01))
                .body("keySet()", not(hasItems("nh3_n_mg_per_l", "tan_mg_per_l", "no3_n_mg_per_l")))
                .body(
                        "notices.find { it.code == 'not-mixed' }.detail",
                        equalTo(
                                "Not given for both waters, so not mixed, and NH3 not judged: tan_mg_per_l, no3_n_mg_per_l."));
    }

    @Test
    void drainedWaterIsTakenOffTheTank() {
        blend(TANK, SOURCE, ",\"drained_l\":3000")
                .statusCode(200)
                .body("exchange_percent.toDouble()", closeTo(100 * 3.0 / 7, 1e-3));
        blend(TANK, SOURCE, ",\"drained_l\":7000")
                .statusCode(422)
                .body("errors.field", contains("drained_l"))
                .body("errors.code", contains("inconsistent"));
    }

    @Test
    void temperatureCanLimitTheExchange() {
        blend(TANK, SOURCE.replace("24", "10"), "")
                .statusCode(200)
                .body("limited_by", equalTo("temperature"))
                .body("largest_safe_exchange_percent.toDouble()", closeTo(12.5, 0.1))
                .body("notices.code", hasItem("thermal-shock"));
    }

    /** Weiss 1974 at 420 uatm: 0.2 mg/L is less than half of what the air leaves, in fresh water up to 40 °C. */
    @Test
    void aSettledStateThatAirDoesNotAllowIsNoticed() {
        blend(TANK, SOURCE, ",\"settled_co2_mg_per_l\":0.2").body("notices.code", hasItem("settled-co2-below-air"));
        blend(TANK, SOURCE, ",\"settled_co2_mg_per_l\":0.5")
                .body("notices.code", not(hasItem("settled-co2-below-air")));
    }

    @Test
    void faultsPointIntoTheGroups() {
        blend(TANK.replace("7.0", "11.5"), SOURCE, "")
                .statusCode(422)
                .body("errors.field", contains("tank.alkalinity_mg_per_l_as_caco3"))
                .body("errors.pointer", contains("/tank/alkalinity_mg_per_l_as_caco3"))
                .body("errors.code", contains("inconsistent"));
        blend(TANK + ",\"temp\":5", "\"volume_m3\":3,\"temperature_f\":75", ",\"tank_volume\":3")
                .statusCode(400)
                .body("errors.field", hasItems("tank.temp", "tank_volume", "source.ph"))
                .body("errors.pointer", hasItems("/tank/temp", "/tank_volume", "/source/ph"));
        given().port(port).get("/v1/dilution/blend").then().statusCode(405).header("Allow", "POST, OPTIONS");
    }

    @Test
    void theAnswerFitsACompactView() {
        assertThat(post(
                                "compact",
                                TANK
                                        + ",\"tan_mg_per_l\":1,\"no2_n_mg_per_l\":1,\"no3_n_mg_per_l\":10,\"calcium_mg_per_l\":50",
                                SOURCE
                                        + ",\"tan_mg_per_l\":1,\"no2_n_mg_per_l\":1,\"no3_n_mg_per_l\":10,\"calcium_mg_per_l\":50"
                                        + ",\"salinity\":3,\"chlorine_mg_per_l_as_cl2\":1,\"chloramine_mg_per_l_as_cl2\":1",
                                "")
                        .statusCode(200)
                        .extract()
                        .asByteArray())
                .hasSizeLessThanOrEqualTo(1024);
    }

    private ValidatableResponse blend(String tank, String source, String more) {
        return post("full", tank, source, more);
    }

    private ValidatableResponse post(String view, String tank, String source, String more) {
        return given().port(port)
                .contentType("application/json")
                .body("{\"tank\":{" + tank + "},\"source\":{" + source + "}" + more + "}")
                .post("/v1/dilution/blend?view=" + view)
                .then();
    }
}
