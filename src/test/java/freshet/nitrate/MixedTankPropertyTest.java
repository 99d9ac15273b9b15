package freshet.nitrate;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import freshet.PublishedTable;
import freshet.PublishedTable.Row;
import java.util.List;
import java.util.OptionalDouble;
import java.util.SplittableRandom;
import java.util.stream.Stream;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The closed form against published values, against small steps through the differential equation, and at its edges. */
class MixedTankPropertyTest {

    static List<Row> published() {
        return PublishedTable.of("mixed-tank-nitrate").rows();
    }

    @ParameterizedTest
    @MethodSource("published")
    void publishedValuesAreReproduced(Row row) {
        double value = switch (row.output()) {
            case "plateau" -> tank(row).plateauMgPerL().orElseThrow();
            case "concentration" -> tank(row).mgPerLAfter(row.number("t"));
            case "days" ->
                new NitrateLimit(tank(row), row.number("limit")).days().orElseThrow();
            case "exchange_l" ->
                new NitrateLimit(tank(row), row.number("limit"))
                        .exchangeLPerDay()
                        .orElseThrow();
            default -> throw new IllegalArgumentException(row.output());
        };
        assertThat(value).isCloseTo(row.expected(), within(row.tolerance()));
    }

    @Test
    void theClosedFormIsTheSolutionOfTheBalance() {
        tanks(200).forEach(tank -> {
            double c = tank.nowMgPerL();
            int steps = 20_000;
            double days = 20;
            double dt = days / steps;
            for (int i = 0; i < steps; i++) {
                double mid = c + dt / 2 * slope(tank, c);
                c = Math.max(0, c + dt * slope(tank, mid));
            }
            assertThat(tank.mgPerLAfter(days)).isCloseTo(c, within(1e-3 + 1e-4 * c));
        });
    }

    @Test
    void theTimeToALimitLeadsToTheLimit() {
        tanks(5000).forEach(tank -> {
            for (double limit : new double[] {1, 30, 80, 200}) {
                NitrateLimit.Outcome outcome = new NitrateLimit(tank, limit).outcome();
                OptionalDouble days = new NitrateLimit(tank, limit).days();
                days.ifPresent(t -> assertThat(tank.mgPerLAfter(t)).isCloseTo(limit, Percentage.withPercentage(1e-6)));
                boolean passes = outcome == NitrateLimit.Outcome.REACHED || outcome == NitrateLimit.Outcome.FALLS_BELOW;
                assertThat(days.isPresent()).isEqualTo(passes || outcome == NitrateLimit.Outcome.AT_LIMIT);
                double atLast = tank.mgPerLAfter(1e7);
                boolean crossed = (tank.nowMgPerL() - limit) * (atLast - limit) < 0;
                assertThat(passes).as("%s %s", tank, limit).isEqualTo(crossed);
            }
        });
    }

    @Test
    void theExchangeRequiredMakesThePlateauTheLimit() {
        tanks(5000)
                .forEach(tank -> new NitrateLimit(tank, 90).exchangeLPerDay().ifPresent(exchange -> {
                    NitrateSources s = tank.sources();
                    MixedTank held = new MixedTank(
                            tank.volumeL(),
                            tank.nowMgPerL(),
                            new NitrateSources(
                                    s.productionGPerDay(),
                                    s.denitrifiedShare(),
                                    s.uptakeGPerDay(),
                                    exchange,
                                    s.evaporationLPerDay(),
                                    s.sourceMgPerL()));
                    if (exchange > 0) {
                        assertThat(held.plateauMgPerL().orElseThrow()).isCloseTo(90, within(1e-6));
                    }
                }));
    }

    @Test
    void nitrateIsNeverNegativeAndStaysGoneOnceGone() {
        tanks(5000)
                .forEach(tank -> tank.daysToNothing().ifPresent(days -> {
                    assertThat(tank.mgPerLAfter(days)).isCloseTo(0, within(1e-6));
                    assertThat(tank.mgPerLAfter(days * 1.01 + 1)).isZero();
                    assertThat(tank.plateauMgPerL().orElseThrow()).isZero();
                }));
    }

    @Test
    void aTrickleOfExchangeIsAlmostNoExchange() {
        NitrateSources none = new NitrateSources(100, 0, 10, 0, 0, 0);
        NitrateSources trickle = new NitrateSources(100, 0, 10, 1e-9, 0, 0);
        assertThat(new MixedTank(50_000, 40, trickle).mgPerLAfter(10))
                .isCloseTo(new MixedTank(50_000, 40, none).mgPerLAfter(10), within(1e-9));
        assertThat(new NitrateLimit(new MixedTank(50_000, 40, trickle), 100)
                        .days()
                        .orElseThrow())
                .isCloseTo(33.3333, within(1e-4));
    }

    @Test
    void atRestNothingMoves() {
        MixedTank still = new MixedTank(1000, 25, new NitrateSources(0, 0, 0, 0, 0, 0));
        assertThat(still.mgPerLAfter(100)).isEqualTo(25);
        assertThat(still.plateauMgPerL()).hasValue(25);
        assertThat(new NitrateLimit(still, 25).outcome()).isEqualTo(NitrateLimit.Outcome.AT_LIMIT);
        assertThat(new NitrateLimit(still, 26).outcome()).isEqualTo(NitrateLimit.Outcome.NEVER);
        assertThat(new NitrateLimit(still, 24).outcome()).isEqualTo(NitrateLimit.Outcome.ALREADY_ABOVE);
    }

    @Test
    void aSourceAboveTheLimitCanHoldNothing() {
        MixedTank tank = new MixedTank(1000, 25, new NitrateSources(5, 0, 0, 10, 0, 50));
        assertThat(new NitrateLimit(tank, 50).exchangeLPerDay()).isEmpty();
    }

    private static double slope(MixedTank tank, double c) {
        NitrateSources s = tank.sources();
        double uptake = c > 0 ? s.uptakeGPerDay() : 0;
        return 1000 * (s.keptGPerDay() - uptake + s.exchangeLPerDay() * (s.sourceMgPerL() - c) / 1000) / tank.volumeL();
    }

    private static MixedTank tank(Row row) {
        return new MixedTank(
                1000 * row.number("V"),
                row.number("C0"),
                new NitrateSources(
                        row.number("P"),
                        Double.parseDouble(row.inputs().getOrDefault("d", "0")),
                        row.number("U"),
                        1000 * row.number("Q"),
                        0,
                        row.number("Cin")));
    }

    private static Stream<MixedTank> tanks(int count) {
        SplittableRandom random = new SplittableRandom(54);
        return Stream.generate(() -> new MixedTank(
                        random.nextDouble(1000, 100_000),
                        random.nextDouble(0, 150),
                        new NitrateSources(
                                random.nextDouble(0, 500),
                                random.nextDouble(0, 0.5),
                                random.nextInt(3) == 0 ? random.nextDouble(0, 600) : 0,
                                random.nextInt(3) == 0 ? 0 : random.nextDouble(0, 20_000),
                                random.nextDouble(0, 500),
                                random.nextDouble(0, 40))))
                .limit(count);
    }
}
