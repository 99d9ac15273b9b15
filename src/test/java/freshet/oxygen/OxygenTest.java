package freshet.oxygen;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import freshet.PublishedTable;
import freshet.PublishedTable.Row;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class OxygenTest {

    static List<Row> oxygen() {
        return PublishedTable.of("benson-krause-1984").rows();
    }

    static List<Row> pressure() {
        return PublishedTable.of("standard-atmosphere-1976").rows();
    }

    @ParameterizedTest
    @MethodSource("oxygen")
    void everyRowIsReproduced(Row row) {
        assertThat(saturation(BensonKrause1984.METHOD.values(), row))
                .isCloseTo(row.expected(), within(row.tolerance()));
    }

    @ParameterizedTest
    @MethodSource("pressure")
    void everyPressureIsReproduced(Row row) {
        assertThat(StandardAtmosphere1976.hPa(row.number("altitude_m")))
                .isCloseTo(row.expected(), within(row.tolerance()));
    }

    private static double saturation(double[] constants, Row row) {
        double atmospheres = row.inputs().containsKey("P_atm")
                ? row.number("P_atm")
                : StandardAtmosphere1976.hPa(row.number("altitude_m")) / BensonKrause1984.ATMOSPHERE_HPA;
        return BensonKrause1984.mgPerL(constants, row.number("t"), row.number("s"), atmospheres);
    }

    @Test
    void everyConstantMatters() {
        for (int i = 0; i < BensonKrause1984.METHOD.values().length; i++) {
            double[] nudged = BensonKrause1984.METHOD.values();
            nudged[i] *= 1.001;
            assertThat(oxygen())
                    .as(BensonKrause1984.METHOD.constants().get(i).symbol())
                    .anyMatch(row -> !row.agrees(saturation(nudged, row)));
        }
        for (int i = 0; i < StandardAtmosphere1976.METHOD.values().length; i++) {
            double[] nudged = StandardAtmosphere1976.METHOD.values();
            nudged[i] *= 1.001;
            assertThat(pressure())
                    .anyMatch(row -> !row.agrees(StandardAtmosphere1976.hPa(nudged, row.number("altitude_m"))));
        }
    }

    @Test
    void itFallsWithWarmthSaltAndHeight() {
        for (double t = -2; t < 60; t++) {
            for (double s = 0; s < 45; s += 5) {
                double here = BensonKrause1984.mgPerL(t, s, 1000);
                assertThat(here)
                        .isGreaterThan(BensonKrause1984.mgPerL(t + 1, s, 1000))
                        .isGreaterThan(BensonKrause1984.mgPerL(t, s + 5, 1000))
                        .isGreaterThan(BensonKrause1984.mgPerL(t, s, 950))
                        .isPositive();
            }
        }
        assertThat(BensonKrause1984.mgPerL(60, 45, 300)).isPositive();
    }

    /** Garcia and Gordon 1992, doi:10.4319/lo.1992.37.6.1307: 282.015 umol/L at salinity 35, 10 °C (printed, secondary). */
    @Test
    void anIndependentFitAgrees() {
        assertThat(BensonKrause1984.mgPerL(10, 35, BensonKrause1984.ATMOSPHERE_HPA))
                .isCloseTo(282.015 * 31.998e-3, within(0.01));
    }
}
