package freshet.ammonia.web;

import static io.restassured.RestAssured.given;
import static org.hamcrest.Matchers.closeTo;
import static org.hamcrest.Matchers.containsString;
import static org.hamcrest.Matchers.equalTo;
import static org.hamcrest.Matchers.hasItem;
import static org.hamcrest.Matchers.hasKey;
import static org.hamcrest.Matchers.not;

import freshet.http.HttpTest;
import io.restassured.response.ValidatableResponse;
import org.junit.jupiter.api.Test;
import org.springframework.boot.test.web.server.LocalServerPort;

@HttpTest
class CriteriaHttpTest {

    @LocalServerPort
    private int port;

    /** EPA-822-R-13-001, headline values at pH 7 and 20 °C: 17 and 1.9 mg/L (secondary). */
    @Test
    void theHeadlineIsAnsweredUnroundedAndToldInTwoFigures() {
        get("guideline=usepa-2013&ph=7&temperature_c=20&tan_mg_per_l=3.5")
                .statusCode(200)
                .body("acute_tan_mg_per_l.toDouble()", closeTo(16.76, 0.01))
                .body("chronic_tan_mg_per_l.toDouble()", closeTo(1.887, 0.001))
                .body("chronic_four_day_tan_mg_per_l.toDouble()", closeTo(4.718, 0.002))
                .body("acute_averaging_hours", equalTo(1))
                .body("chronic_averaging_days", equalTo(30))
                .body("acute_quotient.toDouble()", closeTo(3.5 / 16.76, 1e-3))
                .body("chronic_quotient.toDouble()", closeTo(3.5 / 1.887, 1e-3))
                .body("notices.find { it.code == 'limit-conditional' }.detail", containsString("acute 17, chronic 1.9"))
                .body("notices.code", hasItem("receiving-water-guideline"));
    }

    @Test
    void whatDoesNotMatterIsNoticed() {
        get("guideline=usepa-1999&ph=7&temperature_c=20&mussels_present=false")
                .statusCode(200)
                .body("notices.find { it.code == 'input-not-used' }.field", equalTo("mussels_present"));
        get("guideline=usepa-1989-saltwater&ph=8&temperature_c=20&salinity=30&ph_scale=free")
                .statusCode(200)
                .body("$", not(hasKey("chronic_four_day_tan_mg_per_l")))
                .body("notices.code", hasItem("no-four-day-criterion"));
    }

    /** US EPA 2013: the forms for trout without mussels and early stages cross in cold, alkaline water. */
    @Test
    void aChronicCriterionAboveTheAcuteOneIsNoticed() {
        String trout =
                "guideline=usepa-2013&mussels_present=false&early_life_stages_present=false&temperature_c=10&ph=";
        get(trout + "7").body("notices.code", not(hasItem("chronic-above-acute")));
        get(trout + "8.5").body("notices.code", hasItem("chronic-above-acute"));
    }

    @Test
    void outsideWhereTheyAreAppliedTheyAreMarked() {
        get("guideline=usepa-2013&ph=9.5&temperature_c=20").body("validity", equalTo("outside"));
        get("guideline=usepa-2013&ph=9.5&temperature_c=20&strict=true").statusCode(422);
        get("guideline=usepa-2013&ph=0&temperature_c=-2&tan_mg_per_l=10000").statusCode(200);
        get("guideline=usepa-1989-saltwater&ph=14&temperature_c=60&salinity=45").statusCode(200);
    }

    private ValidatableResponse get(String query) {
        return given().port(port)
                .urlEncodingEnabled(false)
                .get("/v1/ammonia/criteria?" + query)
                .then();
    }
}
