package freshet.carbonate;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import freshet.PublishedTable;
import freshet.PublishedTable.Row;
import freshet.acidity.Dickson1990;
import freshet.acidity.DicksonRiley1979;
import freshet.acidity.PhScale;
import freshet.method.Method;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** Each constant of the carbonate system against published values, and every number in it matters. */
class CarbonateConstantsTest {

    /** A formula on the numbers of its method, for one row of its table. */
    interface Formula {
        double value(double[] constants, Row row);
    }

    record Published(Method method, Formula formula) {
        @Override
        public String toString() {
            return method.id();
        }
    }

    static List<Published> all() {
        return List.of(
                new Published(
                        WatersMilleroWoosley2014.METHOD,
                        (c, row) -> WatersMilleroWoosley2014.pK(
                                c, row.output().equals("pk1") ? 0 : c.length / 2, row.number("t"), row.number("s"))),
                new Published(Millero1995.METHOD, CarbonateConstantsTest::water),
                new Published(
                        Dickson1990Borate.METHOD,
                        (c, row) -> row.output().equals("boron")
                                ? Dickson1990Borate.boron(row.number("s"))
                                : Dickson1990Borate.lnKb(c, row.number("t"), row.number("s"))),
                new Published(
                        PlummerBusenberg1982.METHOD,
                        (c, row) -> PlummerBusenberg1982.logK(
                                c,
                                List.of("log_k1", "log_k2", "log_calcite").indexOf(row.output()) * 5,
                                row.number("t"))),
                new Published(Mucci1983.METHOD, (c, row) -> Mucci1983.logCalcite(c, row.number("t"), row.number("s"))),
                new Published(
                        Davies1962.METHOD,
                        (c, row) -> Davies1962.logGamma(c, (int) row.number("z"), row.number("t"), row.number("i"))),
                new Published(Takahashi1982.METHOD, CarbonateConstantsTest::probe),
                new Published(Weiss1974.METHOD, CarbonateConstantsTest::gas));
    }

    /** The form of Dickson 2007 on the total scale has a first constant that is less by 0.0150. */
    private static double water(double[] c, Row row) {
        double t = row.number("t");
        double s = row.number("s");
        double ln = Millero1995.lnKw(c, t, s);
        double toTotal = Math.log(Dickson1990.totalPerFree(t, s) / DicksonRiley1979.seawaterPerFree(t, s));
        return switch (row.output()) {
            case "ln_kw_total" -> ln - 0.0150;
            case "pkw_total" -> -(ln + toTotal) / Math.log(10);
            default -> ln;
        };
    }

    private static double probe(double[] c, Row row) {
        double fh = Takahashi1982.activityPerHydrogen(c, row.number("t"), row.number("s"));
        return row.output().equals("ph_sws") ? row.number("ph") + Math.log10(fh) : fh;
    }

    private static double gas(double[] c, Row row) {
        double t = row.number("t");
        return switch (row.output()) {
            case "ln_k0" -> Weiss1974.lnK0(c, t, row.number("s"));
            case "delta" -> Weiss1974.delta(c, t);
            default ->
                CarbonateSolver.of(t, row.number("s"), PhScale.TOTAL, 0)
                                .ofPhAndAlkalinity(row.number("ph"), row.number("alk") * 1e-6)
                                .co2()
                        / Weiss1974.co2(c, t, row.number("s"), 1e-6);
        };
    }

    static Stream<Arguments> rows() {
        return all().stream()
                .flatMap(published -> PublishedTable.of(published.method().id()).rows().stream()
                        .map(row -> Arguments.of(published, row)));
    }

    @ParameterizedTest
    @MethodSource("rows")
    void everyRowIsReproduced(Published published, Row row) {
        assertThat(published.formula().value(published.method().values(), row))
                .isCloseTo(row.expected(), within(row.tolerance()));
    }

    @ParameterizedTest
    @MethodSource("all")
    void everyConstantMatters(Published published) {
        for (int i = 0; i < published.method().values().length; i++) {
            double[] nudged = published.method().values();
            if (nudged[i] == 0) {
                continue;
            }
            nudged[i] *= 1.001;
            assertThat(PublishedTable.of(published.method().id()).rows())
                    .as(published.method().constants().get(i).symbol())
                    .anyMatch(row -> !row.agrees(published.formula().value(nudged, row)));
        }
    }

    /** Millero et al. 2006, doi:10.1016/j.marchem.2005.12.001, abstract (printed): 5.8401 and 8.9636 at salinity 35, 25 °C. */
    @Test
    void anIndependentFitForTheSameConstantsIsNear() {
        assertThat(WatersMilleroWoosley2014.pK1(25, 35)).isCloseTo(5.8401, within(0.0054));
        assertThat(WatersMilleroWoosley2014.pK2(25, 35)).isCloseTo(8.9636, within(0.011));
    }

    /** Dickson, Sabine and Christian 2007 (secondary): Lueker et al. 2000, total scale, -5.8472 and -8.9660. */
    @Test
    void theConstantsForOceansAreNearInSeaWater() {
        double toTotal = Math.log10(DicksonRiley1979.seawaterPerFree(25, 35) / Dickson1990.totalPerFree(25, 35));
        assertThat(WatersMilleroWoosley2014.pK1(25, 35) + toTotal).isCloseTo(5.8472, within(0.006));
        assertThat(WatersMilleroWoosley2014.pK2(25, 35) + toTotal).isCloseTo(8.9660, within(0.015));
    }

    /** The independent fresh-water constants of Plummer and Busenberg 1982. */
    @Test
    void inFreshWaterTheConstantsAreThoseOfAnIndependentSource() {
        for (double t = 0; t <= 35; t++) {
            assertThat(WatersMilleroWoosley2014.pK1(t, 0)).isCloseTo(-PlummerBusenberg1982.logK1(t), within(0.0015));
            assertThat(WatersMilleroWoosley2014.pK2(t, 0)).isCloseTo(-PlummerBusenberg1982.logK2(t), within(0.002));
        }
    }

    /** The independent Henry constant of Plummer and Busenberg 1982. */
    @Test
    void freshWaterHoldsAsMuchCarbonDioxideAsAnIndependentSourceSays() {
        for (double t = 0; t <= 35; t++) {
            double k = t + 273.15;
            double henry = 108.3865 + 0.01985076 * k - 6919.53 / k - 40.45154 * Math.log10(k) + 669365 / (k * k);
            assertThat(Weiss1974.lnK0(Weiss1974.METHOD.values(), t, 0)).isCloseTo(henry * Math.log(10), within(0.005));
        }
    }

    @Test
    void theReadingOfAProbeHasNoJumpAndAFreshWaterLimit() {
        for (double t : new double[] {5, 10, 15, 20, 25, 30}) {
            assertThat(ProbeActivity.activityPerHydrogen(t, 0)).isEqualTo(1);
            double before = 1;
            for (double s = 0.01; s <= 45; s += 0.01) {
                double here = ProbeActivity.activityPerHydrogen(t, s);
                assertThat(Math.log10(here / before)).as(t + " " + s).isBetween(-0.03, 0.03);
                before = here;
            }
        }
        assertThat(Arrays.stream(PhScale.values())
                        .map(scale -> AcidBase.of(20, 0).ph(1e-7, scale)))
                .allSatisfy(ph -> assertThat(ph).isCloseTo(7, within(1e-12)));
    }
}
