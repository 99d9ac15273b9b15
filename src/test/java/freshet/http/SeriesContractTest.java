package freshet.http;

import static io.restassured.RestAssured.given;
import static org.assertj.core.api.Assertions.assertThat;

import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.NamedCsvRecord;
import freshet.http.binding.Input;
import io.restassured.response.Response;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Consumer;
import java.util.stream.Collectors;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.boot.test.web.server.LocalServerPort;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

/** What holds for the series of every calculation: a row is answered as a single request with the same inputs is. */
@HttpTest
class SeriesContractTest {

    private static final JsonMapper MAPPER = JsonMapper.builder().build();
    private static final String JSON = "application/json";
    private static final String CSV = "text/csv";
    private static final String NDJSON = "application/x-ndjson";

    @LocalServerPort
    private int port;

    @Autowired
    private Calculations calculations;

    @Test
    void everyFlatCalculationHasASeriesAndNoOther() {
        for (Calculation<?, ?> calculation : calculations.all()) {
            int status = given().port(port).get(calculation.seriesAddress()).statusCode();
            boolean flat = calculation.inputs().flat() && calculation.outputs().flat();
            assertThat(status).as(calculation.path()).isEqualTo(flat ? 405 : 404);
        }
    }

    @TestFactory
    List<DynamicTest> aLineOfNdjsonIsAnsweredWithTheVeryBytesOfASingleAnswer() {
        return each(calculation -> {
            String single = single(calculation, "");
            Response series = post(calculation, "", NDJSON, row(calculation) + "\n" + row(calculation) + "\r\n");
            assertThat(series.asString()).isEqualTo(single + single);
            assertThat(series.contentType()).isEqualTo(NDJSON);
            assertThat(series.header("Cache-Control")).isEqualTo("no-store");
            assertThat(post(calculation, "?view=compact", NDJSON, row(calculation))
                            .asString())
                    .isEqualTo(single(calculation, "&view=compact"));
        });
    }

    @TestFactory
    List<DynamicTest> itemsOfJsonAreAnsweredInOrderEachAsASingleRequest() {
        return each(calculation -> {
            JsonNode single = MAPPER.readTree(single(calculation, ""));
            String tagged = row(calculation).replaceFirst("}$", ",\"tag\":\"b\"}");
            Response series =
                    post(calculation, "", JSON, "{\"items\":[" + row(calculation) + "," + tagged + ",{\"no\":1}]}");
            JsonNode items = MAPPER.readTree(series.asString()).get("items");
            assertThat(items).hasSize(3);
            assertThat(items.get(0)).isEqualTo(single);
            assertThat(items.get(1).get("tag").asString()).isEqualTo("b");
            assertThat(items.get(1).size()).isEqualTo(single.size() + 1);
            assertThat(items.get(2).at("/error/status").asInt()).isEqualTo(400);
            assertThat(items.get(2).at("/error/errors/0/pointer").asString()).isEqualTo("/items/2/no");
        });
    }

    @TestFactory
    List<DynamicTest> aTableHoldsTheSameTextAsJson() {
        return each(calculation -> {
            JsonNode single = MAPPER.readTree(single(calculation, "&view=compact"));
            Map<String, String> inputs = inputs(calculation);
            String table =
                    "time_stamp," + String.join(",", inputs.keySet()) + "\n2026-01-01 00:00," + cells(inputs) + "\n";
            Response series = post(calculation, "", CSV, table);
            assertThat(series.asString()).startsWith(table.substring(0, table.indexOf('\n')));
            NamedCsvRecord row = CsvReader.builder().ofNamedCsvRecord(series.asString()).stream()
                    .findFirst()
                    .orElseThrow();
            assertThat(row.getField("time_stamp")).isEqualTo("2026-01-01 00:00");
            assertThat(row.getField("error")).isEmpty();
            single.forEachEntry((name, value) -> {
                if (!name.startsWith("method")) {
                    assertThat(row.getField(name))
                            .as(name)
                            .isEqualTo(value.isNumber() ? value.decimalValue().toPlainString() : value.asString());
                }
            });
        });
    }

    @TestFactory
    List<DynamicTest> valuesInTheQueryAreThoseOfEveryRow() {
        return each(calculation -> {
            Map<String, String> inputs = inputs(calculation);
            String last = List.copyOf(inputs.keySet()).get(inputs.size() - 1);
            String constant = last + "=" + inputs.remove(last);
            String table = String.join(",", inputs.keySet()) + "\n" + cells(inputs) + "\n";
            String answer =
                    post(calculation, "?format=ndjson&" + constant, CSV, table).asString();
            assertThat(answer).isEqualTo(single(calculation, ""));
            Response twice = post(calculation, "?" + constant, JSON, "{\"items\":[" + row(calculation) + "]}");
            assertThat(twice.statusCode()).isEqualTo(400);
            assertThat(MAPPER.readTree(twice.asString()).at("/errors/0/code").asString())
                    .isEqualTo("repeated");
        });
    }

    @TestFactory
    List<DynamicTest> aColumnThatEveryRowNeedsIsAskedForAtOnce() {
        return each(calculation -> {
            for (Input input : calculation.inputs().inputs()) {
                Map<String, String> inputs = inputs(calculation);
                if (input.required() && inputs.remove(input.name()) != null) {
                    Response refused = post(calculation, "", CSV, String.join(",", inputs.keySet()) + "\n");
                    assertThat(refused.statusCode()).isEqualTo(422);
                    assertThat(refused.asString()).contains("\"" + input.name() + "\",\"code\":\"missing\"");
                }
            }
        });
    }

    private List<DynamicTest> each(Consumer<Calculation<?, ?>> check) {
        return calculations.all().stream()
                .filter(Calculation::hasSeries)
                .map(calculation -> DynamicTest.dynamicTest(calculation.path(), () -> check.accept(calculation)))
                .toList();
    }

    private String single(Calculation<?, ?> calculation, String controls) {
        return given().port(port)
                .urlEncodingEnabled(false)
                .get(calculation.address() + "?" + calculation.example() + controls)
                .asString();
    }

    private Response post(Calculation<?, ?> calculation, String query, String type, String body) {
        return given().port(port)
                .urlEncodingEnabled(false)
                .contentType(type)
                .accept("*/*")
                .body(body.getBytes(StandardCharsets.UTF_8))
                .post(calculation.seriesAddress() + query);
    }

    private static Map<String, String> inputs(Calculation<?, ?> calculation) {
        Map<String, String> inputs = new LinkedHashMap<>();
        for (String pair : calculation.example().split("&")) {
            inputs.put(pair.substring(0, pair.indexOf('=')), pair.substring(pair.indexOf('=') + 1));
        }
        return inputs;
    }

    private static String cells(Map<String, String> inputs) {
        return inputs.values().stream()
                .map(value -> value.contains(",") ? "\"" + value + "\"" : value)
                .collect(Collectors.joining(","));
    }

    private static String row(Calculation<?, ?> calculation) {
        List<String> members = new ArrayList<>();
        inputs(calculation).forEach((name, value) -> {
            boolean quoted = calculation.inputs().input(name).enumerated();
            members.add("\"" + name + "\":" + (quoted ? "\"" + value + "\"" : value));
        });
        return members.stream().collect(Collectors.joining(",", "{", "}"));
    }
}
