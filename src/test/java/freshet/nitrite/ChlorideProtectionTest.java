package freshet.nitrite;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import freshet.PublishedTable;
import freshet.PublishedTable.Row;
import freshet.http.media.SixDigits;
import freshet.substance.MolarMass;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;

/** The verdict on chloride against what was observed, computed by hand, and what must always hold. */
class ChlorideProtectionTest {

    /** Tomasso et al. state 16; their treatments were 15.7. */
    private static final double FULL = ChlorideRatios.fromMolar(15.7);

    private static final PublishedTable TABLE = PublishedTable.of(ChlorideProtection.METHOD.id());

    @Test
    void fishWithMethaemoglobinAreCalledUnprotectedAndTheOthersProtected() {
        for (Row row : TABLE.rows("methaemoglobin_percent")) {
            double nitrogen = row.number("no2") * MolarMass.NITROGEN / MolarMass.NITRITE;
            double chloride = row.number("nacl") * ChlorideSalt.SODIUM_CHLORIDE.chlorideShare();
            assertThat(new ChlorideProtection(nitrogen, chloride, FULL).suffices())
                    .as(row.id())
                    .isEqualTo(row.expected() == 0);
        }
    }

    @Test
    void theCatalogueQuotesWhatWasObserved() {
        for (String output : List.of("methaemoglobin_percent", "lc50_mg_per_l_as_no2", "mortality_percent")) {
            for (Row row : TABLE.rows(output)) {
                assertThat(ChlorideProtection.METHOD.accuracy())
                        .as(row.id())
                        .containsPattern("\\b" + SixDigits.text(row.expected()) + "\\b");
            }
        }
        for (String output : List.of("insurance_chloride_mg_per_l", "guide_mg_per_l_as_no2")) {
            for (Row row : TABLE.rows(output)) {
                assertThat(ChlorideRatios.METHOD.accuracy())
                        .as(row.id())
                        .containsPattern("\\b" + SixDigits.text(row.expected()) + "\\b");
            }
        }
    }

    @Test
    void whatIsComputedAgreesWithHandwork() {
        for (String output : List.of("required", "deficit", "limit", "present_ratio")) {
            for (Row row : TABLE.rows(output)) {
                ChlorideProtection protection =
                        new ChlorideProtection(row.number("no2_n"), row.number("chloride"), row.number("ratio"));
                assertThat(value(protection, output)).as(row.id()).isEqualTo(row.expected(), within(row.tolerance()));
            }
        }
    }

    @Test
    void theFourWaysToAskAgree() {
        SplittableRandom random = new SplittableRandom(16);
        int sufficient = 0;
        for (int i = 0; i < 20_000; i++) {
            ChlorideProtection protection = new ChlorideProtection(
                    random.nextDouble(1e-3, 20), random.nextDouble(0, 500), random.nextDouble(0.1, 200));
            boolean suffices = protection.suffices();
            sufficient += suffices ? 1 : 0;
            assertThat(protection.deficitMgPerL() == 0).isEqualTo(suffices);
            assertThat(protection.presentMassRatio().orElseThrow() >= protection.massRatio())
                    .isEqualTo(suffices);
            assertThat(protection.no2NMgPerL() <= protection.no2NLimitMgPerL()).isEqualTo(suffices);
        }
        assertThat(sufficient).isBetween(1000, 19_000);
    }

    @Test
    void theMissingChlorideIsExactlyEnough() {
        SplittableRandom random = new SplittableRandom(40);
        for (int i = 0; i < 20_000; i++) {
            ChlorideProtection before = new ChlorideProtection(
                    random.nextDouble(0, 10_000), random.nextDouble(0, 50_000), random.nextDouble(0.1, 1000));
            double added = before.chlorideMgPerL() + before.deficitMgPerL();
            ChlorideProtection after = new ChlorideProtection(before.no2NMgPerL(), added, before.massRatio());
            assertThat(after.suffices()).isTrue();
            assertThat(after.deficitMgPerL()).isZero();
            if (!before.suffices()) {
                assertThat(new ChlorideProtection(before.no2NMgPerL(), added * (1 - 1e-9), before.massRatio())
                                .suffices())
                        .isFalse();
            }
        }
    }

    @Test
    void roundingAloneDoesNotMakeFishUnprotected() {
        assertThat(0.1 * 3).isGreaterThan(0.3);
        assertThat(new ChlorideProtection(0.1, 0.3, 3).suffices()).isTrue();
        assertThat(new ChlorideProtection(0.1, 0.3, 3).deficitMgPerL()).isZero();
    }

    @Test
    void withoutNitriteNothingIsNeededAndThereIsNoRatio() {
        ChlorideProtection none = new ChlorideProtection(0, 0, 40);
        assertThat(none.suffices()).isTrue();
        assertThat(none.requiredMgPerL()).isZero();
        assertThat(none.presentMassRatio()).isEmpty();
        assertThat(new ChlorideProtection(1e-9, 50_000, 40).presentMassRatio().orElseThrow())
                .isLessThan(SixDigits.TOO_LARGE);
        assertThat(new ChlorideProtection(4.9e-324, 50_000, 40).presentMassRatio())
                .isEmpty();
    }

    private static double value(ChlorideProtection protection, String output) {
        return switch (output) {
            case "required" -> protection.requiredMgPerL();
            case "deficit" -> protection.deficitMgPerL();
            case "limit" -> protection.no2NLimitMgPerL();
            case "present_ratio" -> protection.presentMassRatio().orElseThrow();
            default -> throw new IllegalArgumentException(output);
        };
    }
}
