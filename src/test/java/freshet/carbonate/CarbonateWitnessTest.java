package freshet.carbonate;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import freshet.PublishedTable;
import freshet.PublishedTable.Row;
import freshet.acidity.Dickson1990;
import freshet.acidity.DicksonRiley1979;
import freshet.acidity.PhScale;
import freshet.acidity.SeaSalt;
import freshet.substance.MolarMass;
import java.util.List;
import java.util.Locale;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The carbonate system against other published formulas and tables, over their whole ranges. */
class CarbonateWitnessTest {

    private static final double MG_PER_EQ = 50043;

    static List<Row> rows() {
        return PublishedTable.of("carbonate-witnesses").rows();
    }

    @ParameterizedTest
    @MethodSource("rows")
    void everyWitnessIsItselfReproduced(Row row) {
        assertThat(witness(row)).isCloseTo(row.expected(), within(row.tolerance()));
    }

    private static double witness(Row row) {
        double t = row.inputs().containsKey("t") ? row.number("t") : 20;
        double s = row.inputs().containsKey("s") ? row.number("s") : 0;
        return switch (row.output()) {
            case "lueker_log_k1" -> -CarbonateWitnesses.luekerPk1(t, s);
            case "millero_2006_pk1" -> CarbonateWitnesses.millero2006Pk1(t, s);
            case "millero_2006_pk2" -> CarbonateWitnesses.millero2006Pk2(t, s);
            case "millero_2010_pk1" -> CarbonateWitnesses.millero2010Pk1(t, s);
            case "millero_2010_pk2" -> CarbonateWitnesses.millero2010Pk2(t, s);
            case "log_aragonite" -> CarbonateWitnesses.logAragonite(t, s);
            case "lee_boron" -> CarbonateWitnesses.leeBoron(s);
            case "co2_per_alkalinity" -> co2PerAlkalinity(t, row.number("ph"));
            case "ionic_strength" -> SeaSalt.ionicStrength(s);
            default -> throw new IllegalArgumentException(row.output());
        };
    }

    /** The service's own carbon dioxide in fresh water, mg for each mg of alkalinity as CaCO3. */
    private static double co2PerAlkalinity(double t, double ph) {
        double alkalinity = 2e-3;
        double co2 = CarbonateSolver.of(t, 0, PhScale.NBS, 0)
                .ofPhAndAlkalinity(ph, alkalinity)
                .co2();
        return co2 * MolarMass.CARBON_DIOXIDE * 1000 / (alkalinity * MG_PER_EQ);
    }

    /** Standard deviations that the sources state: 0.0055 and 0.011 to 0.015. */
    @Test
    void earlierFitsToTheSameMeasurementsAreNear() {
        for (double t = 0; t <= 40; t += 5) {
            for (double s = 1; s <= 45; s++) {
                double pk1 = WatersMilleroWoosley2014.pK1(t, s);
                double pk2 = WatersMilleroWoosley2014.pK2(t, s);
                assertThat(CarbonateWitnesses.millero2006Pk1(t, s)).isCloseTo(pk1, within(0.0055));
                assertThat(CarbonateWitnesses.millero2010Pk1(t, s)).isCloseTo(pk1, within(0.0055));
                assertThat(CarbonateWitnesses.millero2006Pk2(t, s)).isCloseTo(pk2, within(0.015));
                assertThat(CarbonateWitnesses.millero2010Pk2(t, s)).isCloseTo(pk2, within(0.015));
            }
        }
    }

    @Test
    void inSeaWaterTheConstantsRecommendedForOceansAreNear() {
        for (double t = 2; t <= 35; t++) {
            for (double s = 19; s <= 43; s++) {
                double toTotal = Math.log10(DicksonRiley1979.seawaterPerFree(t, s) / Dickson1990.totalPerFree(t, s));
                assertThat(WatersMilleroWoosley2014.pK1(t, s) + toTotal)
                        .isCloseTo(CarbonateWitnesses.luekerPk1(t, s), within(0.012));
                assertThat(WatersMilleroWoosley2014.pK2(t, s) + toTotal)
                        .isCloseTo(CarbonateWitnesses.luekerPk2(t, s), within(0.035));
            }
        }
    }

    /** The other form of calcium carbonate is the more soluble, so that scale is judged by the form that comes first. */
    @Test
    void aragoniteIsMoreSolubleThanCalcite() {
        for (double t = 5; t <= 40; t++) {
            for (double s = 5; s <= 44; s++) {
                assertThat(CarbonateWitnesses.logAragonite(t, s) - Mucci1983.logCalcite(t, s))
                        .isBetween(0.1, 0.3);
            }
        }
    }

    /** The newer ratio of boron to salinity is 4 % higher; at the pH of a farm that is nothing to carbon dioxide. */
    @Test
    void theChoiceOfBoronHardlyMatters() {
        double least = 3e-3;
        for (double s = 5; s <= 45; s += 5) {
            double more = CarbonateWitnesses.leeBoron(s) - Dickson1990Borate.boron(s);
            double kb = Math.exp(Dickson1990Borate.lnKb(Dickson1990Borate.METHOD.values(), 25, s));
            double borate = more * kb / (kb + 1e-8);
            assertThat(borate / 2e-3).isBetween(0.0, least);
        }
    }

    @ParameterizedTest
    @MethodSource("doses")
    void everyChemicalBringsItsAlkalinity(Row row) {
        DosingChemical chemical = DosingChemical.valueOf(
                row.text("chemical").toUpperCase(Locale.ROOT).replace('-', '_'));
        assertThat(MG_PER_EQ / 1000 * chemical.equivalents() / chemical.molarMass())
                .isCloseTo(row.expected(), within(row.tolerance()));
    }

    static List<Row> doses() {
        return PublishedTable.of("dosing-chemicals").rows();
    }

    /** The pure-water factor of Tucker 1984 falls tenfold with each unit of pH; the whole system agrees up to pH 8. */
    @Test
    void carbonDioxideFallsTenfoldWithEachUnitOfPh() {
        for (double t = 5; t <= 35; t += 5) {
            assertThat(co2PerAlkalinity(t, 7) * 10).isCloseTo(co2PerAlkalinity(t, 6), Percentage.withPercentage(0.5));
            assertThat(co2PerAlkalinity(t, 8) * 100).isCloseTo(co2PerAlkalinity(t, 6), Percentage.withPercentage(2));
        }
    }
}
