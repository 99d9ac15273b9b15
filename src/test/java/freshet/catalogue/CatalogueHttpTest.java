package freshet.catalogue;

import static io.restassured.RestAssured.given;
import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.containsString;
import static org.hamcrest.Matchers.equalTo;
import static org.hamcrest.Matchers.hasItem;
import static org.hamcrest.Matchers.not;

import freshet.http.Calculation;
import freshet.http.Calculations;
import freshet.http.HttpTest;
import freshet.http.problem.ProblemType;
import freshet.method.Method;
import io.restassured.response.Response;
import io.restassured.specification.RequestSpecification;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.boot.test.web.server.LocalServerPort;

/** What the service tells of itself. */
@HttpTest
class CatalogueHttpTest {

    @LocalServerPort
    private int port;

    @Autowired
    private Calculations calculations;

    @Test
    void everyMethodOfEveryCalculationIsInTheCatalogue() {
        for (Calculation<?, ?> calculation : calculations.all()) {
            assertThat(Methods.all()).containsAll(calculation.methods());
        }
    }

    @Test
    void everyMethodIsUsedAndSaysWhereItComesFrom() {
        List<String> ids = Methods.all().stream().map(Method::id).toList();
        assertThat(ids).doesNotHaveDuplicates();
        for (Method method : Methods.all()) {
            Response response = given().port(port).get("/v1/methods/" + method.id());
            assertThat(response.statusCode()).isEqualTo(200);
            assertThat(response.<String>path("citation")).isNotBlank();
            assertThat(response.<String>path("equation")).as(method.id()).isNotBlank();
            assertThat(response.<String>path("source_seen")).isIn("printed", "secondary", "memory");
            assertThat(response.<List<String>>path("calculations"))
                    .as(method.id())
                    .isNotEmpty();
            assertThat(ids).containsAll(method.uses());
        }
    }

    @Test
    void constantsAreShownInFull() {
        given().port(port)
                .get("/v1/methods/clegg-whitfield-1995")
                .then()
                .statusCode(200)
                .body(containsString("0.0090226468"))
                .body(containsString("-0.00002354039"))
                .body("uses", hasItem("dickson-1990"));
        given().port(port)
                .get("/v1/constants")
                .then()
                .statusCode(200)
                .body("molar_masses.find { it.symbol == 'NH3' }.value", equalTo(17.031f));
    }

    @Test
    void theListIsFilteredByCalculation() {
        given().port(port)
                .get("/v1/methods?calculation=ammonia/speciation")
                .then()
                .statusCode(200)
                .body("items.id", hasItem("emerson-1975"))
                .body("items.id", not(hasItem("eifac-1970")));
        given().port(port)
                .get("/v1/methods?calculation=ammonia/speciatio")
                .then()
                .statusCode(422)
                .body("errors[0].code", equalTo("not-allowed"))
                .body("errors[0].nearest", equalTo("ammonia/speciation"));
        given().port(port)
                .get("/v1/methods?calculatio=x")
                .then()
                .statusCode(400)
                .body("errors[0].nearest", equalTo("calculation"));
    }

    @Test
    void anUnknownMethodIs404WithTheNearest() {
        given().port(port)
                .get("/v1/methods/emerson-1976")
                .then()
                .statusCode(404)
                .contentType("application/problem+json")
                .body("detail", containsString("emerson-1975"));
    }

    @Test
    void everyProblemTypeHasItsPage() {
        for (ProblemType type : ProblemType.values()) {
            given().port(port)
                    .get("/problems/" + type.id())
                    .then()
                    .statusCode(200)
                    .body("type", equalTo("/problems/" + type.id()))
                    .body("status", equalTo(type.status()));
        }
        given().port(port)
                .get("/problems")
                .then()
                .statusCode(200)
                .body("items.size()", equalTo(ProblemType.values().length));
        given().port(port).get("/problems/none").then().statusCode(404);
    }

    @Test
    void theLandingPageFitsOnAScreenAndItsLinesWork() {
        Response landing = given().port(port).accept("*/*").get("/");
        assertThat(landing.contentType()).startsWith("text/plain");
        List<String> lines = landing.asString().lines().toList();
        assertThat(lines)
                .hasSizeLessThanOrEqualTo(40)
                .allSatisfy(line -> assertThat(line.length()).isLessThan(320));
        List<String> curls =
                lines.stream().filter(line -> line.startsWith("curl '")).toList();
        assertThat(curls).hasSameSizeAs(calculations.all());
        for (String line : curls) {
            String[] quoted = line.split("'");
            RequestSpecification request = given().urlEncodingEnabled(false);
            Response answer = quoted.length > 2
                    ? request.contentType("application/json").body(quoted[5]).post(quoted[1])
                    : request.get(quoted[1]);
            assertThat(answer.statusCode()).as(line).isEqualTo(200);
        }
    }

    @Test
    void theLandingPageIsThereForBrowsersAndPrograms() {
        given().port(port)
                .accept("text/html,application/xhtml+xml,*/*;q=0.8")
                .get("/")
                .then()
                .contentType(containsString("text/html"))
                .body(containsString("/docs"));
        given().port(port)
                .accept("application/json")
                .get("/")
                .then()
                .body("items.path", hasItem("/v1/ammonia/speciation"));
    }

    @Test
    void pagesHaveALengthAndAnEntityTag() {
        for (String page : List.of("/", "/v1/methods", "/v1/constants", "/problems")) {
            Response response = given().port(port).accept("*/*").get(page);
            assertThat(response.header("Content-Length")).isEqualTo("" + response.asByteArray().length);
            given().port(port)
                    .accept("*/*")
                    .header("If-None-Match", response.header("ETag"))
                    .get(page)
                    .then()
                    .statusCode(304);
        }
    }

    @Test
    void healthIsAskedOnTheMainPort() {
        given().port(port).get("/livez").then().statusCode(200).body("status", equalTo("UP"));
        given().port(port).get("/readyz").then().statusCode(200).body("status", equalTo("UP"));
    }
}
