package freshet.http;

import static io.restassured.RestAssured.given;
import static org.hamcrest.Matchers.equalTo;

import org.junit.jupiter.api.Test;
import org.springframework.boot.test.web.server.LocalServerPort;
import org.springframework.test.context.TestPropertySource;

/** A service that takes on no calculation at all turns every one away. */
@HttpTest
@TestPropertySource(properties = "freshet.limits.calculations-at-once=0")
class BusyHttpTest {

    @LocalServerPort
    private int port;

    @Test
    void aCalculationTooManyIsTurnedAwayAtOnce() {
        given().port(port)
                .get("/v1/ammonia/speciation?tan_mg_per_l=1&ph=8&temperature_c=24")
                .then()
                .statusCode(503)
                .header("Retry-After", "1")
                .header("Cache-Control", "no-store")
                .contentType("application/problem+json")
                .body("type", equalTo("/problems/busy"));
    }

    @Test
    void theCatalogueAndHealthAreStillThere() {
        given().port(port).get("/v1/methods").then().statusCode(200);
        given().port(port).get("/readyz").then().statusCode(200);
    }
}
