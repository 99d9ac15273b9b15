package freshet.acidity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import freshet.PublishedTable;
import freshet.PublishedTable.Row;
import freshet.method.Method;
import java.util.List;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class ScaleConversionTest {

    static List<Row> dickson() {
        return PublishedTable.of("dickson-1990").rows();
    }

    static List<Row> dicksonRiley() {
        return PublishedTable.of("dickson-riley-1979").rows();
    }

    @ParameterizedTest
    @MethodSource({"dickson", "dicksonRiley"})
    void everyRowIsReproduced(Row row) {
        double t = row.number("t");
        double s = row.number("s");
        double value = switch (row.output()) {
            case "ln_ks" -> Dickson1990.lnConstant(Dickson1990.METHOD.values(), t, s);
            case "ln_kf" -> DicksonRiley1979.lnConstant(DicksonRiley1979.METHOD.values(), t, s);
            default -> Math.log10(DicksonRiley1979.seawaterPerFree(t, s) / Dickson1990.totalPerFree(t, s));
        };
        assertThat(value).isCloseTo(row.expected(), within(row.tolerance()));
    }

    @Test
    void everyConstantMatters() {
        IntStream.range(0, Dickson1990.METHOD.values().length)
                .forEach(index -> assertThat(PublishedTable.of("dickson-1990").rows("ln_ks"))
                        .anyMatch(row -> !row.agrees(Dickson1990.lnConstant(
                                nudged(Dickson1990.METHOD, index), row.number("t"), row.number("s")))));
        IntStream.range(0, DicksonRiley1979.METHOD.values().length)
                .forEach(index -> assertThat(
                                PublishedTable.of("dickson-riley-1979").rows("ln_kf"))
                        .anyMatch(row -> !row.agrees(DicksonRiley1979.lnConstant(
                                nudged(DicksonRiley1979.METHOD, index), row.number("t"), row.number("s")))));
    }

    @Test
    void inFreshWaterAllScalesAreOne() {
        for (double t = -2; t <= 60; t += 2) {
            assertThat(Dickson1990.totalPerFree(t, 0)).isEqualTo(1);
            assertThat(DicksonRiley1979.seawaterPerFree(t, 0)).isEqualTo(1);
        }
    }

    /** Dickson, Sabine and Christian 2007: at salinity 35, 25 °C the free scale lies 0.108 above the total scale. */
    @Test
    void inSeaWaterTheScalesLieApart() {
        assertThat(Math.log10(Dickson1990.totalPerFree(25, 35))).isCloseTo(0.108, within(0.0006));
        for (double s = 1; s <= 45; s++) {
            assertThat(DicksonRiley1979.seawaterPerFree(20, s))
                    .isGreaterThan(Dickson1990.totalPerFree(20, s))
                    .isBetween(1.0, 1.4);
        }
    }

    /** Dickson, Sabine and Christian 2007: ionic strength of sea water; values of a public library (computed). */
    @Test
    void ionicStrengthFollowsSalinity() {
        assertThat(SeaSalt.ionicStrength(0.5)).isCloseTo(0.00996701, within(1e-7));
        assertThat(SeaSalt.ionicStrength(5)).isCloseTo(0.10012312, within(1e-7));
        assertThat(SeaSalt.ionicStrength(35)).isCloseTo(0.72276, within(5e-6));
    }

    private static double[] nudged(Method method, int index) {
        double[] constants = method.values();
        constants[index] *= 1.001;
        return constants;
    }
}
