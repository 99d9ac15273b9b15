package freshet.salinity.web;

import static io.restassured.RestAssured.given;
import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.contains;
import static org.hamcrest.Matchers.containsInAnyOrder;
import static org.hamcrest.Matchers.equalTo;
import static org.hamcrest.Matchers.nullValue;

import freshet.http.HttpTest;
import io.restassured.response.ValidatableResponse;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.springframework.boot.test.web.server.LocalServerPort;

/** Salinity from conductivity as a caller sees it. */
@HttpTest
class SalinityHttpTest {

    private static final String FROM_CONDUCTIVITY = "/v1/salinity/from-conductivity?";

    @LocalServerPort
    private int port;

    /** Values of the published table of practical-salinity-1978. */
    @ParameterizedTest
    @CsvSource({"2, 20, 1.13649", "10, 15, 7.11588", "30, 15, 23.5213", "50, 25, 32.7332"})
    void publishedValuesComeBack(String conductivity, String temperature, float salinity) {
        get("conductivity_ms_per_cm=" + conductivity + "&temperature_c=" + temperature)
                .body("salinity", equalTo(salinity))
                .body("validity", equalTo("within"))
                .body("notices", nullValue());
    }

    @Test
    void aCompensatedReadingIsOneOf25DegreesAndTheDensityIsThatOfTheWater() {
        float at25 =
                get("conductivity_ms_per_cm=12.3&temperature_c=25").extract().path("salinity");
        float warm =
                get("conductivity_ms_per_cm=12.3&temperature_c=25").extract().path("density_kg_per_m3");
        ValidatableResponse cold = get("conductivity_25c_ms_per_cm=12.3&temperature_c=8")
                .body("salinity", equalTo(at25))
                .body("notices.code", contains("compensated-by-meter"));
        assertThat(cold.extract().<Float>path("density_kg_per_m3")).isGreaterThan(warm + 2);
    }

    /** Official check values of UNESCO 44 for fresh water. */
    @ParameterizedTest
    @CsvSource({"5, 999.967", "25, 997.048"})
    void withoutConductivityItIsFreshWater(String temperature, float density) {
        get("conductivity_ms_per_cm=0&temperature_c=" + temperature)
                .body("salinity", equalTo(0))
                .body("density_kg_per_m3", equalTo(density));
    }

    @Test
    void aTemperatureInFahrenheitIsTheSameAnswer() {
        String celsius =
                get("conductivity_ms_per_cm=30&temperature_c=15").extract().asString();
        get("conductivity_ms_per_cm=30&temperature_f=59").body(equalTo(celsius));
    }

    @ParameterizedTest
    @CsvSource({
        "conductivity_ms_per_cm=100&temperature_c=0, salinity",
        "conductivity_ms_per_cm=10&temperature_c=36, temperature_c",
        "conductivity_ms_per_cm=10&temperature_c=41, temperature_c",
        "conductivity_ms_per_cm=100&temperature_c=50, 'salinity;temperature_c'",
        "conductivity_25c_ms_per_cm=100&temperature_c=60, 'salinity;temperature_c'",
    })
    void whatLiesOutsideIsMarkedAndToldOnce(String query, String fields) {
        get(query)
                .body("validity", equalTo("outside"))
                .body("notices.findAll { it.code == 'outside-validity' }.field", containsInAnyOrder((Object[])
                        fields.split(";")));
        given().port(port)
                .get(FROM_CONDUCTIVITY + query + "&strict=true")
                .then()
                .statusCode(422)
                .body("errors.field", containsInAnyOrder((Object[]) fields.split(";")));
    }

    /** A compensated meter leaves the scale at 25 °C; only the density sees the water's own temperature. */
    @Test
    void aCompensatedReadingOfWarmWaterIsHeldToTheRangeOfTheDensity() {
        get("conductivity_25c_ms_per_cm=10&temperature_c=38").body("validity", equalTo("within"));
        get("conductivity_25c_ms_per_cm=10&temperature_c=41").body("validity", equalTo("outside"));
    }

    @Test
    void exactlyOneConductivityIsTaken() {
        String one = "conductivity_ms_per_cm=1&temperature_c=25";
        given().port(port)
                .get(FROM_CONDUCTIVITY + one + "&conductivity_25c_ms_per_cm=1")
                .then()
                .statusCode(422)
                .body("errors.code", contains("conflict"));
        given().port(port)
                .get(FROM_CONDUCTIVITY + "temperature_c=25")
                .then()
                .statusCode(422)
                .body("errors.code", contains("one-required"))
                .body("errors[0].allowed", containsInAnyOrder("conductivity_ms_per_cm", "conductivity_25c_ms_per_cm"));
    }

    @Test
    void theCornersOfTheBoundsGiveNumbers() {
        for (String t : new String[] {"-2", "25", "60"}) {
            for (String c : new String[] {"0", "1e-300", "1e-9", "2", "100"}) {
                for (String name : new String[] {"conductivity_ms_per_cm", "conductivity_25c_ms_per_cm"}) {
                    ValidatableResponse answer = get(name + "=" + c + "&temperature_c=" + t);
                    assertThat(answer.extract().asString()).doesNotContain("NaN", "Infinity", "null", "\":-");
                }
            }
        }
    }

    @Test
    void theMethodTellsWhatItRestsOn() {
        given().port(port)
                .get("/v1/methods/practical-salinity-1978")
                .then()
                .statusCode(200)
                .body("uses", containsInAnyOrder("hill-1986", "millero-poisson-1981"));
    }

    private ValidatableResponse get(String query) {
        return given().port(port).get(FROM_CONDUCTIVITY + query).then().statusCode(200);
    }
}
