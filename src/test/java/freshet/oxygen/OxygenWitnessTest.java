package freshet.oxygen;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import freshet.PublishedTable;
import freshet.PublishedTable.Row;
import freshet.salinity.MilleroPoisson1981;
import java.util.List;
import java.util.SplittableRandom;
import java.util.stream.Stream;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Saturation and pressure against other published formulas, over the whole range. */
class OxygenWitnessTest {

    private static final double SEA_LEVEL = BensonKrause1984.ATMOSPHERE_HPA;
    private static final double SCALE_1968 = 1.00024;

    static List<Row> rows() {
        return Stream.of("garcia-gordon-1992", "weiss-1970", "weiss-price-1980", "fao-56")
                .flatMap(method -> PublishedTable.of(method).rows().stream())
                .toList();
    }

    @ParameterizedTest
    @MethodSource("rows")
    void everyWitnessIsItselfReproduced(Row row) {
        assertThat(witness(row)).isCloseTo(row.expected(), within(row.tolerance()));
    }

    /** Two fits to the same measurements; the source states ±0.1 % for them. */
    @Test
    void garciaAndGordonAgreePerKilogramAndPerLitre() {
        for (double t = 0; t <= 40; t++) {
            for (double s = 0; s <= 40; s += 5) {
                double ours = BensonKrause1984.mgPerL(t, s, SEA_LEVEL);
                double perKg = OxygenWitnesses.garciaGordonPerKg(t, s) * MilleroPoisson1981.kgPerM3(t, s);
                double perL = OxygenWitnesses.garciaGordonMlPerL(t, s) * OxygenWitnesses.MICROMOL_PER_ML;
                assertThat(perKg * OxygenWitnesses.G_PER_MICROMOL).isCloseTo(ours, Percentage.withPercentage(0.026));
                assertThat(perL * OxygenWitnesses.G_PER_MICROMOL * 1000)
                        .isCloseTo(ours, Percentage.withPercentage(0.035));
            }
        }
    }

    /** Older measurements, which Benson and Krause corrected by a few thousandths. */
    @Test
    void weissLiesWithinSixThousandths() {
        for (double t = 0; t <= 40; t++) {
            for (double s = 0; s <= 40; s += 5) {
                assertThat(OxygenWitnesses.weissMgPerL(t, s))
                        .isCloseTo(BensonKrause1984.mgPerL(t, s, SEA_LEVEL), Percentage.withPercentage(0.6));
            }
        }
    }

    /** What pressure does to saturation follows from the vapour pressure, for which there is an independent formula. */
    @Test
    void theVapourPressureBehindTheCorrectionIsThatOfWeissAndPrice() {
        SplittableRandom random = new SplittableRandom(1984);
        for (int i = 0; i < 2000; i++) {
            double t = random.nextDouble(0, 40);
            double p = random.nextDouble(0.5, 0.9);
            double o = 0.000975 - 1.426e-5 * t + 6.436e-8 * t * t;
            double share = BensonKrause1984.mgPerL(t, 0, p * SEA_LEVEL)
                    / BensonKrause1984.mgPerL(t, 0, SEA_LEVEL)
                    * (1 - o)
                    / (1 - o * p);
            assertThat((p - share) / (1 - share))
                    .isCloseTo(OxygenWitnesses.weissPriceVapour(t, 0), Percentage.withPercentage(0.1));
        }
    }

    @Test
    void nothingButNumbersComesOutAnywhereWithinTheBounds() {
        SplittableRandom random = new SplittableRandom(31998);
        for (int i = 0; i < 20000; i++) {
            double t = random.nextDouble(-2, Math.nextUp(60.0));
            double s = random.nextDouble(0, Math.nextUp(45.0));
            double p = random.nextDouble(300, Math.nextUp(1100.0));
            assertThat(BensonKrause1984.mgPerL(t, s, p)).isBetween(0.4, 17.0);
            assertThat(BensonKrause1984.mgPerL(t, s, p + 1)).isGreaterThan(BensonKrause1984.mgPerL(t, s, p));
        }
    }

    /** FAO-56 takes 20 °C at sea level, the standard atmosphere 15 °C: they part by 0.4 % at 2000 m, 1.3 % at 6000 m. */
    @Test
    void theStandardAtmosphereAgreesWithFao56() {
        for (double altitude = -430; altitude <= 6000; altitude += 10) {
            assertThat(10 * OxygenWitnesses.fao56(altitude))
                    .isCloseTo(
                            StandardAtmosphere1976.hPa(altitude),
                            Percentage.withPercentage(altitude < 2000 ? 0.4 : 1.3));
            assertThat(StandardAtmosphere1976.hPa(altitude + 10)).isLessThan(StandardAtmosphere1976.hPa(altitude));
        }
    }

    @Test
    void validityFollowsTheSource() {
        assertThat(BensonKrause1984.validity(0, 0, 506.625).within()).isTrue();
        assertThat(BensonKrause1984.validity(40, 40, 1100).within()).isTrue();
        assertThat(BensonKrause1984.validity(Math.nextDown(0.0), 0, 1000).within())
                .isFalse();
        assertThat(BensonKrause1984.validity(20, Math.nextUp(40.0), 1000).within())
                .isFalse();
        assertThat(BensonKrause1984.validity(20, 0, 506).within()).isFalse();
    }

    private static double witness(Row row) {
        double s = row.inputs().containsKey("s") ? row.number("s") : 0;
        return switch (row.output()) {
            case "ml_per_l" -> OxygenWitnesses.garciaGordonMlPerL(row.number("t68"), s);
            case "umol_per_l" ->
                OxygenWitnesses.garciaGordonMlPerL(row.number("t68"), s) * OxygenWitnesses.MICROMOL_PER_ML;
            case "umol_per_kg" -> OxygenWitnesses.garciaGordonPerKg(row.number("t90") * SCALE_1968, s);
            case "bunsen" -> OxygenWitnesses.weissBunsen(row.number("t"), s);
            case "vapour_atm" -> OxygenWitnesses.weissPriceVapour(row.number("t"), s);
            case "kpa" -> OxygenWitnesses.fao56(row.number("z_m"));
            default -> throw new IllegalArgumentException(row.output());
        };
    }
}
