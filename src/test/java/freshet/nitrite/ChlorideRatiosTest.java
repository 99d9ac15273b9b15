package freshet.nitrite;

import static org.assertj.core.api.Assertions.assertThat;

import freshet.PublishedTable;
import freshet.PublishedTable.Row;
import freshet.substance.MolarMass;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Published ratios and limits on the one basis of the service. */
class ChlorideRatiosTest {

    private static final PublishedTable TABLE = PublishedTable.of(ChlorideRatios.METHOD.id());
    private static final ChlorideRatios RATIOS = ChlorideRatios.published();

    /** EIFAC's criterion rises more slowly than chloride, so no single ratio gives it: it must be stricter. */
    private static final Set<String> STRICTER_THAN_ONE_RATIO = Set.of(
            "EIFAC-NO2-sal-Cl10",
            "EIFAC-NO2-sal-Cl20",
            "EIFAC-NO2-sal-Cl40",
            "EIFAC-NO2-cyp-Cl10",
            "EIFAC-NO2-cyp-Cl20",
            "EIFAC-NO2-cyp-Cl40");

    static List<Row> rows() {
        return TABLE.rows();
    }

    @ParameterizedTest
    @MethodSource("rows")
    void everyPublishedFigureIsReproducedOrListedAsStricter(Row row) {
        double value = value(RATIOS, row);
        if (STRICTER_THAN_ONE_RATIO.contains(row.id())) {
            assertThat(row.expected()).isLessThan(value - row.tolerance());
        } else {
            assertThat(row.agrees(value))
                    .as("%s: %s, published %s", row, value, row.expected())
                    .isTrue();
        }
    }

    @Test
    void everyListedRowIsInTheTable() {
        assertThat(rows()).extracting(Row::id).containsAll(STRICTER_THAN_ONE_RATIO);
    }

    @Test
    void theCatalogueTellsHowMuchStricter() {
        for (String id : List.of("EIFAC-NO2-sal-Cl20", "EIFAC-NO2-cyp-Cl40")) {
            Row row = rows().stream().filter(r -> r.id().equals(id)).findFirst().orElseThrow();
            double ratio = new ChlorideProtection(row.expected(), row.number("chloride"), 1)
                    .presentMassRatio()
                    .orElseThrow();
            assertThat(ChlorideRatios.METHOD.accuracy())
                    .contains(Math.round(ratio) + " for")
                    .contains("at " + row.text("chloride"));
        }
    }

    @Test
    void everyConstantMatters() {
        for (int i = 0; i < ChlorideRatios.METHOD.values().length; i++) {
            double[] nudged = ChlorideRatios.METHOD.values();
            nudged[i] *= 1.001;
            ChlorideRatios off = new ChlorideRatios(nudged);
            assertThat(rows())
                    .as("constant " + i)
                    .filteredOn(row -> !STRICTER_THAN_ONE_RATIO.contains(row.id()))
                    .anyMatch(row -> !row.agrees(value(off, row)));
        }
    }

    @Test
    void theThreeBasesOfOneRatioAreKeptApart() {
        assertThat(RATIOS.full() / 16).isBetween(2.530, 2.532);
        assertThat(RATIOS.pondPerNitrite() / RATIOS.pondPerNitrogen()).isBetween(3.284, 3.285);
        assertThat(ChlorideProtection.METHOD.errata().get(0)).contains("16, 12.3 and 40.5");
    }

    private static double value(ChlorideRatios ratios, Row row) {
        return switch (row.output()) {
            case "molar" -> molar(row);
            case "full" -> ratios.full();
            case "full_per_no2" -> ratios.full() * MolarMass.NITROGEN / MolarMass.NITRITE;
            case "pond_per_nitrogen" -> ratios.pondPerNitrogen();
            case "pond_per_nitrite" -> ratios.pondPerNitrite();
            case "eifac_salmonids" -> ratios.eifacSalmonids();
            case "eifac_coarse_fish" -> ratios.eifacCoarseFish();
            case "limit_guideline_maximum" -> limit(row, ratios.guidelineMaximum());
            case "limit_guideline_mean" -> limit(row, ratios.guidelineMean());
            case "limit_eifac_salmonids" -> limit(row, ratios.eifacSalmonids());
            case "limit_eifac_coarse_fish" -> limit(row, ratios.eifacCoarseFish());
            default -> throw new IllegalArgumentException(row.output());
        };
    }

    /** The molar ratio of a treatment, by way of the mass ratio that the service reports for it. */
    private static double molar(Row row) {
        double nitrogen = row.number("no2") * MolarMass.NITROGEN / MolarMass.NITRITE;
        double chloride = row.number("nacl") * ChlorideSalt.SODIUM_CHLORIDE.chlorideShare();
        double mass =
                new ChlorideProtection(nitrogen, chloride, 1).presentMassRatio().orElseThrow();
        return mass / ChlorideRatios.fromMolar(1);
    }

    private static double limit(Row row, double ratio) {
        return new ChlorideProtection(0, row.number("chloride"), ratio).no2NLimitMgPerL();
    }
}
