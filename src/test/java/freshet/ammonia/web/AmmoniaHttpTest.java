package freshet.ammonia.web;

import static io.restassured.RestAssured.given;
import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.equalTo;
import static org.hamcrest.Matchers.hasItems;
import static org.hamcrest.Matchers.nullValue;

import freshet.http.HttpTest;
import io.restassured.response.Response;
import io.restassured.response.ValidatableResponse;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.springframework.boot.test.web.server.LocalServerPort;

/** The ammonia calculations as a caller sees them. */
@HttpTest
class AmmoniaHttpTest {

    private static final String SPECIATION = "/v1/ammonia/speciation?tan_mg_per_l=1&ph=8&temperature_c=";
    private static final String LIMITS = "/v1/ammonia/limits?ph=8&temperature_c=24&";

    @LocalServerPort
    private int port;

    /** UF/IFAS FA16, worked example of figure 3, as quoted in the published table of emerson-1975. */
    @Test
    void thePublishedWorkedExampleComesBack() {
        assertThat(get(SPECIATION + "24").extract().jsonPath().getDouble("nh3_n_mg_per_l"))
                .isBetween(0.05015, 0.05025);
    }

    @Test
    void theMethodFollowsTheSalinity() {
        get(SPECIATION + "24&salinity=0.5").body("method", equalTo("emerson-1975"));
        get(SPECIATION + "24&salinity=0.51").body("method", equalTo("clegg-whitfield-1995"));
        get(SPECIATION + "24&salinity=35&method=yao-millero-1995").body("method", equalTo("yao-millero-1995"));
    }

    @ParameterizedTest
    @CsvSource({
        "salinity=0, ''",
        "salinity=0.5&ph_scale=total, ph-scale-not-used",
        "salinity=20, ph-scale-assumed-nbs;nbs-in-saline-water",
        "salinity=20&ph_scale=nbs, nbs-in-saline-water",
        "salinity=20&ph_scale=total, ''",
        "salinity=20&ph_scale=free, ''",
        "salinity=20&method=emerson-1975&ph_scale=free, ph-scale-not-used",
        "salinity=41&ph_scale=free, ''",
    })
    void noticesTellHowThePhWasTaken(String query, String codes) {
        get(SPECIATION + "24&view=compact&" + query)
                .body("notice_codes", codes.isEmpty() ? nullValue() : equalTo(codes));
    }

    @Test
    void theNbsScaleIsTakenForTheFreeScale() {
        for (String method : new String[] {"clegg-whitfield-1995", "yao-millero-1995"}) {
            String path = SPECIATION + "24&salinity=30&method=" + method;
            float free = get(path + "&ph_scale=free").extract().path("nh3_fraction");
            get(path + "&ph_scale=nbs").body("nh3_fraction", equalTo(free));
            float total = get(path + "&ph_scale=total").extract().path("nh3_fraction");
            assertThat(total).isGreaterThan(free * 1.15f);
        }
    }

    @Test
    void outsideTheRangeTheAnswerStillComesMarked() {
        get(SPECIATION + "55")
                .body("validity", equalTo("outside"))
                .body("notices[0].code", equalTo("outside-validity"))
                .body("notices[0].field", equalTo("temperature_c"));
        get(SPECIATION + "50").body("validity", equalTo("within")).body("notices", nullValue());
    }

    @Test
    void strictRefusesWhatLiesOutside() {
        given().port(port)
                .get(SPECIATION + "55&strict=true")
                .then()
                .statusCode(422)
                .body("errors[0].code", equalTo("outside-validity"))
                .body("errors[0].field", equalTo("temperature_c"))
                .body("errors[0].maximum", equalTo(50))
                .body("errors[0].unit", equalTo("Cel"));
        get(SPECIATION + "50&strict=true");
    }

    @Test
    void theSameTotalInAnyBasisIsTheSameAnswer() {
        String asN = get("/v1/ammonia/speciation?ph=8&temperature_c=24&tan_mg_per_l=1")
                .extract()
                .asString();
        get("/v1/ammonia/speciation?ph=8&temperature_f=75.2&tan_mg_per_l_as_nh3=1.215892054")
                .body(equalTo(asN));
        get("/v1/ammonia/speciation?ph=8&temperature_f=75.2&tan_mg_per_l_as_nh4=1.287856072")
                .body(equalTo(asN));
    }

    @Test
    void sizesAreKept() {
        String worst = "/v1/ammonia/speciation?tan_mg_per_l=9999.99&ph=13.9999&temperature_c=-1.99999&salinity=44.4444"
                + "&method=clegg-whitfield-1995&view=compact";
        assertThat(get(worst).extract().asByteArray()).hasSizeLessThanOrEqualTo(320);
        String deadProbe =
                "/v1/ammonia/speciation?tan_mg_per_l=0.0512345&ph=0&temperature_c=-1.99&salinity=44.4&view=compact";
        assertThat(get(deadProbe).extract().asByteArray()).hasSizeLessThanOrEqualTo(320);
        String uncertain = "&ph_standard_uncertainty=0.123&temperature_standard_uncertainty_c=0.512";
        assertThat(get(deadProbe + uncertain).extract().asByteArray()).hasSizeLessThanOrEqualTo(512);
        assertThat(get(SPECIATION + "23.4567").extract().asByteArray()).hasSizeLessThanOrEqualTo(512);
        assertThat(get("/v1/ammonia/speciation?tan_mg_per_l=0.000123456&ph=0.01&temperature_c=23.4567&salinity=33.3333"
                                + "&ph_scale=total")
                        .extract()
                        .asByteArray())
                .hasSizeLessThanOrEqualTo(512);
    }

    @Test
    void noAmmoniaIsNoAmmonia() {
        get("/v1/ammonia/speciation?tan_mg_per_l=0&ph=8&temperature_c=24").body("nh3_n_mg_per_l", equalTo(0));
    }

    @ParameterizedTest
    @CsvSource({
        "eifac-1970, 0.025, 0.020561",
        "ccme-2010, 0.019, 0.0156264",
        "eu-2006-44-guide, 0.005, 0.00411221",
        "eu-2006-44-imperative, 0.025, 0.020561",
        "usepa-1989-saltwater-acute, 0.233, 0.191629",
        "usepa-1989-saltwater-chronic, 0.035, 0.0287855",
    })
    void guidelinesArePrintedAsNh3AndUsedAsN(String guideline, float asNh3, float asN) {
        get(LIMITS + "nh3_guideline=" + guideline)
                .body("guideline_nh3_mg_per_l", equalTo(asNh3))
                .body("nh3_n_limit_mg_per_l", equalTo(asN));
    }

    @Test
    void theVerdictStandsFirst() {
        Response exceeded = given().port(port).get(LIMITS + "nh3_n_limit_mg_per_l=0.02&tan_mg_per_l=1.2");
        assertThat(exceeded.asString()).startsWith("{\"exceeded\":true,\"tan_limit_mg_per_l\":0.398634,");
        exceeded.then().body("tan_headroom_mg_per_l", equalTo(-0.801366f));
    }

    @Test
    void limitsThatAreNeverMetAreLeftOut() {
        get(LIMITS + "nh3_n_limit_mg_per_l=2&tan_mg_per_l=1")
                .body("exceeded", equalTo(false))
                .body("ph_limit", nullValue())
                .body("temperature_limit_c", nullValue())
                .body("notices.code", hasItems("ph-limit-not-reached", "temperature-limit-not-reached"));
        get(LIMITS + "nh3_n_limit_mg_per_l=0&tan_mg_per_l=1").body("exceeded", equalTo(true));
        get(LIMITS + "nh3_n_limit_mg_per_l=0.02&tan_mg_per_l=0").body("exceeded", equalTo(false));
    }

    @Test
    void aLimitTooLargeToPrintIsRefused() {
        given().port(port)
                .get("/v1/ammonia/limits?nh3_n_limit_mg_per_l=10000&ph=0&temperature_c=-2")
                .then()
                .statusCode(200);
        given().port(port)
                .get("/v1/ammonia/limits?nh3_n_limit_mg_per_l=10000&ph=0&temperature_c=-2&salinity=45&ph_scale=free")
                .then()
                .statusCode(200);
    }

    private ValidatableResponse get(String path) {
        return given().port(port).get(path).then().statusCode(200);
    }
}
