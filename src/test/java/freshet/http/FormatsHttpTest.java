package freshet.http;

import static io.restassured.RestAssured.given;
import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.equalTo;
import static org.hamcrest.Matchers.hasItems;

import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.NamedCsvRecord;
import io.restassured.response.Response;
import java.math.BigDecimal;
import java.util.List;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.boot.test.web.server.LocalServerPort;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;
import tools.jackson.dataformat.cbor.CBORMapper;

/** The same answer as JSON, as a table and as CBOR. */
@HttpTest
class FormatsHttpTest {

    private static final String LIMITS =
            "/v1/ammonia/limits?nh3_n_limit_mg_per_l=0.02&ph=7.4&temperature_c=26&tan_mg_per_l=1.2";
    private static final JsonMapper JSON = JsonMapper.builder().build();

    @LocalServerPort
    private int port;

    @Autowired
    private Calculations calculations;

    @TestFactory
    List<DynamicTest> everyFormatHoldsTheSameNumbers() {
        return calculations.all().stream()
                .filter(Calculation::hasSeries)
                .map(calculation -> DynamicTest.dynamicTest(
                        calculation.path(),
                        () -> compare(calculation.address() + "?" + calculation.example() + "&view=compact&format=")))
                .toList();
    }

    private void compare(String path) {
        JsonNode json = JSON.readTree(get(path + "json").asString());
        Response csv = get(path + "csv");
        NamedCsvRecord row = CsvReader.builder().ofNamedCsvRecord(csv.asString()).stream()
                .findFirst()
                .orElseThrow();
        Response cbor = get(path + "cbor");
        JsonNode map = new CBORMapper().readTree(cbor.asByteArray());
        assertThat(map.propertyNames()).containsExactlyElementsOf(json.propertyNames());
        assertThat(cbor.asByteArray()[0] & 0xFF).as("a map of definite length").isBetween(0xA0, 0xB9);
        json.forEachEntry((name, value) -> {
            assertThat(row.getField(name)).as(name).isEqualTo(value.isNumber() ? plain(value) : value.asString());
            if (value.isNumber()) {
                assertThat(map.get(name).isDouble()).as(name).isTrue();
                assertThat(map.get(name).asDouble()).as(name).isEqualTo(value.asDouble());
            } else {
                assertThat(map.get(name)).isEqualTo(value);
            }
        });
        for (Response response : List.of(csv, cbor)) {
            assertThat(response.header("Content-Length")).isEqualTo("" + response.asByteArray().length);
            assertThat(response.header("Vary")).isEqualTo("Accept");
        }
    }

    /** A small number as answers print it; the reader's own text would have an exponent. */
    private static String plain(JsonNode number) {
        return new BigDecimal(number.toString()).toPlainString();
    }

    @Test
    void aTableHasAHeaderWithEveryOutputAndEndsItsLinesWithCrLf() {
        String csv = get("/v1/ammonia/limits?nh3_n_limit_mg_per_l=0.02&ph=7.4&temperature_c=26&format=csv")
                .asString();
        assertThat(csv)
                .isEqualTo(
                        "exceeded,tan_limit_mg_per_l,nh3_n_limit_mg_per_l,guideline_nh3_mg_per_l,nh3_n_mg_per_l,"
                                + "tan_headroom_mg_per_l,ph_limit,temperature_limit_c,method,method_version,reference,validity,notice_codes\r\n"
                                + ",1.32858,0.02,,,,,,emerson-1975,1,\"Emerson et al. 1975, doi:10.1139/f75-274\",within,limit-conditional\r\n");
    }

    @Test
    void aTrajectoryIsATableOfItsPoints() {
        Response csv = get(
                "/v1/nitrate/trajectory?volume_l=100&no3_n_mg_per_l=50&no3_n_production_g_per_day=1&points=3&format=csv");
        assertThat(csv.asString()).isEqualTo("time_days,no3_n_mg_per_l\r\n0,50\r\n15,200\r\n30,350\r\n");
    }

    @Test
    void whatIsNotFlatIsNotGivenAsCbor() {
        String path = "/v1/nitrate/trajectory?volume_l=100&no3_n_mg_per_l=50&no3_n_production_g_per_day=1";
        given().port(port)
                .get(path + "&format=cbor")
                .then()
                .statusCode(422)
                .body("errors[0].code", equalTo("not-allowed"))
                .body("errors[0].allowed", hasItems("json", "csv"));
        given().port(port).accept("application/cbor").get(path).then().statusCode(406);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "text/csv|text/csv",
                "application/cbor|application/cbor",
                "*/*|application/json",
                "application/*|application/json",
                "text/csv, */*;q=0.1|text/csv",
                "application/json;q=0.5, application/cbor|application/cbor",
                "text/html, application/json|application/json",
            })
    void theAcceptHeaderChooses(String accept, String mediaType) {
        assertThat(given().port(port).header("Accept", accept).get(LIMITS).contentType())
                .isEqualTo(mediaType);
    }

    @Test
    void theFormatBeatsTheAcceptHeaderAndErrorsStayProblems() {
        assertThat(given().port(port)
                        .accept("text/csv")
                        .get(LIMITS + "&format=json")
                        .contentType())
                .isEqualTo("application/json");
        assertThat(given().port(port)
                        .accept("text/csv")
                        .get("/v1/ammonia/limits")
                        .contentType())
                .isEqualTo("application/problem+json");
        given().port(port)
                .get(LIMITS + "&format=xml")
                .then()
                .statusCode(422)
                .body("errors[0].field", equalTo("format"));
    }

    @Test
    void everyFormatAndViewHasAnEntityTagOfItsOwn() {
        List<String> tags = List.of(
                get(LIMITS).header("ETag"),
                get(LIMITS + "&view=compact").header("ETag"),
                get(LIMITS + "&format=csv").header("ETag"),
                get(LIMITS + "&format=csv&view=compact").header("ETag"),
                get(LIMITS + "&format=cbor").header("ETag"));
        assertThat(tags).doesNotHaveDuplicates();
        assertThat(get(LIMITS + "&format=json").header("ETag")).isEqualTo(tags.get(0));
    }

    private Response get(String path) {
        Response response =
                given().port(port).accept("*/*").urlEncodingEnabled(false).get(path);
        assertThat(response.statusCode()).as(response.asString()).isEqualTo(200);
        return response;
    }
}
