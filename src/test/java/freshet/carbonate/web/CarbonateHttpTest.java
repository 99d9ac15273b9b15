package freshet.carbonate.web;

import static io.restassured.RestAssured.given;
import static org.hamcrest.Matchers.closeTo;
import static org.hamcrest.Matchers.contains;
import static org.hamcrest.Matchers.containsString;
import static org.hamcrest.Matchers.equalTo;
import static org.hamcrest.Matchers.hasItem;
import static org.hamcrest.Matchers.hasItems;
import static org.hamcrest.Matchers.hasKey;
import static org.hamcrest.Matchers.lessThan;
import static org.hamcrest.Matchers.not;

import freshet.http.HttpTest;
import io.restassured.response.ValidatableResponse;
import org.junit.jupiter.api.Test;
import org.springframework.boot.test.web.server.LocalServerPort;

@HttpTest
class CarbonateHttpTest {

    private static final String DOSE =
            "carbonate/dose?volume_l=10000&ph=7&temperature_c=25&alkalinity_mg_per_l_as_caco3=40";

    @LocalServerPort
    private int port;

    @Test
    void exactlyTwoInputsOfFourAreTaken() {
        get("carbonate/speciation?temperature_c=20&ph=7")
                .statusCode(422)
                .body("errors.code", contains("one-required"))
                .body("errors[0].allowed.size()", equalTo(4));
        get("carbonate/speciation?temperature_c=20&ph=7&co2_mg_per_l=5&alkalinity_meq_per_l=2")
                .statusCode(422)
                .body("errors.code", contains("conflict"))
                .body("errors[0].detail", containsString("Give only two of"));
        get("carbonate/speciation?temperature_c=20&co2_mg_per_l=90&inorganic_carbon_mmol_per_l=2")
                .statusCode(422)
                .body("errors.code", contains("inconsistent"));
    }

    @Test
    void inBrackishWaterAProbeIsNoticedHonestly() {
        get("carbonate/speciation?temperature_c=15&salinity=8&ph=7.4&alkalinity_mg_per_l_as_caco3=110")
                .statusCode(200)
                .body("notices.code", contains("ph-scale-assumed-nbs", "nbs-in-saline-water"));
    }

    /** Weiss 1974 at 420 uatm, 25 °C: 0.63 mg/L. */
    @Test
    void carbonDioxideFarBelowThatOfAirIsNoticed() {
        get("carbonate/speciation?temperature_c=25&co2_mg_per_l=0.32&ph=8").body("notices", equalTo(null));
        get("carbonate/speciation?temperature_c=25&co2_mg_per_l=0.31&ph=8")
                .body("notices.code", contains("co2-below-air"));
        String dose = DOSE + "&target_ph=7.2&chemical=sodium-bicarbonate&settled_co2_mg_per_l=";
        get(dose + "0.32").body("notices.code", not(hasItem("settled-co2-below-air")));
        get(dose + "0.31").body("notices.code", hasItem("settled-co2-below-air"));
    }

    @Test
    void aDoseTellsWhatItDoesToAmmoniaAndWherePhSettles() {
        String high = "carbonate/dose?volume_l=10000&ph=8.3&temperature_c=25&alkalinity_mg_per_l_as_caco3=15"
                + "&target_alkalinity_mg_per_l_as_caco3=65&chemical=sodium-bicarbonate&ph_rise_limit=0.05";
        get(high).body("notices.code", contains("nh3-not-judged", "step-settles-higher", "settled-co2-below-air"));
        get(high + "&tan_mg_per_l=2")
                .body("notices.code", contains("nh3-rises", "step-settles-higher", "settled-co2-below-air"));
        get(DOSE + "&tan_mg_per_l=1&target_ph=9&chemical=sodium-hydroxide")
                .body(
                        "notices.code",
                        contains("caustic-protect-people", "dose-in-steps", "nh3-rises", "ph-settles-elsewhere"));
        get(DOSE + "&calcium_mg_per_l=20&target_alkalinity_mg_per_l_as_caco3=400&chemical=calcium-carbonate")
                .body("notices.code", hasItem("target-not-reached"));
    }

    @Test
    void aDeadProbeOrMineralAcidIsNotTakenForCarbonDioxide() {
        get("carbonate/speciation?ph=4&alkalinity_mg_per_l_as_caco3=0&temperature_c=25")
                .body("notices.code", contains("uncertain-at-low-alkalinity"));
        get("carbonate/speciation?ph=0&alkalinity_mg_per_l_as_caco3=0&temperature_c=25")
                .statusCode(422)
                .body("errors.field", contains("ph"))
                .body("errors.code", contains("inconsistent"));
    }

    @Test
    void whatAChemicalCannotDoIsRefusedWithTheReason() {
        unreachable("&target_ph=8.6&chemical=sodium-bicarbonate", "target_ph", "aerated tank may stand higher");
        unreachable("&target_ph=6.5&chemical=sodium-hydroxide", "target_ph", "higher already");
        unreachable(
                "&target_alkalinity_mg_per_l_as_caco3=30&chemical=sodium-bicarbonate",
                "target_alkalinity_mg_per_l_as_caco3",
                "more alkalinity already");
        unreachable("&target_ph=7.5&chemical=calcium-carbonate", "target_ph", "too slowly");
        get("carbonate/dose?volume_l=1000&ph=8.4&temperature_c=25&alkalinity_mg_per_l_as_caco3=200&calcium_mg_per_l=100"
                        + "&target_alkalinity_mg_per_l_as_caco3=250&chemical=calcium-carbonate")
                .statusCode(422)
                .body("errors.field", contains("chemical"))
                .body("errors.code", contains("unreachable"));
    }

    private void unreachable(String query, String field, String reason) {
        get(DOSE + query)
                .statusCode(422)
                .body("errors.field", contains(field))
                .body("errors.code", contains("unreachable"))
                .body("errors[0].detail", containsString(reason));
    }

    @Test
    void limestoneGivesAnUpperBoundAndNoPh() {
        get(DOSE
                        + "&target_alkalinity_mg_per_l_as_caco3=400&chemical=calcium-carbonate&calcium_mg_per_l=20&tan_mg_per_l=1")
                .statusCode(200)
                .body("$", not(hasKey("ph")))
                .body("$", not(hasKey("nh3_n_mg_per_l")))
                .body("alkalinity_after_mg_per_l_as_caco3", lessThan(400f))
                .body("notices.code", hasItem("dissolves-slowly"));
        get(DOSE + "&target_alkalinity_mg_per_l_as_caco3=60&chemical=calcium-carbonate")
                .body("alkalinity_after_mg_per_l_as_caco3", equalTo(60))
                .body("notices.code", hasItems("dissolves-slowly", "precipitation-not-checked"));
    }

    @Test
    void causticsAreWarnedOfFirstAlsoInTheCompactView() {
        get(DOSE
                        + "&target_alkalinity_mg_per_l_as_caco3=100&chemical=calcium-hydroxide&calcium_mg_per_l=60&view=compact")
                .statusCode(200)
                .body(
                        "notice_codes",
                        equalTo("caustic-protect-people;dose-in-steps;calcite-may-precipitate;nh3-not-judged"));
    }

    @Test
    void purityAndSolutionAreReckonedWith() {
        get(DOSE + "&target_alkalinity_mg_per_l_as_caco3=100&chemical=sodium-bicarbonate&purity_percent=50"
                        + "&solution_g_per_l=20&ph_rise_limit=1")
                .statusCode(200)
                .body("dose_g.toDouble()", closeTo(2014.42, 0.05))
                .body("dose_l.toDouble()", closeTo(100.721, 0.005))
                .body("hours_between_steps", equalTo(80));
        get(DOSE + "&target_alkalinity_mg_per_l_as_caco3=40&chemical=sodium-bicarbonate")
                .statusCode(200)
                .body("dose_g", equalTo(0))
                .body("steps", equalTo(0));
    }

    @Test
    void oxygenAndSalinitySayWhatWasAssumed() {
        get("oxygen/saturation?temperature_c=20&dissolved_oxygen_mg_per_l=4.546215")
                .body("saturation_mg_per_l.toDouble()", closeTo(9.092, 0.001))
                .body("dissolved_oxygen_saturation_percent.toDouble()", closeTo(50, 0.01))
                .body("notices.code", contains("sea-level-pressure-assumed"));
        get("oxygen/saturation?temperature_c=20&altitude_m=500&station_pressure_hpa=950")
                .statusCode(422)
                .body("errors.code", contains("conflict"));
        get("salinity/from-conductivity?conductivity_25c_ms_per_cm=1&temperature_c=10")
                .body("salinity.toDouble()", closeTo(0.492451, 1e-6))
                .body("notices.code", contains("compensated-by-meter", "sea-salt-assumed"));
        get("oxygen/saturation?temperature_c=20&station_pressure_hpa=1013&dissolved_oxygen_mg_per_l=1.9")
                .body("notices.code", contains("oxygen-critical"));
        get("oxygen/saturation?temperature_c=20&station_pressure_hpa=1013&dissolved_oxygen_mg_per_l=10.2")
                .body("notices.code", contains("supersaturated"));
        get("salinity/from-conductivity?conductivity_ms_per_cm=100&temperature_c=0")
                .statusCode(200)
                .body("validity", equalTo("outside"));
    }

    private ValidatableResponse get(String query) {
        return given().port(port).urlEncodingEnabled(false).get("/v1/" + query).then();
    }
}
