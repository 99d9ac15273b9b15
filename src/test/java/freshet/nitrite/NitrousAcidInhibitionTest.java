package freshet.nitrite;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import freshet.PublishedTable;
import freshet.PublishedTable.Row;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class NitrousAcidInhibitionTest {

    static List<Row> rows() {
        return PublishedTable.of(NitrousAcidInhibition.METHOD.id()).rows();
    }

    @ParameterizedTest
    @MethodSource("rows")
    void theSourcesAreQuotedRightly(Row row) {
        assertThat(value(NitrousAcidInhibition.published(), row)).isEqualTo(row.expected(), within(row.tolerance()));
    }

    @Test
    void everyConstantMatters() {
        for (int i = 0; i < NitrousAcidInhibition.METHOD.values().length; i++) {
            double[] nudged = NitrousAcidInhibition.METHOD.values();
            nudged[i] *= 1.001;
            NitrousAcidInhibition off = new NitrousAcidInhibition(nudged);
            assertThat(rows()).as("constant " + i).anyMatch(row -> !row.agrees(value(off, row)));
        }
    }

    private static double value(NitrousAcidInhibition inhibition, Row row) {
        return switch (row.output()) {
            case "nitrite_oxidation_micromolar" -> inhibition.nitriteOxidationMicromolar()[(int) row.number("which")];
            case "ammonia_oxidation_micromolar" -> inhibition.ammoniaOxidationMicromolar();
            case "threshold_mg_per_l_as_hno2" -> inhibition.thresholdsMgPerLAsHno2()[(int) row.number("which")];
            case "reached" -> inhibition.reachedBy(row.number("hno2_n")) ? 1 : 0;
            default -> throw new IllegalArgumentException(row.output());
        };
    }
}
