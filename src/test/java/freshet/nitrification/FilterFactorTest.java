package freshet.nitrification;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import freshet.PublishedTable;
import freshet.PublishedTable.Row;
import freshet.method.Method;
import java.util.function.Consumer;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

/** The published pieces of the rate, each against its own table. */
class FilterFactorTest {

    @TestFactory
    Stream<DynamicTest> publishedFiguresAreReproducedAndEveryConstantMatters() {
        return Stream.of(
                piece(PhFactor.METHOD, c -> row -> new PhFactor(c).at(row.number("ph"))),
                piece(AlkalinityFactor.METHOD, c -> row -> new AlkalinityFactor(c).at(row.number("alkalinity"))),
                piece(SalinityFactor.METHOD, c -> row -> corner(new SalinityFactor(c).at(row.number("s")), row)),
                piece(CarbonFactor.METHOD, c -> row -> corner(new CarbonFactor(c).at(row.number("cn")), row)),
                piece(HalfOrder.METHOD, c -> row -> new HalfOrder(c).share(row.number("tan"))),
                piece(
                        OxygenLimit.METHOD,
                        c -> row -> row.output().equals("cut")
                                ? new OxygenLimit(c).cut(row.number("o"))
                                : new OxygenLimit(c).usableTanMgPerL(row.number("o"))),
                temperature(GuardedArrhenius.METHOD, GuardedArrhenius::new),
                temperature(CentralArrhenius.METHOD, CentralArrhenius::new),
                temperature(UsEpa1993.METHOD, UsEpa1993::new),
                temperature(WortmanWheaton1991.METHOD, WortmanWheaton1991::new),
                temperature(ZhuChen2002.METHOD, ZhuChen2002::new));
    }

    private static DynamicTest temperature(Method method, Function<double[], TemperatureResponse> maker) {
        return piece(method, constants -> row -> {
            TemperatureResponse response = maker.apply(constants);
            double ratio = response.ratio(row.number("t"), row.number("tr"), row.number("oxygen_limited") == 1);
            return switch (row.output()) {
                case "ratio" -> ratio;
                case "sensitivity" -> ratio - 1;
                default -> ((WortmanWheaton1991) response).rateMgPerM2PerDay(row.number("t"));
            };
        });
    }

    private static double corner(Spread spread, Row row) {
        return switch (row.output()) {
            case "estimate" -> spread.estimate();
            case "lower" -> spread.lower();
            default -> spread.upper();
        };
    }

    private static DynamicTest piece(Method method, Function<double[], ToDoubleFunction<Row>> piece) {
        Consumer<double[]> check = constants -> PublishedTable.of(method.id())
                .rows()
                .forEach(row -> assertThat(piece.apply(constants).applyAsDouble(row))
                        .as(row.id())
                        .isEqualTo(row.expected(), within(row.tolerance())));
        return DynamicTest.dynamicTest(method.id(), () -> Nudge.everyConstantMatters(method, check));
    }

    @Test
    void theFloorIsThatOfTheSteadyFilm() {
        Row row = PublishedTable.of(SubstrateFloor.METHOD.id()).rows().get(0);
        double floor = row.number("k") * row.number("b") / (row.number("mu") - row.number("b"));
        assertThat(floor).isEqualTo(row.expected(), within(1e-7));
        assertThat(SubstrateFloor.TAN_MG_PER_L).isEqualTo(row.expected(), within(row.tolerance()));
    }

    @Test
    void theCreditForTemperatureEndsWhereItSays() {
        Nudge.everyConstantMatters(TemperatureCredit.METHOD, constants -> {
            TemperatureCredit credit = new TemperatureCredit(constants);
            assertThat(credit.effectiveC(35)).isEqualTo(30);
            assertThat(credit.effectiveC(29)).isEqualTo(29);
            assertThat(credit.cut(3.9999)).isZero();
            assertThat(credit.cut(4)).isEqualTo(1);
            assertThat(credit.cut(34)).isEqualTo(1);
            assertThat(credit.cut(39.5)).isEqualTo(0.5, within(1e-12));
            assertThat(credit.cut(45)).isZero();
            assertThat(credit.cut(60)).isZero();
        });
    }

    @Test
    void theSpreadOfAMeasuredRateHasItsFourFactors() {
        Nudge.everyConstantMatters(MeasuredRate.METHOD, constants -> {
            MeasuredRate rate = Filters.measured(0.2, 20);
            assertThat(rate.spread(constants, 15, 0).orElseThrow()).isEqualTo(0.5500225, within(1e-6));
            assertThat(rate.spread(constants, 15, 1).orElseThrow()).isEqualTo(0.9467694, within(1e-6));
            assertThat(rate.spread(constants, 25, 0).orElseThrow()).isEqualTo(1, within(1e-6));
            assertThat(rate.spread(constants, 25, 1).orElseThrow()).isEqualTo(1.5386240, within(1e-6));
            assertThat(rate.spread(constants, 20, 0)).isEmpty();
        });
    }

    @Test
    void theEquationOfPhEndsWithinAThousandthOfTheCut() {
        assertThat(7.2 - 1 / 0.833).isEqualTo(5.99952, within(1e-5));
        assertThat(PhFactor.published().at(6.0001)).isEqualTo(0, within(0.001));
    }

    @Test
    void mediaHaveTheRatesOfTheDefinition() {
        assertThat(Media.METHOD.values())
                .containsExactly(
                        0.35, 0.10, 0.60, 500, 0.35, 0.10, 0.90, 200, 0.40, 0.20, 1.0, 200, 0.25, 0.10, 0.60, 200, 0.20,
                        0.10, 0.60, 250, 250, 140, 590, 450, 300, 700);
    }

    @Test
    void warmFarmsWereMeasuredNearTheReferenceRates() {
        for (Row row : PublishedTable.of(Media.METHOD.id()).rows()) {
            Media media = Media.valueOf(row.text("media"));
            FilterWater warm = new FilterWater(7.4, row.number("t"), 0, 2, 8, 100, 0);
            double rate = new PublishedRate(media)
                            .in(warm, TemperatureMethod.GUARDED_ARRHENIUS)
                            .estimate()
                    * media.specificSurfaceM2PerM3().orElse(1);
            assertThat(rate).as(row.id()).isEqualTo(row.expected(), within(row.tolerance()));
        }
    }
}
