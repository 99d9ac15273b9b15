package freshet.nitrate.web;

import static io.restassured.RestAssured.given;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.hamcrest.Matchers.equalTo;
import static org.hamcrest.Matchers.hasItem;
import static org.hamcrest.Matchers.nullValue;

import freshet.http.HttpTest;
import io.restassured.path.json.JsonPath;
import io.restassured.response.ValidatableResponse;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.springframework.boot.test.web.server.LocalServerPort;

/** The nitrate calculations as a caller sees them. */
@HttpTest
class NitrateHttpTest {

    private static final String ACCUMULATION = "/v1/nitrate/accumulation?volume_l=50000&no3_n_mg_per_l=40";
    private static final String TRAJECTORY = "/v1/nitrate/trajectory?volume_l=50000&no3_n_mg_per_l=40";
    private static final String FEED = "&feed_kg_per_day=10&protein_percent=42";

    @LocalServerPort
    private int port;

    @Test
    void theVerdictStandsFirst() {
        assertThat(get(ACCUMULATION + FEED + "&no3_n_limit_mg_per_l=100")
                        .extract()
                        .asString())
                .startsWith("{\"limit_outcome\":\"reached\",\"days_to_limit\":");
    }

    @ParameterizedTest
    @CsvSource({
        "no3_n_production_g_per_day=100, 100, reached, 30",
        "no3_n_production_g_per_day=100, 40, at-limit, 0",
        "no3_n_production_g_per_day=100, 30, already-above, ",
        "no3_n_production_g_per_day=0, 41, never, ",
        "no3_n_production_g_per_day=300&exchange_l_per_day=3000, 100, never, ",
        "no3_n_production_g_per_day=0&exchange_l_per_day=5000, 20, falls-below, 6.93147",
        "no3_n_production_g_per_day=0&plant_area_m2=100, 10, falls-below, 50",
        "no3_n_production_g_per_day=0&exchange_l_per_day=5000&source_no3_n_mg_per_l=20, 20, already-above, ",
    })
    void everyOutcomeOfALimit(String sources, double limit, String outcome, Double days) {
        ValidatableResponse answer = get(ACCUMULATION + "&" + sources + "&no3_n_limit_mg_per_l=" + limit)
                .body("limit_outcome", equalTo(outcome));
        if (days == null) {
            answer.body("days_to_limit", nullValue());
        } else {
            assertThat(answer.extract().jsonPath().getDouble("days_to_limit")).isCloseTo(days, within(2e-5 * days));
        }
    }

    @Test
    void withoutALimitNothingIsSaidOfOne() {
        get(ACCUMULATION + FEED)
                .body("limit_outcome", nullValue())
                .body("days_to_limit", nullValue())
                .body("exchange_required_l_per_day", nullValue())
                .body("notices.code", hasItem("no-plateau"));
    }

    @Test
    void aSourceThatIsNotBelowTheLimitHoldsNothing() {
        get(ACCUMULATION + FEED + "&source_no3_n_mg_per_l=30&no3_n_limit_mg_per_l=30&view=compact")
                .body("exchange_required_l_per_day", nullValue())
                .body("notice_codes", equalTo("above-limit-now;source-not-below-limit;no-plateau"));
    }

    @Test
    void evaporationBringsTheNitrateOfTheSourceAndTakesNoneAway() {
        get(ACCUMULATION + "&no3_n_production_g_per_day=0&evaporation_l_per_day=1000&source_no3_n_mg_per_l=5")
                .body("net_no3_n_g_per_day", equalTo(5))
                .body("no3_n_at_horizon_mg_per_l", equalTo(43))
                .body("plateau_no3_n_mg_per_l", nullValue());
    }

    @Test
    void denitrificationIsAShareOfTheProductionAndNotOfTheStock() {
        get(ACCUMULATION + "&no3_n_production_g_per_day=100&denitrified_percent=100")
                .body("net_no3_n_g_per_day", equalTo(0))
                .body("plateau_no3_n_mg_per_l", equalTo(40));
    }

    @Test
    void oneSourceOfNitrateIsAskedForAndFeedNeedsItsProtein() {
        refused(ACCUMULATION, "no3_n_production_g_per_day", "one-required");
        refused(ACCUMULATION + FEED + "&no3_n_production_g_per_day=1", "feed_kg_per_day", "conflict");
        refused(ACCUMULATION + "&feed_kg_per_day=10", "protein_percent", "missing");
    }

    @Test
    void inputsWithoutInfluenceAreNamed() {
        get(ACCUMULATION + "&no3_n_production_g_per_day=1&exchange_l_per_day=10&protein_percent=42")
                .body("notices[0].code", equalTo("input-not-used"))
                .body("notices[0].field", equalTo("protein_percent"));
        get(TRAJECTORY + "&no3_n_production_g_per_day=1&exchange_l_per_day=10&no3_n_limit_mg_per_l=50")
                .body("notices[0].code", equalTo("input-not-used"))
                .body("notices[0].field", equalTo("no3_n_limit_mg_per_l"));
    }

    @Test
    void nitrateMayBeGivenAsTheIon() {
        String asN = get(ACCUMULATION + FEED).extract().asString();
        get("/v1/nitrate/accumulation?volume_m3=50&no3_mg_per_l=177.06575283786677" + FEED)
                .body(equalTo(asN));
    }

    @Test
    void theTrajectoryEndsWhereTheAccumulationStands() {
        String sources = FEED + "&exchange_l_per_day=3000&plant_area_m2=60&horizon_days=45";
        JsonPath trajectory = get(TRAJECTORY + sources + "&points=10").extract().jsonPath();
        assertThat(trajectory.getList("items")).hasSize(10);
        assertThat(trajectory.getDouble("items[0].time_days")).isZero();
        assertThat(trajectory.getDouble("items[0].no3_n_mg_per_l")).isEqualTo(40);
        assertThat(trajectory.getDouble("items[4].time_days")).isEqualTo(20);
        assertThat(trajectory.getDouble("items[9].time_days")).isEqualTo(45);
        assertThat(trajectory.getDouble("items[9].no3_n_mg_per_l"))
                .isEqualTo(get(ACCUMULATION + sources).extract().jsonPath().getDouble("no3_n_at_horizon_mg_per_l"));
        assertThat(get(TRAJECTORY + FEED).extract().jsonPath().getList("items")).hasSize(31);
    }

    @ParameterizedTest
    @ValueSource(strings = {"1", "1001", "2.5"})
    void thePointsAreAWholeNumberWithinBounds(String points) {
        given().port(port).get(TRAJECTORY + FEED + "&points=" + points).then().statusCode(422);
    }

    @ParameterizedTest
    @ValueSource(strings = {"4.9e-324", "1e-300", "1e-12", "1e-6"})
    void sinksSoFaintThatNitrateNeverSeemsToGoAreAnswered(String uptake) {
        get("/v1/nitrate/accumulation?volume_l=1e10&no3_n_mg_per_l=50000&no3_n_production_g_per_day=0"
                        + "&plant_area_m2=1&plant_no3_n_uptake_g_per_m2_per_day=" + uptake)
                .body("no3_n_at_horizon_mg_per_l", equalTo(50000))
                .body("plateau_no3_n_mg_per_l", equalTo(0))
                .body("notices.code", hasItem("sinks-exceed-sources"));
    }

    @Test
    void feedOutsideTheRangeOfItsMethodMarksTheAnswer() {
        get(ACCUMULATION + "&feed_kg_per_day=10&protein_percent=60").body("validity", equalTo("outside"));
        get(ACCUMULATION + "&feed_kg_per_day=10&protein_percent=55").body("validity", equalTo("within"));
        get(ACCUMULATION + "&no3_n_production_g_per_day=10&protein_percent=60").body("validity", equalTo("within"));
    }

    private ValidatableResponse get(String path) {
        return given().port(port).get(path).then().statusCode(200);
    }

    private void refused(String path, String field, String code) {
        given().port(port)
                .get(path)
                .then()
                .statusCode(422)
                .body("errors.size()", equalTo(1))
                .body("errors[0].field", equalTo(field))
                .body("errors[0].code", equalTo(code));
    }
}
