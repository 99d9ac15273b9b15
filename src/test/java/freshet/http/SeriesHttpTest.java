package freshet.http;

import static io.restassured.RestAssured.given;
import static org.assertj.core.api.Assertions.assertThat;

import io.restassured.response.Response;
import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.springframework.boot.test.web.server.LocalServerPort;

/** Rows of a series: what is carried, what is refused, and what one bad row does to the others. */
@HttpTest
class SeriesHttpTest {

    private static final String PATH = "/v1/ammonia/speciation/series";
    private static final String RESULTS = "nh3_n_mg_per_l,nh3_mg_per_l,nh4_n_mg_per_l,nh4_mg_per_l,nh3_fraction,pka,"
            + "nh3_n_standard_uncertainty_mg_per_l,nh3_n_lower_mg_per_l,nh3_n_upper_mg_per_l,";
    private static final String HEADER = "tan_mg_per_l,ph,temperature_c";
    private static final String ANSWER = "0.0853803,0.103813,1.11462,1.43547,0.0711502,9.21577,,,,within,,";

    @LocalServerPort
    private int port;

    @Test
    void aTableIsCarriedThroughUntouchedAndAnsweredBesides() {
        assertThat(csv("tank," + HEADER + "\n\"North, \"\"A\"\"\",1.2,8.1,26\n5\" pipe,1.20,8.1,26.0\n", ""))
                .isEqualTo("tank," + HEADER + "," + RESULTS + "validity,notice_codes,error\r\n"
                        + "\"North, \"\"A\"\"\",1.2,8.1,26," + ANSWER + "\r\n"
                        + "5\" pipe,1.20,8.1,26.0," + ANSWER + "\r\n");
    }

    @Test
    void bytesThatAreNotUtf8AreCarriedTooAsTheyCame() {
        byte[] body = ("tank," + HEADER + "\nB\u00E4r,1.2,8.1,26\n").getBytes(StandardCharsets.ISO_8859_1);
        byte[] answer = post("text/csv", body, "").asByteArray();
        assertThat(new String(answer, StandardCharsets.ISO_8859_1)).contains("B\u00E4r,1.2,8.1,26," + ANSWER);
    }

    @ParameterizedTest
    @ValueSource(strings = {"\n", "\r\n", "\r"})
    void everyLineEndIsReadAndAByteOrderMarkToo(String lineEnd) {
        String table = HEADER + lineEnd + "\"1.2\",8.1,26" + lineEnd + lineEnd + "1.2,8.1,26";
        assertThat(csv("\uFEFF" + table, "").lines().skip(1))
                .containsExactly("\"1.2\",8.1,26," + ANSWER, "1.2,8.1,26," + ANSWER);
    }

    @Test
    void aBadRowSpoilsNothingElseAndSaysAllThatIsWrong() {
        String answer = csv(HEADER + "\n1.2,8.1,26\n7;5,,200\n1.2,8.1\n1.2,8.1,26,1\n1.2,8.1,26\n", "");
        assertThat(answer.lines().skip(1))
                .containsExactly(
                        "1.2,8.1,26," + ANSWER,
                        "7;5,,200,,,,,,,,,,,,row 2; tan_mg_per_l: not-a-number; temperature_c: above-maximum; ph: missing",
                        "1.2,8.1,,,,,,,,,,,,,row 3; malformed",
                        "1.2,8.1,26,,,,,,,,,,,,row 4; malformed",
                        "1.2,8.1,26," + ANSWER);
    }

    @Test
    void anEmptyCellIsNeverADefault() {
        assertThat(csv(HEADER + ",salinity\n1.2,8.1,26,\n", "")).contains("row 1; salinity: missing");
        assertThat(csv(HEADER + ",ph_scale\n1.2,8.1,26,\n", "")).contains("1.2,8.1,26,," + ANSWER);
        assertThat(csv("tan_mg_per_l,ph,temperature_c,temperature_f\n1.2,8.1,26,\n1.2,8.1,,78.8\n1.2,8.1,26,78.8\n", "")
                        .lines()
                        .skip(1))
                .containsExactly(
                        "1.2,8.1,26,," + ANSWER,
                        "1.2,8.1,,78.8," + ANSWER,
                        "1.2,8.1,26,78.8,,,,,,,,,,,,row 3; temperature_f: conflict");
    }

    @Test
    void aResultTakesThePlaceOfAColumnThatBearsItsName() {
        String first = csv("nh3_n_mg_per_l,error,tank," + HEADER + "\n9,9,A,1.2,8.1,26\n9,9,A,1.2,x,26\n", "");
        assertThat(first.lines())
                .containsExactly(
                        "nh3_n_mg_per_l,error,tank," + HEADER + "," + RESULTS.replace("nh3_n_mg_per_l,", "")
                                + "validity,notice_codes",
                        "0.0853803,,A,1.2,8.1,26,0.103813,1.11462,1.43547,0.0711502,9.21577,,,,within,",
                        ",row 2; ph: not-a-number,A,1.2,x,26,,,,,,,,,,");
        assertThat(csv(csv(HEADER + "\n1.2,8.1,26\n", ""), "")).isEqualTo(csv(HEADER + "\n1.2,8.1,26\n", ""));
    }

    @ParameterizedTest
    @CsvSource({
        "pH, ph",
        "Temperature C, temperature_c",
        "temperature-c, temperature_c",
        "temperture_c, temperature_c",
        "salinty, salinity",
        "ph_, ph"
    })
    void aColumnThatIsNearlyAnInputIsRefusedAndBothAreNamed(String column, String meant) {
        Response refused =
                post("text/csv", (HEADER + "," + column + "\n1,8,20,1\n").getBytes(StandardCharsets.UTF_8), "");
        assertThat(refused.statusCode()).isEqualTo(400);
        assertThat(refused.jsonPath().getString("errors[0].field")).isEqualTo(column);
        assertThat(refused.jsonPath().getString("errors[0].nearest")).isEqualTo(meant);
        assertThat(refused.jsonPath().getString("errors[0].detail")).contains(column, meant);
    }

    @ParameterizedTest
    @ValueSource(strings = {"id", "time", "tank", "oxygen", "", "Zeit", "nh3_n_mg_per_l"})
    void otherColumnsAreCarried(String column) {
        assertThat(csv(column + "," + HEADER + "\nx,1.2,8.1,26\n", "")).contains(",1.2,8.1,26,");
    }

    @Test
    void faultsOfTheHeaderComeBeforeTheFirstByteAllAtOnce() {
        Response refused = post("text/csv", "ph,ph,PH Scale\n".getBytes(StandardCharsets.UTF_8), "?temperature_c=20");
        assertThat(refused.statusCode()).isEqualTo(400);
        assertThat(refused.jsonPath().getList("errors.code")).containsExactly("repeated", "unknown", "missing");
        for (String unreadable : new String[] {"", "\n\n", "\uFEFF", "\"ph", "a\u0000b\n"}) {
            Response answer = post("text/csv", unreadable.getBytes(StandardCharsets.UTF_8), "");
            assertThat(answer.statusCode()).as(unreadable).isEqualTo(400);
            assertThat(answer.jsonPath().getString("type")).isEqualTo("/problems/unreadable");
        }
        assertThat(post("text/csv", "ph\n".getBytes(StandardCharsets.UTF_8), "?unit=x")
                        .statusCode())
                .isEqualTo(400);
    }

    @ParameterizedTest
    @ValueSource(strings = {"1.2,\"8.1,26\n1.2,8.1,26\n", "1.2,\"8.1\"x,26\n1.2,8.1,26\n", "1.2,8.1,\""})
    void whereNoFurtherRowCanBeReadTheLastOneSaysSo(String rest) {
        assertThat(csv(HEADER + "\n1.2,8.1,26\n" + rest, "").lines().skip(1))
                .containsExactly("1.2,8.1,26," + ANSWER, ",,,,,,,,,,,,,,row 2; malformed");
    }

    @Test
    void aRowThatIsTooLongIsThatRowsProblem() {
        String tooLong = "x".repeat(17 * 1024);
        assertThat(csv("tank," + HEADER + "\n" + tooLong + ",1.2,8.1,26\nA,1.2,8.1,26\n", "")
                        .lines()
                        .skip(1))
                .containsExactly(",,,,,,,,,,,,,,,row 1; too-large", "A,1.2,8.1,26," + ANSWER);
        String rows = "{\"tag\":\"" + tooLong + "\"}\n" + row() + "\n{\"tag\":\"" + tooLong.repeat(9) + "\"}\n" + row();
        assertThat(ndjson(rows, "?view=compact").lines().map(line -> line.substring(0, 31)))
                .containsExactly(
                        "{\"error\":{\"type\":\"/problems/too",
                        "{\"nh3_n_mg_per_l\":0.0853803,\"nh",
                        "{\"error\":{\"type\":\"/problems/too",
                        "{\"nh3_n_mg_per_l\":0.0853803,\"nh");
    }

    @Test
    void semicolonsImplyTheDecimalComma() {
        String table = "tank;" + HEADER.replace(',', ';') + "\nA.1,2;1,2;8,1;26\nA;1.2;8,1;26\n";
        assertThat(csv(table, "?csv=semicolon").lines().skip(1))
                .containsExactly(
                        "A.1,2;1,2;8,1;26;0,0853803;0,103813;1,11462;1,43547;0,0711502;9,21577;;;;within;;",
                        "A;1.2;8,1;26;;;;;;;;;;;;\"row 2; tan_mg_per_l: not-a-number\"");
        assertThat(csv("tank," + HEADER + "\nA,\"1,2\",8.1,26\n", "?csv=comma")).contains("not-a-number");
    }

    @Test
    void strictRefusesRowByRow() {
        String table = HEADER + "\n1.2,8.1,26\n1.2,8.1,55\n";
        assertThat(csv(table, "")).contains(",outside,,");
        assertThat(csv(table, "?strict=true")).contains(",within,,", "row 2; temperature_c: outside-validity");
    }

    @Test
    void aRowOfNdjsonThatIsBrokenSpoilsNothingElse() {
        String answers = ndjson(row() + "\n{\"ph\":\n\n7\n{\"tag\":5}\n" + row() + "\n", "?view=compact");
        assertThat(answers.lines()
                        .map(line ->
                                line.replaceAll(".*\"status\":(...).*", "$1").replaceAll("\\{\"nh3.*", "200")))
                .containsExactly("200", "400", "400", "422", "200");
    }

    @Test
    void tagsAreEchoedAlsoWithAProblem() {
        String items = "{\"items\":[{\"tag\":\"a\\\"\u00E9\"},{\"tag\":\"b\"," + row().substring(1) + "]}";
        Response answer = post("application/json", items.getBytes(StandardCharsets.UTF_8), "");
        assertThat(answer.jsonPath().getList("items.tag")).containsExactly("a\"\u00E9", "b");
        assertThat(answer.jsonPath().getList("items[0].error.errors.field"))
                .containsExactlyInAnyOrder("ph", "temperature_c", "tan_mg_per_l");
    }

    @Test
    void atomicRefusesAllForOneAndPointsToEachFault() {
        String items = "{\"items\":[" + row() + ",{\"tag\":\"b\",\"ph\":8,\"temperature_c\":99,\"tan_mg_per_l\":1},7]}";
        Response refused = post("application/json", items.getBytes(StandardCharsets.UTF_8), "?atomic=true");
        assertThat(refused.statusCode()).isEqualTo(422);
        assertThat(refused.jsonPath().getList("errors.pointer")).containsExactly("/items/1/temperature_c", "/items/2");
        assertThat(post("text/csv", HEADER.getBytes(StandardCharsets.UTF_8), "?atomic=true")
                        .statusCode())
                .isEqualTo(422);
        String good = "{\"items\":[" + row() + "]}";
        assertThat(post("application/json", good.getBytes(StandardCharsets.UTF_8), "?atomic=true")
                        .asString())
                .isEqualTo(post("application/json", good.getBytes(StandardCharsets.UTF_8), "")
                        .asString());
    }

    @Test
    void jsonMayHoldTenThousandRowsAndNotOneMore() {
        Response most = post("application/json", items(10_000), "?view=compact");
        assertThat(most.statusCode()).isEqualTo(200);
        assertThat(most.jsonPath().getList("items")).hasSize(10_000);
        Response tooMany = post("application/json", items(10_001), "");
        assertThat(tooMany.statusCode()).isEqualTo(413);
        assertThat(tooMany.asString()).contains("10000");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "[]|400",
                "{}|422",
                "{\"items\":{}}|400",
                "{\"rows\":[]}|400",
                "{\"items\":[]} x|400",
                "{\"items\":[{]}|400",
                "{\"items\":[{\"ph\":8}|400",
                "{\"items\":[],\"items\":[]}|400",
                "{\"items\":[],\"x\":1}|400",
                "{\"items\":[]}|200"
            })
    void aBrokenDocumentIsOneProblem(String body, int status) {
        assertThat(post("application/json", body.getBytes(StandardCharsets.UTF_8), "")
                        .statusCode())
                .isEqualTo(status);
    }

    @ParameterizedTest
    @CsvSource({
        "text/csv, application/json, application/json",
        "text/csv, application/x-ndjson, application/x-ndjson",
        "text/csv, '*/*', text/csv",
        "application/json, text/csv, text/csv",
        "application/x-ndjson, 'text/csv;q=0.5, application/json', application/json"
    })
    void theAnswerComesInTheMediumAskedFor(String sent, String accepted, String given) {
        String body = sent.equals("text/csv")
                ? "tank," + HEADER + "\nA,1.2,8.1,26\n"
                : sent.equals("application/json") ? "{\"items\":[" + row() + "]}" : row();
        Response answer = given().port(port)
                .contentType(sent)
                .accept(accepted)
                .body(body.getBytes(StandardCharsets.UTF_8))
                .post(PATH);
        assertThat(answer.contentType()).isEqualTo(given);
        assertThat(answer.asString()).contains("0.0853803");
        assertThat(answer.asString().contains("\"tank\":\"A\""))
                .isEqualTo(sent.equals("text/csv") && !given.equals("text/csv"));
    }

    @Test
    void othersAreRefused() {
        assertThat(post("application/cbor", new byte[0], "").statusCode()).isEqualTo(415);
        assertThat(post("text/csv;charset=utf-16", new byte[0], "").statusCode())
                .isEqualTo(415);
        assertThat(post("text/csv", HEADER.getBytes(StandardCharsets.UTF_8), "?format=cbor")
                        .statusCode())
                .isEqualTo(422);
        Response html = given().port(port)
                .contentType("text/csv")
                .accept("text/html")
                .body(HEADER.getBytes(StandardCharsets.UTF_8))
                .post(PATH);
        assertThat(html.statusCode()).isEqualTo(406);
    }

    @Test
    void aLongTableWithBrokenRowsLosesNoneAndIsTheSameTwice() {
        ByteArrayOutputStream table = new ByteArrayOutputStream();
        table.writeBytes((HEADER + "\n").getBytes(StandardCharsets.US_ASCII));
        for (int i = 0; i < 100_000; i++) {
            String ph = i % 100 == 7 ? "bad" : Double.toString(6 + i % 300 / 100.0);
            table.writeBytes((i / 1000.0 + "," + ph + ",20\n").getBytes(StandardCharsets.US_ASCII));
        }
        byte[] first = post("text/csv", table.toByteArray(), "").asByteArray();
        String[] lines = new String(first, StandardCharsets.US_ASCII).split("\r\n");
        assertThat(lines).hasSize(100_001);
        for (int i = 0; i < 100_000; i++) {
            assertThat(lines[i + 1]).startsWith(i / 1000.0 + ",");
            assertThat(lines[i + 1].endsWith("row " + (i + 1) + "; ph: not-a-number"))
                    .isEqualTo(i % 100 == 7);
        }
        assertThat(post("text/csv", table.toByteArray(), "").asByteArray()).isEqualTo(first);
    }

    private String csv(String body, String query) {
        Response answer = post("text/csv", body.getBytes(StandardCharsets.UTF_8), query);
        assertThat(answer.statusCode()).as(answer.asString()).isEqualTo(200);
        return answer.asString();
    }

    private String ndjson(String body, String query) {
        return post("application/x-ndjson", body.getBytes(StandardCharsets.UTF_8), query)
                .asString();
    }

    private Response post(String type, byte[] body, String query) {
        return given().port(port)
                .urlEncodingEnabled(false)
                .header("Content-Type", type)
                .accept("*/*")
                .body(body)
                .post(PATH + query);
    }

    private static String row() {
        return "{\"tan_mg_per_l\":1.2,\"ph\":8.1,\"temperature_c\":26}";
    }

    private static byte[] items(int count) {
        return IntStream.range(0, count)
                .mapToObj(i -> row())
                .collect(Collectors.joining(",", "{\"items\":[", "]}"))
                .getBytes(StandardCharsets.US_ASCII);
    }
}
