package freshet.ammonia.web;

import static io.restassured.RestAssured.given;
import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.contains;
import static org.hamcrest.Matchers.equalTo;
import static org.hamcrest.Matchers.hasItem;

import freshet.acidity.PhScale;
import freshet.ammonia.AmmoniaMethod;
import freshet.http.HttpTest;
import io.restassured.response.ValidatableResponse;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Random;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.springframework.boot.test.web.server.LocalServerPort;

@HttpTest
class LimitTableHttpTest {

    private static final String SMALL =
            "nh3_n_limit_mg_per_l=0.02&ph_min=7&ph_max=8&ph_step=0.5&temperature_min_c=10&temperature_max_c=20&temperature_step_c=10";
    private static final String PROGRAM = """
            #include <stdio.h>
            #include "limit.h"
            int main(void) {
                float ph, t;
                while (scanf("%f %f", &ph, &t) == 2) {
                    printf("%.9g\\n", (double)freshet_tan_limit_mg_per_l(ph, t));
                }
                return 0;
            }
            """;

    @LocalServerPort
    private int port;

    @Test
    void rowsAreOfPhAndColumnsOfTemperature() {
        table(SMALL)
                .statusCode(200)
                .body("interpolation", equalTo("bilinear"))
                .body("ph", contains(7, 7.5f, 8))
                .body("temperature_c", contains(10, 20))
                .body("tan_limit_mg_per_l.size()", equalTo(3))
                .body("tan_limit_mg_per_l[0].size()", equalTo(2))
                .body("notices.code", hasItem("limit-conditional"));
        String csv = table(SMALL + "&format=csv").extract().asString();
        assertThat(csv.lines()).hasSize(4).first().isEqualTo("ph,10,20");
    }

    @Test
    void theDefaultTableStatesItsLoss() {
        table("nh3_n_limit_mg_per_l=0.02")
                .statusCode(200)
                .body("tan_limit_mg_per_l.size()", equalTo(26))
                .body("tan_limit_mg_per_l[0].size()", equalTo(19))
                .body("interpolation_loss_percent", equalTo(1.1f));
    }

    @Test
    void gridsThatCannotBeAreRefusedTogether() {
        table("nh3_n_limit_mg_per_l=0.02&ph_step=0.3&temperature_max_c=-1")
                .statusCode(422)
                .body("errors.field", contains("ph_step", "temperature_max_c"));
        table("nh3_n_limit_mg_per_l=0.02&ph_step=0.01&temperature_step_c=0.1")
                .statusCode(422)
                .body("errors.code", contains("above-maximum"));
        given().port(port)
                .contentType("application/json")
                .body("{}")
                .post("/v1/ammonia/limit-table")
                .then()
                .statusCode(405)
                .header("Allow", "GET, HEAD, OPTIONS");
        given().port(port)
                .get("/v1/ammonia/speciation?tan_mg_per_l=1&ph=8&temperature_c=20&format=c")
                .then()
                .statusCode(422)
                .body("errors.code", contains("not-allowed"));
    }

    @Test
    void theHeaderCompilesAndIsNeverAboveTheServiceNorFarBelow(@TempDir Path folder) throws Exception {
        Assumptions.assumeTrue(isThere("cc"), "there is no C compiler");
        String header = table("nh3_n_limit_mg_per_l=0.02&format=c").extract().asString();
        assertThat(header).doesNotContain("#include").doesNotContain("20" + "26");
        Files.writeString(folder.resolve("limit.h"), header);
        Files.writeString(folder.resolve("main.c"), PROGRAM);
        run(folder, "cc", "-std=c99", "-Wall", "-Wextra", "-Werror", "-pedantic", "-o", "main", "main.c");
        StringBuilder questions = new StringBuilder("nan 20\n8 nan\n9.01 20\n8 36.1\n6 -2\n9 36\n");
        Random random = new Random(3);
        float[][] points = new float[10_000][2];
        for (float[] point : points) {
            point[0] = 6.5f + 2.5f * random.nextFloat();
            point[1] = 36 * random.nextFloat();
            questions.append(point[0]).append(' ').append(point[1]).append('\n');
        }
        Files.writeString(folder.resolve("in"), questions);
        List<String> answers = run(folder, "sh", "-c", "./main < in");
        assertThat(answers.subList(0, 4)).containsOnly("0");
        assertThat(Float.parseFloat(answers.get(4))).isEqualTo(firstNode());
        assertThat(Double.parseDouble(answers.get(5))).isPositive();
        for (int i = 0; i < points.length; i++) {
            double exact = 0.02
                    / AmmoniaMethod.EMERSON_1975.dissociation().fraction(points[i][0], points[i][1], 0, PhScale.NBS);
            assertThat(Double.parseDouble(answers.get(i + 6)) / exact).isBetween(0.988, 1.0);
        }
    }

    private float firstNode() {
        String csv = table("nh3_n_limit_mg_per_l=0.02&format=csv").extract().asString();
        return Float.parseFloat(csv.lines().skip(1).findFirst().orElseThrow().split(",")[1]);
    }

    private static boolean isThere(String program) throws Exception {
        return new ProcessBuilder("sh", "-c", "command -v " + program).start().waitFor() == 0;
    }

    private static List<String> run(Path folder, String... command) throws IOException, InterruptedException {
        Process process = new ProcessBuilder(command)
                .directory(folder.toFile())
                .redirectErrorStream(true)
                .start();
        List<String> lines = process.inputReader().lines().toList();
        assertThat(process.waitFor(60, TimeUnit.SECONDS)).isTrue();
        assertThat(process.exitValue()).as(String.join("\n", lines)).isZero();
        return lines;
    }

    private ValidatableResponse table(String query) {
        return given().port(port)
                .urlEncodingEnabled(false)
                .get("/v1/ammonia/limit-table?" + query)
                .then();
    }
}
