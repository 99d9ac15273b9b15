package freshet.farm;

import static io.restassured.RestAssured.given;
import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.contains;
import static org.hamcrest.Matchers.equalTo;
import static org.hamcrest.Matchers.hasItem;
import static org.hamcrest.Matchers.hasItems;
import static org.hamcrest.Matchers.hasKey;
import static org.hamcrest.Matchers.lessThan;
import static org.hamcrest.Matchers.not;

import freshet.http.HttpTest;
import io.restassured.path.json.JsonPath;
import io.restassured.response.ValidatableResponse;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.springframework.boot.test.web.server.LocalServerPort;

@HttpTest
class AlarmSetpointsHttpTest {

    @LocalServerPort
    private int port;

    @ParameterizedTest
    @CsvSource({"cold-water, 7.2, 12, 0", "warm-water, 7.2, 27, 0", "marine, 8.0, 18, 33"})
    void everyProfileGivesAlarmsInOrder(String profile, double ph, double t, double salinity) {
        JsonPath answer = get("profile=" + profile + "&ph=" + ph + "&temperature_c=" + t + "&salinity=" + salinity
                        + "&ph_scale=nbs")
                .statusCode(200)
                .extract()
                .jsonPath();
        rising(answer, "tan_high_mg_per_l", "tan_high_high_mg_per_l");
        rising(answer, "no2_n_high_mg_per_l", "no2_n_high_high_mg_per_l");
        rising(answer, "no3_n_high_mg_per_l", "no3_n_high_high_mg_per_l");
        rising(answer, "ph_low_low", "ph_low", "ph_high", "ph_high_high");
        rising(answer, "temperature_low_low_c", "temperature_low_c", "temperature_high_c", "temperature_high_high_c");
        rising(answer, "dissolved_oxygen_low_low_mg_per_l", "dissolved_oxygen_low_mg_per_l");
        rising(answer, "alkalinity_low_low_mg_per_l_as_caco3", "alkalinity_low_mg_per_l_as_caco3");
    }

    private static void rising(JsonPath answer, String... names) {
        for (int i = 1; i < names.length; i++) {
            assertThat(answer.getDouble(names[i - 1])).isLessThan(answer.getDouble(names[i]));
        }
    }

    @Test
    void aProfileOrOwnLimitsAndNotBoth() {
        get("ph=7&temperature_c=20").statusCode(422).body("errors.code", contains("one-required"));
        get("ph=7&temperature_c=20&profile=marine&nh3_n_critical_mg_per_l=0.02")
                .statusCode(422)
                .body("errors.code", contains("conflict"));
        get("ph=7&temperature_c=20&nh3_n_critical_mg_per_l=0.02&variables=tan,no2_n")
                .statusCode(422)
                .body("errors.field", contains("no2_n_critical_mg_per_l"));
        get("ph=7&temperature_c=20&nh3_n_critical_mg_per_l=0.02&variables=tan,nitrite")
                .statusCode(422)
                .body("errors.code", contains("not-allowed"))
                .body("errors[0].allowed", hasItems("no2_n", "dissolved_oxygen"));
    }

    @Test
    void cautionLiesInsideTheCriticalLimitWhereOnlyThatIsGiven() {
        get("ph=7&temperature_c=20&nh3_n_critical_mg_per_l=0.02&ph_upper_critical=8.6&dissolved_oxygen_critical_mg_per_l=4"
                        + "&ph_standard_uncertainty=0&tan_relative_standard_uncertainty_percent=0"
                        + "&temperature_standard_uncertainty_c=0&dissolved_oxygen_standard_uncertainty_mg_per_l=0")
                .statusCode(200)
                .body("ph_high", equalTo(8.4f))
                .body("ph_high_high", equalTo(8.6f))
                .body("dissolved_oxygen_low_mg_per_l", equalTo(5))
                .body("ph_deadband", equalTo(0.05f))
                .body("$", not(hasKey("ph_low")));
    }

    @Test
    void presentAmmoniaBindsPh() {
        get("ph=7.4&temperature_c=26&profile=warm-water&tan_mg_per_l=2")
                .statusCode(200)
                .body("ph_high_high", lessThan(8f))
                .body("notices.code", hasItem("ph-bound-by-ammonia"));
    }

    @Test
    void chlorideBoundsNitrite() {
        JsonPath without =
                get("ph=7.4&temperature_c=26&profile=warm-water").extract().jsonPath();
        JsonPath with = get("ph=7.4&temperature_c=26&profile=warm-water&chloride_mg_per_l=20")
                .extract()
                .jsonPath();
        assertThat(with.getDouble("no2_n_high_high_mg_per_l"))
                .isLessThan(without.getDouble("no2_n_high_high_mg_per_l"))
                .isLessThan(20 / 40.5);
    }

    @Test
    void aSensorThatIsTooUncertainGetsNoAlarm() {
        get("ph=7.4&temperature_c=26&ph_lower_critical=7&ph_upper_critical=7.6&ph_standard_uncertainty=0.5&variables=ph")
                .statusCode(200)
                .body("$", not(hasKey("ph_high")))
                .body("notices.code", hasItem("uncertainty-too-large"));
    }

    @Test
    void whenAmmoniaIsAboveCriticalTheHighAlarmOfPhStays() {
        get("profile=warm-water&ph=8&temperature_c=28&tan_mg_per_l=20&variables=ph")
                .statusCode(200)
                .body("ph_high_high.toDouble()", lessThan(8.0))
                .body("notices[0].code", equalTo("ammonia-above-critical"))
                .body("notices.code", not(hasItem("uncertainty-too-large")));
    }

    @Test
    void limitsInTheWrongOrderAreRefusedAllAtOnce() {
        get("ph=8&temperature_c=20&nh3_n_critical_mg_per_l=0.02&nh3_n_caution_mg_per_l=0.05"
                        + "&dissolved_oxygen_caution_mg_per_l=3&dissolved_oxygen_critical_mg_per_l=5")
                .statusCode(422)
                .body("errors.field", contains("nh3_n_caution_mg_per_l", "dissolved_oxygen_caution_mg_per_l"))
                .body("errors.code", contains("inconsistent", "inconsistent"));
    }

    @Test
    void nitriteWithoutChlorideIsWarnedOf() {
        String cold = "profile=cold-water&ph=7.4&temperature_c=12&variables=no2_n";
        get(cold).body("notices.code", hasItem("chloride-not-given"));
        get(cold + "&chloride_mg_per_l=50").body("notices.code", not(hasItem("chloride-not-given")));
    }

    @Test
    void aControllerCanHoldTheAnswer() {
        String compact = get("ph=7.4&temperature_c=26&profile=warm-water&tan_mg_per_l=2&view=compact"
                        + "&variables=tan,ph,temperature,dissolved_oxygen")
                .extract()
                .asString();
        assertThat(compact.length()).isLessThanOrEqualTo(1024);
        get("ph=7.4&temperature_c=26&profile=warm-water&format=cbor")
                .statusCode(200)
                .contentType("application/cbor");
    }

    @Test
    void noAnswerAtTheEdgesIsInfinite() {
        for (String ph : new String[] {"0", "14"}) {
            for (String t : new String[] {"-2", "60"}) {
                for (String refresh : new String[] {"5", "100"}) {
                    get("ph=" + ph + "&temperature_c=" + t
                                    + "&salinity=45&profile=marine&tan_mg_per_l=0&refresh_percent=" + refresh)
                            .statusCode(200);
                }
            }
        }
    }

    private ValidatableResponse get(String query) {
        return given().port(port)
                .urlEncodingEnabled(false)
                .get("/v1/farm/alarm-setpoints?" + query)
                .then();
    }
}
