package freshet.salinity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import freshet.PublishedTable;
import freshet.PublishedTable.Row;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class SalinityTest {

    private static final Hill1986 LOW = new Hill1986(Hill1986.METHOD.values());

    static List<Row> salinity() {
        return PublishedTable.of("practical-salinity-1978").rows();
    }

    static List<Row> density() {
        return PublishedTable.of("millero-poisson-1981").rows();
    }

    @ParameterizedTest
    @MethodSource("salinity")
    void everySalinityIsReproduced(Row row) {
        assertThat(value(PracticalSalinity1978.published(), row)).isCloseTo(row.expected(), within(row.tolerance()));
    }

    @ParameterizedTest
    @MethodSource("density")
    void everyDensityIsReproduced(Row row) {
        assertThat(MilleroPoisson1981.kgPerM3(row.number("t"), row.number("s")))
                .isCloseTo(row.expected(), within(row.tolerance()));
    }

    private static double value(PracticalSalinity1978 scale, Row row) {
        if (row.output().equals("sp")) {
            return scale.salinity(row.number("c"), row.number("t90"));
        }
        // Official values at depth; the pressure term of UNESCO 44, which water in a tank does not need.
        double t = row.number("t68");
        double p = row.number("p");
        double r = row.number("R");
        double pressure = 1
                + p
                        * (2.070e-5 - 6.370e-10 * p + 3.989e-15 * p * p)
                        / (1 + 3.426e-2 * t + 4.464e-4 * t * t + (0.4215 - 3.107e-3 * t) * r);
        double[] c = PracticalSalinity1978.METHOD.values();
        double temperature = c[1] + t * (c[2] + t * (c[3] + t * (c[4] + t * c[5])));
        return scale.ofRatio(r / (pressure * temperature), t);
    }

    @Test
    void everyConstantMatters() {
        for (int i = 0; i < PracticalSalinity1978.METHOD.values().length; i++) {
            double[] nudged = PracticalSalinity1978.METHOD.values();
            nudged[i] *= 1.001;
            PracticalSalinity1978 scale = new PracticalSalinity1978(nudged, LOW);
            assertThat(salinity())
                    .as(PracticalSalinity1978.METHOD.constants().get(i).symbol())
                    .anyMatch(row -> !row.agrees(value(scale, row)));
        }
        for (int i = 0; i < Hill1986.METHOD.values().length; i++) {
            double[] nudged = Hill1986.METHOD.values();
            nudged[i] *= 1.001;
            PracticalSalinity1978 scale =
                    new PracticalSalinity1978(PracticalSalinity1978.METHOD.values(), new Hill1986(nudged));
            assertThat(salinity())
                    .as(Hill1986.METHOD.constants().get(i).symbol())
                    .anyMatch(row -> !row.agrees(value(scale, row)));
        }
        for (int i = 0; i < MilleroPoisson1981.METHOD.values().length; i++) {
            double[] nudged = MilleroPoisson1981.METHOD.values();
            nudged[i] *= 1.001;
            assertThat(density())
                    .as(MilleroPoisson1981.METHOD.constants().get(i).symbol())
                    .anyMatch(row -> !row.agrees(MilleroPoisson1981.kgPerM3(nudged, row.number("t"), row.number("s"))));
        }
    }

    @Test
    void salinityRisesWithConductivityWithoutAJumpAndIsNeverLessThanNone() {
        PracticalSalinity1978 scale = PracticalSalinity1978.published();
        for (double t = -2; t <= 60; t += 2) {
            double before = scale.salinity(0, t);
            assertThat(before).isGreaterThanOrEqualTo(0);
            for (double c = 0.01; c <= 100; c += c < 6 ? 0.01 : 0.5) {
                double here = scale.salinity(c, t);
                assertThat(here).as(c + " at " + t).isGreaterThanOrEqualTo(before);
                assertThat(here - before).isLessThan(c < 6 ? 0.05 : 1.2);
                before = here;
            }
        }
    }

    @Test
    void densityIsFiniteAndRisesWithSalt() {
        for (double t = -2; t <= 60; t++) {
            for (double s = 0; s < 140; s += 5) {
                assertThat(MilleroPoisson1981.kgPerM3(t, s + 5)).isGreaterThan(MilleroPoisson1981.kgPerM3(t, s));
            }
        }
    }
}
