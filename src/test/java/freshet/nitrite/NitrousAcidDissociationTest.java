package freshet.nitrite;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import freshet.PublishedTable;
import freshet.PublishedTable.Row;
import java.util.List;
import java.util.SplittableRandom;
import java.util.function.Function;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;

/** Published values of the constants of nitrous acid, and what must hold for each of them at any water. */
class NitrousAcidDissociationTest {

    /** The paper's own mass of nitrous acid over that of nitrogen. */
    private static final double PRINTED_MASS_RATIO = 46.0 / 14;

    private static final double GAS_CONSTANT = 8.314462618;

    static List<Row> anthonisen() {
        return PublishedTable.of("anthonisen-1976").rows();
    }

    static List<Row> daSilva() {
        return PublishedTable.of("da-silva-2006").rows();
    }

    @ParameterizedTest
    @MethodSource("anthonisen")
    void anthonisenIsReproduced(Row row) {
        assertThat(value(new Anthonisen1976(), row)).isEqualTo(row.expected(), within(row.tolerance()));
    }

    @ParameterizedTest
    @MethodSource("daSilva")
    void daSilvaIsReproduced(Row row) {
        assertThat(value(new DaSilva2006(), row)).isEqualTo(row.expected(), within(row.tolerance()));
    }

    @Test
    void everyConstantMatters() {
        everyConstantMatters(Anthonisen1976.METHOD.values(), Anthonisen1976::new, anthonisen());
        everyConstantMatters(DaSilva2006.METHOD.values(), DaSilva2006::new, daSilva());
    }

    private static void everyConstantMatters(
            double[] published, Function<double[], NitrousAcidDissociation> method, List<Row> rows) {
        for (int i = 0; i < published.length; i++) {
            for (double nudge : new double[] {1.001, 0.999}) {
                double[] nudged = published.clone();
                nudged[i] *= nudge;
                NitrousAcidDissociation off = method.apply(nudged);
                assertThat(rows).as("constant " + i).anyMatch(row -> !row.agrees(value(off, row)));
            }
        }
    }

    @ParameterizedTest
    @EnumSource(NitriteMethod.class)
    void theTwoFormsAddUpAndTheAcidFallsWithPhAndWithTemperature(NitriteMethod method) {
        SplittableRandom random = new SplittableRandom(1976);
        NitrousAcidDissociation dissociation = method.dissociation();
        for (int i = 0; i < 5000; i++) {
            double ph = random.nextDouble(0, 13.9);
            double t = random.nextDouble(-2, 59.9);
            double total = random.nextDouble(0, 10_000);
            NitriteSpeciation split = NitriteSpeciation.of(total, ph, t, dissociation);
            assertThat(split.hno2NMgPerL() + split.ionNMgPerL()).isCloseTo(total, within(1e-11 * total));
            assertThat(split.hno2Fraction()).isBetween(0.0, 1.0);
            assertThat(NitriteSpeciation.of(total, ph + 0.1, t, dissociation).hno2Fraction())
                    .isLessThan(split.hno2Fraction());
            assertThat(NitriteSpeciation.of(total, ph, t + 0.1, dissociation).hno2Fraction())
                    .isLessThan(split.hno2Fraction());
        }
    }

    @ParameterizedTest
    @EnumSource(NitriteMethod.class)
    void halfIsAcidWherePhIsPka(NitriteMethod method) {
        for (double t = -2; t <= 60; t += 1) {
            double pKa = method.dissociation().pKa(t);
            assertThat(NitriteSpeciation.of(3, pKa, t, method.dissociation()).hno2NMgPerL())
                    .isCloseTo(1.5, within(1e-12));
        }
    }

    @Test
    void theOlderConstantShowsMoreAcidWhereverFishLive() {
        for (double t = -2; t <= 45; t += 0.5) {
            assertThat(new Anthonisen1976().pKa(t)).isGreaterThan(new DaSilva2006().pKa(t));
        }
        assertThat(StrictMath.pow(10, new Anthonisen1976().pKa(25) - new DaSilva2006().pKa(25)))
                .isCloseTo(1.55, within(0.01));
        assertThat(StrictMath.pow(10, new Anthonisen1976().pKa(10) - new DaSilva2006().pKa(10)))
                .isCloseTo(2.0, within(0.05));
    }

    @Test
    void theRangesAreThoseOfTheMethods() {
        assertThat(new Anthonisen1976().validity(40, 0.5).within()).isTrue();
        assertThat(new Anthonisen1976().validity(41, 0.6).exceeded()).hasSize(2);
        assertThat(new DaSilva2006().validity(25, 0).within()).isTrue();
        assertThat(new DaSilva2006().validity(24.9, 0).within()).isFalse();
    }

    private static double value(NitrousAcidDissociation dissociation, Row row) {
        double t = row.number("t");
        double pKa = dissociation.pKa(t);
        return switch (row.output()) {
            case "pka" -> pKa;
            case "hno2_fraction" ->
                NitriteSpeciation.of(1, row.number("ph"), t, dissociation).hno2Fraction();
            case "printed_hno2_n" -> row.number("no2_n") * acidPerIon(dissociation, row);
            case "printed_hno2" -> PRINTED_MASS_RATIO * row.number("no2_n") * acidPerIon(dissociation, row);
            case "excess_percent" ->
                100 * (acidPerIon(dissociation, row) / split(dissociation, row).hno2Fraction() - 1);
            case "excess_over_modern_percent" -> 100 * (StrictMath.pow(10, pKa - row.number("pka_modern")) - 1);
            case "enthalpy_kj_per_mol" -> enthalpy(dissociation) / 1000;
            case "entropy_j_per_mol_k" ->
                enthalpy(dissociation) / 298.15 - GAS_CONSTANT * StrictMath.log(10) * dissociation.pKa(25);
            default -> throw new IllegalArgumentException(row.output());
        };
    }

    private static NitriteSpeciation split(NitrousAcidDissociation dissociation, Row row) {
        return NitriteSpeciation.of(1, row.number("ph"), row.number("t"), dissociation);
    }

    private static double acidPerIon(NitrousAcidDissociation dissociation, Row row) {
        return split(dissociation, row).hno2NMgPerL() / split(dissociation, row).ionNMgPerL();
    }

    /** By the slope of pKa against 1/T, J/mol. */
    private static double enthalpy(NitrousAcidDissociation dissociation) {
        double slope = (dissociation.pKa(20) - dissociation.pKa(30)) / (1 / 293.15 - 1 / 303.15);
        return slope * GAS_CONSTANT * StrictMath.log(10);
    }
}
