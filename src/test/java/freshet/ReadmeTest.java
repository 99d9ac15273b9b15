package freshet;

import static io.restassured.RestAssured.given;
import static org.assertj.core.api.Assertions.assertThat;

import freshet.http.Calculation;
import freshet.http.Calculations;
import freshet.http.HttpTest;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.regex.MatchResult;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.boot.test.web.server.LocalServerPort;

/** What the README shows is what the service answers. */
@HttpTest
class ReadmeTest {

    private static final Pattern EXAMPLE = Pattern.compile("\\$ curl '(http://localhost:8080)([^']+)'\n(.+\n)");

    private static final Pattern EXAMPLE_WITH_BODY = Pattern.compile(
            "\\$ curl 'http://localhost:8080([^']+)' -H 'Content-Type: ([^']+)' --data-binary '([^']+)'\n([^`]+)```");

    @LocalServerPort
    private int port;

    @Autowired
    private Calculations calculations;

    @Test
    void everyExampleShowsTheRealAnswer() throws IOException {
        List<MatchResult> examples = EXAMPLE.matcher(readme()).results().toList();
        assertThat(examples).hasSizeGreaterThanOrEqualTo(3);
        for (MatchResult example : examples) {
            String answer = given().port(port)
                    .urlEncodingEnabled(false)
                    .accept("*/*")
                    .get(example.group(2))
                    .asString();
            assertThat(example.group(3)).as(example.group(2)).isEqualTo(answer);
        }
        long withBody = EXAMPLE_WITH_BODY.matcher(readme()).results().count();
        assertThat(readme().split("\\$ curl", -1)).hasSize(examples.size() + (int) withBody + 1);
    }

    @Test
    void everyExampleWithABodyShowsTheRealAnswer() throws IOException {
        List<MatchResult> examples =
                EXAMPLE_WITH_BODY.matcher(readme()).results().toList();
        assertThat(examples).isNotEmpty();
        for (MatchResult example : examples) {
            String answer = given().port(port)
                    .urlEncodingEnabled(false)
                    .accept("*/*")
                    .header("Content-Type", example.group(2))
                    .body(example.group(3).getBytes(StandardCharsets.UTF_8))
                    .post(example.group(1))
                    .asString();
            assertThat(example.group(4)).as(example.group(1)).isEqualTo(answer.replace("\r\n", "\n"));
        }
    }

    @Test
    void everyCalculationIsInTheTable() throws IOException {
        for (Calculation<?, ?> calculation : calculations.all()) {
            assertThat(readme()).contains("| `" + calculation.path() + "` |");
        }
    }

    private static String readme() throws IOException {
        return Files.readString(Path.of("README.md"));
    }
}
