package freshet.nitrite.web;

import static io.restassured.RestAssured.given;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.hamcrest.Matchers.contains;
import static org.hamcrest.Matchers.containsString;
import static org.hamcrest.Matchers.equalTo;
import static org.hamcrest.Matchers.hasItem;
import static org.hamcrest.Matchers.not;
import static org.hamcrest.Matchers.nullValue;

import freshet.http.HttpTest;
import freshet.nitrite.ChlorideRatios;
import io.restassured.response.ValidatableResponse;
import java.util.List;
import java.util.Locale;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.springframework.boot.test.web.server.LocalServerPort;

/** The nitrite calculations as a caller sees them. */
@HttpTest
class NitriteHttpTest {

    private static final String SPECIATION = "/v1/nitrite/speciation?ph=7&temperature_c=25&";
    private static final String PROTECTION = "/v1/nitrite/protection?";
    private static final String SHORT = PROTECTION + "no2_n_mg_per_l=0.8&chloride_mg_per_l=12&";
    private static final String POND = SHORT + "chloride_to_no2_n_mass_ratio=41&volume_l=20000&chemical=";

    @LocalServerPort
    private int port;

    @Test
    void theKeysStandInTheirOrder() {
        assertThat(get(SPECIATION + "no2_n_mg_per_l=20&view=compact").extract().asString())
                .startsWith("{\"hno2_n_mg_per_l\":0.00449645,\"nitrite_ion_n_mg_per_l\":19.9955,"
                        + "\"hno2_fraction\":0.000224822,\"pka\":3.35194,\"method\":\"anthonisen-1976\"");
        assertThat(get(POND + "sodium-chloride&view=compact").extract().asString())
                .startsWith("{\"protected\":false,\"present_mass_ratio\":15,\"chloride_required_mg_per_l\":32.8,"
                        + "\"chloride_deficit_mg_per_l\":20.8,\"no2_n_limit_mg_per_l\":0.292683,\"dose_g\":685.784,"
                        + "\"dissolved_salt_rise_mg_per_l\":34.2892,\"method\":\"chloride-protection\"");
    }

    @Test
    void theMethodIsTheCallersChoice() {
        get(SPECIATION + "no2_n_mg_per_l=1&method=da-silva-2006")
                .body("method", equalTo("da-silva-2006"))
                .body("pka", equalTo(3.16f))
                .body("validity", equalTo("within"));
        given().port(port)
                .get(SPECIATION + "no2_n_mg_per_l=1&method=emerson-1975")
                .then()
                .statusCode(422)
                .body("errors[0].allowed", contains("anthonisen-1976", "da-silva-2006"));
    }

    @ParameterizedTest
    @CsvSource({
        "no2_n_mg_per_l=1, ''",
        "no2_n_mg_per_l=105, ''",
        "no2_n_mg_per_l=107, inhibits-nitrifiers",
        "no2_n_mg_per_l=1&ph_scale=total, ph-scale-not-used",
        "no2_n_mg_per_l=1&salinity=0.5, ''",
        "no2_n_mg_per_l=1&salinity=30, ''",
        "no2_n_mg_per_l=200&salinity=30&ph_scale=nbs, inhibits-nitrifiers;ph-scale-not-used",
    })
    void noticesTellWhatCounts(String query, String codes) {
        get(SPECIATION + "view=compact&" + query).body("notice_codes", codes.isEmpty() ? nullValue() : equalTo(codes));
    }

    @Test
    void sizesAreKept() {
        String worst = "/v1/nitrite/speciation?no2_n_mg_per_l=9999.99&ph=3.33333&temperature_c=-1.99999"
                + "&salinity=44.4444&ph_scale=total&view=compact";
        assertThat(get(worst).extract().asByteArray()).hasSizeLessThanOrEqualTo(320);
        assertThat(get("/v1/nitrite/speciation?no2_n_mg_per_l=0.000123456&ph=9.87654&temperature_c=23.4567")
                        .extract()
                        .asByteArray())
                .hasSizeLessThanOrEqualTo(512);
    }

    @Test
    void nitriteMayBeGivenAsTheIon() {
        String asN = get(SHORT + "chloride_to_no2_n_mass_ratio=41").extract().asString();
        get(PROTECTION + "no2_mg_per_l=2.6275433711715568&chloride_mg_per_l=12&chloride_to_no2_n_mass_ratio=41")
                .body(equalTo(asN));
    }

    @Test
    void aMissingRatioIsAskedForWithPublishedFiguresOnItsOwnBasis() {
        ChlorideRatios published = ChlorideRatios.published();
        ValidatableResponse refused = given().port(port)
                .get(SHORT)
                .then()
                .statusCode(422)
                .body("errors.size()", equalTo(1))
                .body("errors[0].field", equalTo("chloride_to_no2_n_mass_ratio"))
                .body("errors[0].code", equalTo("missing"))
                .body("errors[0].detail", containsString("mg/L Cl per mg/L NO2-N, neither molar nor per NO2"))
                .body("errors[0].detail", containsString("16 molar"));
        for (double figure : new double[] {
            published.full(),
            published.pondPerNitrogen(),
            published.pondPerNitrite(),
            published.guidelineMaximum(),
            published.guidelineMean(),
            published.eifacSalmonids(),
            published.eifacCoarseFish()
        }) {
            String shown = String.format(Locale.ROOT, "%.1f", figure).replace(".0", "");
            assertThat(refused.extract().<String>path("errors[0].detail")).containsPattern("\\b" + shown + "\\b");
        }
    }

    @Test
    void theOtherTwoAreAskedForAsWell() {
        given().port(port)
                .get("/v1/nitrite/protection")
                .then()
                .statusCode(422)
                .body("errors.field", contains("no2_n_mg_per_l", "chloride_mg_per_l", "chloride_to_no2_n_mass_ratio"));
    }

    @ParameterizedTest
    @CsvSource({
        "volume_l=500, chemical",
        "volume_m3=5, chemical",
        "chemical=potassium-chloride, volume_l",
        "chemical=potassium-chloride&purity_percent=50, volume_l",
    })
    void volumeAndChemicalAreGivenBothOrNeither(String query, String field) {
        given().port(port)
                .get(SHORT + "chloride_to_no2_n_mass_ratio=41&" + query)
                .then()
                .statusCode(422)
                .body("errors.field", contains(field))
                .body("errors.code", contains("missing"));
    }

    @Test
    void withoutAChemicalThereIsNoDose() {
        get(SHORT + "chloride_to_no2_n_mass_ratio=41")
                .body("dose_g", nullValue())
                .body("dissolved_salt_rise_mg_per_l", nullValue())
                .body("notices.code", contains("species-not-protected", "sodium-and-plants"));
    }

    @Test
    void theDoseGrowsAsThePurityFalls() {
        float pure = get(POND + "calcium-chloride-dihydrate").extract().path("dose_g");
        float half = get(POND + "calcium-chloride-dihydrate&purity_percent=50")
                .extract()
                .path("dose_g");
        assertThat(half).isCloseTo(2 * pure, within(0.02f));
        assertThat(pure).isCloseTo(862.56f, within(0.05f));
        get(POND + "calcium-chloride-dihydrate&purity_percent=50")
                .body("dissolved_salt_rise_mg_per_l", equalTo(32.5577f));
    }

    @Test
    void aProductWithoutTheSaltIsRefused() {
        given().port(port)
                .get(POND + "sodium-chloride&purity_percent=0")
                .then()
                .statusCode(422)
                .body("errors.field", contains("purity_percent"))
                .body("errors.code", contains("below-minimum"));
    }

    @ParameterizedTest
    @CsvSource({
        "sodium-chloride, salt-over-hours;species-not-protected;sodium-and-plants",
        "potassium-chloride, salt-over-hours;species-not-protected;potassium-high",
        "calcium-chloride-dihydrate, salt-over-hours;species-not-protected",
    })
    void eachSaltHasItsCautions(String chemical, String codes) {
        get(POND + chemical + "&view=compact").body("notice_codes", equalTo(codes));
    }

    @Test
    void aLargeDoseIsSpreadOverDays() {
        String large = PROTECTION + "no2_n_mg_per_l=50&chloride_mg_per_l=0&chloride_to_no2_n_mass_ratio=40"
                + "&volume_l=1000&chemical=";
        get(large + "sodium-chloride")
                .body("notices[0].code", equalTo("salt-over-days"))
                .body("notices[0].detail", containsString("at least 4 days"));
        get(large + "potassium-chloride")
                .body(
                        "notices.code",
                        contains(
                                "salt-over-days",
                                "ratio-below-full-protection",
                                "species-not-protected",
                                "potassium-high",
                                "salt-and-plants"));
    }

    @Test
    void aRatioThatLooksMolarIsPointedOut() {
        get(SHORT + "chloride_to_no2_n_mass_ratio=16")
                .body("notices[0].code", equalTo("ratio-below-full-protection"))
                .body("notices[0].detail", containsString("16 molar, which is 40.5 here"));
        get(SHORT + "chloride_to_no2_n_mass_ratio=40.5")
                .body("notices.code", not(hasItem("ratio-below-full-protection")));
    }

    @Test
    void whoIsProtectedNeedsNoSalt() {
        get(SHORT + "chloride_to_no2_n_mass_ratio=15&volume_l=20000&chemical=sodium-chloride")
                .body("protected", equalTo(true))
                .body("chloride_deficit_mg_per_l", equalTo(0))
                .body("dose_g", equalTo(0))
                .body("no2_n_limit_mg_per_l", equalTo(0.8f))
                .body("notices.code", contains("ratio-below-full-protection", "species-not-protected"));
    }

    @Test
    void whatHasNoInfluenceOrDoesNotExistIsNamed() {
        List<String> codes = get(PROTECTION
                        + "no2_n_mg_per_l=0&chloride_mg_per_l=12&chloride_to_no2_n_mass_ratio=41&purity_percent=90")
                .body("protected", equalTo(true))
                .body("present_mass_ratio", nullValue())
                .extract()
                .path("notices.code");
        assertThat(codes).containsExactly("species-not-protected", "no-nitrite", "input-not-used");
    }

    @ParameterizedTest
    @ValueSource(strings = {"0", "4.9e-324", "1e-300", "1e-12", "10000"})
    void theEdgesOfTheBoundsAreAnsweredOrRefused(String nitrite) {
        for (String chloride : List.of("0", "4.9e-324", "50000")) {
            for (String ratio : List.of("0.1", "1000")) {
                String query = "no2_n_mg_per_l=" + nitrite + "&chloride_mg_per_l=" + chloride
                        + "&chloride_to_no2_n_mass_ratio=" + ratio;
                get(PROTECTION + query);
                for (String dose : List.of("0.001&purity_percent=100", "1e10&purity_percent=1", "1e10")) {
                    assertThat(given().port(port)
                                    .get(PROTECTION + query + "&chemical=potassium-chloride&volume_l=" + dose)
                                    .statusCode())
                            .as(query + dose)
                            .isIn(200, 422);
                }
            }
        }
        for (String edge : List.of("ph=0&temperature_c=-2", "ph=14&temperature_c=60")) {
            get("/v1/nitrite/speciation?no2_n_mg_per_l=" + nitrite + "&" + edge);
        }
    }

    private ValidatableResponse get(String path) {
        return given().port(port).get(path).then().statusCode(200);
    }
}
