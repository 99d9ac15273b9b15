package freshet.nitrite;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import freshet.PublishedTable;
import freshet.PublishedTable.Row;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;

class SaltDoseTest {

    private static final double GRAMS_PER_POUND = 453.59237;

    static List<Row> rows() {
        return PublishedTable.of(SaltDose.METHOD.id()).rows();
    }

    @ParameterizedTest
    @MethodSource("rows")
    void everyRowIsReproduced(Row row) {
        assertThat(value(SaltDose.METHOD.values(), row)).isEqualTo(row.expected(), within(row.tolerance()));
    }

    @Test
    void everyConstantMatters() {
        for (int i = 0; i < SaltDose.METHOD.values().length; i++) {
            double[] nudged = SaltDose.METHOD.values();
            nudged[i] *= 1.001;
            assertThat(rows()).as("constant " + i).anyMatch(row -> !row.agrees(value(nudged, row)));
        }
    }

    @Test
    void theCatalogueStatesTheMassFractions() {
        for (Row row : PublishedTable.of(SaltDose.METHOD.id()).rows("chloride_share")) {
            assertThat(SaltDose.METHOD.equation()).contains(row.expected() + "");
        }
    }

    @ParameterizedTest
    @EnumSource(ChlorideSalt.class)
    void theDoseHoldsTheChlorideThatWasAskedFor(ChlorideSalt salt) {
        SplittableRandom random = new SplittableRandom(58);
        for (int i = 0; i < 5000; i++) {
            double rise = random.nextDouble(0, 1000);
            double volume = random.nextDouble(0.001, 1e6);
            double purity = random.nextDouble(0.01, 1);
            SaltDose dose = new SaltDose(rise, volume, salt, purity);
            double chlorideG = dose.grams() * purity * salt.chlorideShare();
            assertThat(chlorideG).isCloseTo(rise * volume / 1000, within(1e-9 * rise * volume / 1000 + 1e-15));
            double ionsG = dose.dissolvedSaltRiseMgPerL() * volume / 1000;
            assertThat(ionsG).isBetween(chlorideG * 1.5, dose.grams() * purity * (1 + 1e-12));
        }
    }

    @Test
    void onlyTheHydrateBringsWater() {
        for (ChlorideSalt salt : ChlorideSalt.values()) {
            double dissolved = salt.chlorideShare() * salt.ionsPerChloride();
            assertThat(dissolved)
                    .isCloseTo(salt == ChlorideSalt.CALCIUM_CHLORIDE_DIHYDRATE ? 110.978 / 147.008 : 1, within(1e-12));
        }
    }

    @Test
    void noDoseIsNoDoseWhateverThePurity() {
        assertThat(new SaltDose(0, 1e10, ChlorideSalt.POTASSIUM_CHLORIDE, 0.01).grams())
                .isZero();
    }

    private static double value(double[] constants, Row row) {
        ChlorideSalt salt = ChlorideSalt.valueOf(row.text("salt"));
        return switch (row.output()) {
            case "chloride_share" -> salt.chlorideShare();
            case "ions_share" -> 1 / salt.ionsPerChloride();
            case "dose_g" -> dose(row).grams();
            case "dose_lb" -> dose(row).grams() / GRAMS_PER_POUND;
            case "salt_rise" -> dose(row).dissolvedSaltRiseMgPerL();
            case "days" -> dose(row).days(constants);
            case "harms_plants" -> dose(row).harmsPlants(constants) ? 1 : 0;
            default -> throw new IllegalArgumentException(row.output());
        };
    }

    private static SaltDose dose(Row row) {
        return new SaltDose(
                row.number("rise"), row.number("volume"), ChlorideSalt.valueOf(row.text("salt")), row.number("purity"));
    }
}
