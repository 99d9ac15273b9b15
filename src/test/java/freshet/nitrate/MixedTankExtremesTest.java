package freshet.nitrate;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Digits that must survive: many turnovers, the plateau at the limit, inputs at their bounds. */
class MixedTankExtremesTest {

    private static final double[] VOLUMES = {0.001, 50_000, 1e10};
    private static final double[] CONCENTRATIONS = {0, 4.9e-324, 1e-300, 5, Math.nextUp(5.0), 50_000};
    private static final double[] FLOWS = {0, 4.9e-324, 1e-300, 1e-9, 3000, 1e10};
    private static final double[] AMOUNTS = {0, 4.9e-324, 1e-300, 300, 1e9};

    /** With nothing coming in, C = C0 exp(-Q t/V). */
    @ParameterizedTest
    @CsvSource({"1, 14.7151776468577", "10, 0.00181599719049940", "20, 8.24461448975423e-8", "27, 7.51811526615633e-11"
    })
    void flushingKeepsItsDigitsOverManyTurnovers(double turnovers, double expected) {
        MixedTank flushed = new MixedTank(1000, 40, new NitrateSources(0, 0, 0, 1000, 0, 0));
        assertThat(flushed.mgPerLAfter(turnovers)).isCloseTo(expected, withinPercentage(1e-10));
    }

    @Test
    void whatIsFlushedOfARichTankDoesNotDrownASmallPlateau() {
        MixedTank tank = new MixedTank(1000, 50_000, new NitrateSources(0, 0, 0, 1e6, 0, 1e-6));
        assertThat(tank.mgPerLAfter(30)).isCloseTo(1e-6, withinPercentage(1e-10));
    }

    @Test
    void theTimeToALimitJustBelowThePlateauIsLongAndNotEndless() {
        SplittableRandom random = new SplittableRandom(7);
        int reached = 0;
        for (int i = 0; i < 20_000; i++) {
            double production = random.nextInt(10, 5000) / 10.0;
            double limit = random.nextInt(20, 200);
            double source = random.nextInt(0, 150) / 10.0;
            NitrateSources held = new NitrateSources(production, 0, 0, 1000 * production / (limit - source), 0, source);
            NitrateLimit judged = new NitrateLimit(new MixedTank(10_000, limit / 2, held), limit);
            if (judged.outcome() == NitrateLimit.Outcome.REACHED) {
                reached++;
                double turnovers = judged.days().orElseThrow() * held.exchangeLPerDay() / 10_000;
                assertThat(turnovers).isBetween(25.0, 45.0);
            } else {
                assertThat(judged.outcome()).isEqualTo(NitrateLimit.Outcome.NEVER);
            }
        }
        assertThat(reached).as("rounding puts some plateaus above the limit").isPositive();
    }

    @Test
    void withinTheBoundsNoConcentrationIsLost() {
        for (MixedTank tank : tanks()) {
            for (double days : new double[] {0, 0.01, 30, 3650}) {
                assertThat(tank.mgPerLAfter(days))
                        .as("%s after %s days", tank, days)
                        .isFinite()
                        .isNotNegative();
            }
            assertThat(tank.mgPerLAfter(0)).isEqualTo(tank.nowMgPerL());
            assertThat(tank.netGPerDay()).isFinite();
        }
    }

    @Test
    void withinTheBoundsEveryTimeIsANumberAndNotNegative() {
        for (MixedTank tank : tanks()) {
            tank.daysToNothing()
                    .ifPresent(
                            days -> assertThat(days).as("%s", tank).isNotNaN().isNotNegative());
            for (double limit : CONCENTRATIONS) {
                NitrateLimit judged = new NitrateLimit(tank, limit);
                judged.days()
                        .ifPresent(days -> assertThat(days)
                                .as("%s to %s", tank, limit)
                                .isNotNaN()
                                .isNotNegative());
                judged.exchangeLPerDay()
                        .ifPresent(exchange -> assertThat(exchange).isNotNaN().isNotNegative());
            }
        }
    }

    @Test
    void aSubnormalExchangeIsNoExchange() {
        for (double trickle : new double[] {4.9e-324, 1e-320, 1e-300}) {
            MixedTank tank = new MixedTank(1, 40, new NitrateSources(0, 0, 0.01, trickle, 0, 0));
            assertThat(tank.mgPerLAfter(0.01)).isCloseTo(39.9, withinPercentage(1e-9));
            assertThat(tank.daysToNothing().orElseThrow()).isCloseTo(4, withinPercentage(1e-9));
        }
    }

    private static List<MixedTank> tanks() {
        List<MixedTank> tanks = new ArrayList<>();
        for (double volume : VOLUMES) {
            for (double now : CONCENTRATIONS) {
                for (double exchange : FLOWS) {
                    for (double source : CONCENTRATIONS) {
                        for (double production : AMOUNTS) {
                            for (double uptake : AMOUNTS) {
                                tanks.add(new MixedTank(
                                        volume,
                                        now,
                                        new NitrateSources(production, 0, uptake, exchange, exchange, source)));
                            }
                        }
                    }
                }
            }
        }
        return tanks;
    }
}
