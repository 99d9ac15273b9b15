package freshet.ammonia;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import freshet.PublishedTable;
import freshet.PublishedTable.Row;
import freshet.acidity.PhScale;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The fraction of un-ionized ammonia against tables of limits and fractions that others made of constants of their own. */
class OtherPublishedLimitsTest {

    private static final Emerson1975 EMERSON = new Emerson1975();
    /** The tables of 1985 begin their kelvins at 273.2. */
    private static final double OTHER_ZERO_C = 0.05;

    /** As the tables of 1985 print it. */
    private static final double AS_N = 0.822;

    static List<Row> rows() {
        return Stream.of("ccme-2010", "usepa-1985", "anzecc-2000", "trussell-1972")
                .flatMap(table -> PublishedTable.of(table).rows().stream())
                .toList();
    }

    @ParameterizedTest
    @MethodSource("rows")
    void everyCellIsReproduced(Row row) {
        assertThat(value(row)).isCloseTo(row.expected(), within(row.tolerance()));
    }

    private static double value(Row row) {
        double ph = row.number("ph");
        if (row.output().equals("trigger")) {
            PhResponse response = new PhResponse(0.0278, 1.1994, 7.688);
            return 900 * response.at(ph) / response.at(8);
        }
        double t = row.number("t");
        return switch (row.output()) {
            case "total_ammonia" -> Nh3Guideline.CCME_2010.nh3MgPerL() / fraction(ph, t);
            case "percent" -> 100 * fraction(ph, t);
            case "acute" -> 0.52 / 2 / warmth(t, 20) / acidity(ph) / fraction(ph, t + OTHER_ZERO_C);
            case "chronic" -> 0.80 / warmth(t, 15) / acidity(ph) / ratio(ph) / fraction(ph, t + OTHER_ZERO_C) * AS_N;
            default -> throw new IllegalArgumentException(row.output());
        };
    }

    private static double fraction(double ph, double t) {
        return EMERSON.fraction(ph, t, 0, PhScale.NBS);
    }

    private static double warmth(double t, double cap) {
        return Math.pow(10, 0.03 * (20 - Math.min(t, cap)));
    }

    private static double acidity(double ph) {
        return ph >= 8 ? 1 : (1 + Math.pow(10, 7.4 - ph)) / 1.25;
    }

    private static double ratio(double ph) {
        return ph >= 7.7 ? 16 : 24 * Math.pow(10, 7.7 - ph) / (1 + Math.pow(10, 7.4 - ph));
    }
}
