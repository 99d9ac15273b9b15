package freshet.oxygen.web;

import static io.restassured.RestAssured.given;
import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.contains;
import static org.hamcrest.Matchers.containsInAnyOrder;
import static org.hamcrest.Matchers.equalTo;
import static org.hamcrest.Matchers.hasItem;
import static org.hamcrest.Matchers.nullValue;

import freshet.http.HttpTest;
import io.restassured.response.ValidatableResponse;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.springframework.boot.test.web.server.LocalServerPort;

/** Oxygen at saturation as a caller sees it. */
@HttpTest
class OxygenHttpTest {

    private static final String SATURATION = "/v1/oxygen/saturation?";

    @LocalServerPort
    private int port;

    /** Cells of the three-decimal table of Standard Methods, as quoted in the published table of benson-krause-1984. */
    @ParameterizedTest
    @CsvSource({"8, 11.843", "16, 9.870", "20, 9.092", "25, 8.263", "30, 7.559"})
    void publishedCellsComeBack(String temperature, double expected) {
        double answered = get("temperature_c=" + temperature + "&station_pressure_hpa=1013.25")
                .extract()
                .jsonPath()
                .getDouble("saturation_mg_per_l");
        assertThat(answered).isBetween(expected - 0.0015, expected + 0.0015);
    }

    @ParameterizedTest
    @CsvSource({
        "station_pressure_hpa=1000, ''",
        "altitude_m=0, mean-pressure-of-altitude",
        "salinity=0, sea-level-pressure-assumed",
        "station_pressure_hpa=500, ''",
        "altitude_m=6000, mean-pressure-of-altitude",
        "station_pressure_hpa=1000&salinity=41, ''",
    })
    void noticesTellWhichPressureWasTaken(String query, String codes) {
        get("temperature_c=20&view=compact&" + query)
                .body("notice_codes", codes.isEmpty() ? nullValue() : equalTo(codes));
    }

    @Test
    void seaLevelIsTheSameHoweverItIsGiven() {
        float assumed = get("temperature_c=20").extract().path("saturation_mg_per_l");
        for (String pressure : new String[] {"station_pressure_hpa=1013.25", "altitude_m=0"}) {
            get("temperature_c=20&" + pressure)
                    .body("saturation_mg_per_l", equalTo(assumed))
                    .body("station_pressure_hpa", equalTo(1013.25f));
        }
    }

    @Test
    void aPressureOutsideIsToldWhereItWasTakenFromTheAltitude() {
        given().port(port)
                .get(SATURATION + "temperature_c=20&altitude_m=6000&strict=true")
                .then()
                .statusCode(422)
                .body("errors.code", contains("outside-validity"))
                .body("errors.field", contains("station_pressure_hpa"));
    }

    @Test
    void percentIsOfTheSaturationThatIsReported() {
        get("temperature_c=20&station_pressure_hpa=1013.25").body("dissolved_oxygen_saturation_percent", nullValue());
        get("temperature_c=20&station_pressure_hpa=1013.25&dissolved_oxygen_mg_per_l=0")
                .body("dissolved_oxygen_saturation_percent", equalTo(0));
        ValidatableResponse thin = get("temperature_c=20&altitude_m=2000&dissolved_oxygen_mg_per_l=5");
        double saturation = thin.extract().jsonPath().getDouble("saturation_mg_per_l");
        assertThat(thin.extract().jsonPath().getDouble("dissolved_oxygen_saturation_percent"))
                .isBetween(500 / saturation * 0.99999, 500 / saturation * 1.00001);
    }

    @Test
    void pressureAndAltitudeExcludeEachOtherEvenIfTheyAgree() {
        given().port(port)
                .get(SATURATION + "temperature_c=20&altitude_m=0&station_pressure_hpa=1013.25")
                .then()
                .statusCode(422)
                .body("errors.code", contains("conflict"))
                .body("errors[0].allowed", containsInAnyOrder("station_pressure_hpa", "altitude_m"));
    }

    @Test
    void allFaultsComeAtOnce() {
        given().port(port)
                .get(SATURATION + "salinity=46&altitude_m=-431&dissolved_oxygen_mg_per_l=61")
                .then()
                .statusCode(422)
                .body("errors.field", hasItem("temperature_c"))
                .body("errors.size()", equalTo(4));
    }

    @Test
    void theCornersOfTheBoundsGiveNumbers() {
        for (String t : new String[] {"-2", "60"}) {
            for (String s : new String[] {"0", "45"}) {
                for (String p : new String[] {
                    "station_pressure_hpa=300", "station_pressure_hpa=1100", "altitude_m=-430", "altitude_m=6000"
                }) {
                    String answer = get("temperature_c=" + t + "&salinity=" + s + "&" + p
                                    + "&dissolved_oxygen_mg_per_l=60")
                            .body("validity", equalTo("outside"))
                            .extract()
                            .asString();
                    assertThat(answer).doesNotContain("NaN", "Infinity", "null");
                }
            }
        }
    }

    @Test
    void theMethodTellsWhatPressureRestsOn() {
        given().port(port)
                .get("/v1/methods/benson-krause-1984")
                .then()
                .statusCode(200)
                .body("uses", contains("standard-atmosphere-1976"));
    }

    private ValidatableResponse get(String query) {
        return given().port(port).get(SATURATION + query).then().statusCode(200);
    }
}
