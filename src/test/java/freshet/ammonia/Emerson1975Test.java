package freshet.ammonia;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import freshet.PublishedTable;
import freshet.PublishedTable.Row;
import freshet.acidity.PhScale;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class Emerson1975Test {

    private static final PublishedTable TABLE = PublishedTable.of("emerson-1975");
    private static final Emerson1975 EMERSON = new Emerson1975();

    /** Cells of the fraction table that do not reproduce, each with its reason; all others must to the printed digit. */
    private static final Map<String, String> DEVIATING_CELLS = Map.ofEntries(
            Map.entry("FA16-pH7.4-T20", "misprint: .0096 for .0098"),
            Map.entry("FA16-pH7.0-T10", "last digit cut off, not rounded: 0.001853"),
            Map.entry("FA16-pH7.0-T24", "last digit cut off, not rounded: 0.005254"),
            Map.entry("FA16-pH7.4-T26", "last digit cut off, not rounded: 0.015054"),
            Map.entry("FA16-pH7.6-T26", "last digit cut off, not rounded: 0.023651"),
            Map.entry("FA16-pH8.6-T14", "last digit: 0.091458 printed as .0914"),
            Map.entry("FA16-pH7.2-T32", "the whole 32 °C column belongs to about 32.7 °C"),
            Map.entry("FA16-pH7.6-T32", "the whole 32 °C column belongs to about 32.7 °C"),
            Map.entry("FA16-pH7.8-T32", "the whole 32 °C column belongs to about 32.7 °C"),
            Map.entry("FA16-pH8.0-T32", "the whole 32 °C column belongs to about 32.7 °C"),
            Map.entry("FA16-pH8.2-T32", "the whole 32 °C column belongs to about 32.7 °C"),
            Map.entry("FA16-pH8.4-T32", "the whole 32 °C column belongs to about 32.7 °C"));

    static List<Row> rows() {
        return TABLE.rows();
    }

    @ParameterizedTest
    @MethodSource("rows")
    void everyPublishedValueIsReproducedOrListedAsDeviating(Row row) {
        assertThat(row.agrees(value(EMERSON, row)))
                .as("%s: %s, published %s; %s", row, value(EMERSON, row), row.expected(), DEVIATING_CELLS.get(row.id()))
                .isEqualTo(!DEVIATING_CELLS.containsKey(row.id()));
    }

    @Test
    void everyListedDeviationIsInTheTable() {
        assertThat(rows()).extracting(Row::id).containsAll(DEVIATING_CELLS.keySet());
    }

    @Test
    void theColumnFor32DegreesFitsAHigherTemperature() {
        for (Row row : TABLE.rows("nh3_fraction")) {
            if (row.text("t").equals("32")) {
                double shifted = EMERSON.fraction(row.number("ph"), 32.66, 0, PhScale.NBS);
                assertThat(shifted).isCloseTo(row.expected(), within(0.0003));
            }
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {0, 1})
    void everyConstantMatters(int index) {
        for (double nudge : new double[] {1.001, 0.999}) {
            double[] constants = Emerson1975.METHOD.values();
            constants[index] *= nudge;
            Emerson1975 nudged = new Emerson1975(constants);
            assertThat(rows())
                    .filteredOn(row -> !DEVIATING_CELLS.containsKey(row.id()))
                    .anyMatch(row -> !row.agrees(value(nudged, row)));
        }
    }

    @Test
    void theWidespreadMisprintIsFoundOut() {
        Emerson1975 misprinted = new Emerson1975(new double[] {0.09018, 2727.92});
        List<Row> fractions = TABLE.rows("nh3_fraction");
        long agreeing = IntStream.range(0, fractions.size())
                .filter(i -> fractions.get(i).agrees(value(misprinted, fractions.get(i))))
                .count();
        assertThat(agreeing).isLessThan(fractions.size() / 5);
    }

    @Test
    void salinityAndScaleAreIgnored() {
        assertThat(EMERSON.pKa(20, 35, PhScale.TOTAL)).isEqualTo(EMERSON.pKa(20, 0, PhScale.NBS));
        assertThat(EMERSON.validity(20, 35).within()).isFalse();
    }

    private static double value(Emerson1975 emerson, Row row) {
        double t = row.number("t");
        return switch (row.output()) {
            case "pka" -> emerson.pKa(t, 0, PhScale.NBS);
            case "nh3_fraction" -> emerson.fraction(row.number("ph"), t, 0, PhScale.NBS);
            case "nh3_mmol_per_l" -> row.number("total_mM") * emerson.fraction(row.number("ph"), t, 0, PhScale.NBS);
            default -> throw new IllegalArgumentException(row.output());
        };
    }
}
