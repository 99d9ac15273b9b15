package freshet.nitrate;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import freshet.PublishedTable;
import freshet.PublishedTable.Row;
import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

class NitrateFromFeedTest {

    static List<Row> published() {
        return PublishedTable.of("nitrate-from-feed").rows();
    }

    @ParameterizedTest
    @MethodSource("published")
    void referenceValuesAreReproduced(Row row) {
        assertThat(NitrateFromFeed.gPerDay(row.number("feed"), row.number("protein")))
                .isCloseTo(row.expected(), within(row.tolerance()));
    }

    /** 0.092 x 0.976 of the protein; a constant that is off by 0.1 % is off by five times the tolerance. */
    @ParameterizedTest
    @CsvSource({"10, 42, 377.1264", "1, 35, 31.4272", "1, 0, 0", "0, 35, 0", "1000000, 100, 89792000"})
    void theConstantsAreHeldTo(double feedKgPerDay, double proteinPercent, double expected) {
        assertThat(NitrateFromFeed.gPerDay(feedKgPerDay, proteinPercent)).isCloseTo(expected, within(2e-4 * expected));
    }
}
