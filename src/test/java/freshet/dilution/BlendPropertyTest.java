package freshet.dilution;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import freshet.acidity.PhScale;
import freshet.ammonia.Water;
import freshet.dilution.Blend.Mixture;
import freshet.dilution.SafeExchange.Limit;
import freshet.dilution.SafeExchange.Limits;
import java.util.OptionalDouble;
import java.util.Random;
import org.junit.jupiter.api.Test;

/** What holds for any two waters. */
class BlendPropertyTest {

    private final Random random = new Random(20261201);

    private BlendedWater water(double salinity) {
        Water sample = new Water(6.2 + 2.4 * random.nextDouble(), 5 + 25 * random.nextDouble(), salinity, PhScale.NBS);
        return BlendedWater.measured(sample, 20 + 280 * random.nextDouble(), 5 * random.nextDouble());
    }

    private Blend blend() {
        double salinity = random.nextInt(3) == 0 ? 35 * random.nextDouble() : 0;
        BlendedWater tank = water(salinity);
        return new Blend(tank, water(random.nextBoolean() ? salinity : 0), tank.co2MgPerL(), PhScale.NBS);
    }

    @Test
    void waterMixedWithItselfDoesNotChange() {
        for (int i = 0; i < 200; i++) {
            BlendedWater water = water(random.nextInt(2) * 20.0);
            Blend blend = new Blend(water, water, water.co2MgPerL(), PhScale.NBS);
            Mixture mixture = blend.mixture(random.nextDouble());
            assertThat(mixture.water().state().ph()).isCloseTo(water.state().ph(), within(1e-9));
            assertThat(mixture.settled().ph()).isCloseTo(water.state().ph(), within(1e-9));
            assertThat(SafeExchange.of(blend, limits(blend))).isEqualTo(new SafeExchange(100, Limit.NONE));
        }
    }

    @Test
    void whatIsConservedLiesBetweenTheWatersInProportion() {
        for (int i = 0; i < 200; i++) {
            Blend blend = blend();
            double share = random.nextDouble();
            Mixture mixture = blend.mixture(share);
            assertThat(mixture.water().water().tan())
                    .isCloseTo(
                            (1 - share) * blend.tank().water().tan()
                                    + share * blend.source().water().tan(),
                            within(1e-15));
            assertThat(mixture.water().state().alkalinity())
                    .isCloseTo(mixture.water().water().alkalinity(), within(1e-13));
            Blend turned = new Blend(blend.source(), blend.tank(), blend.settledCo2MgPerL(), PhScale.NBS);
            assertThat(turned.mixture(1 - share).water().state().ph())
                    .isCloseTo(mixture.water().state().ph(), within(1e-9));
        }
    }

    @Test
    void noExchangeThatHarmsIsCalledSafe() {
        int limited = 0;
        for (int i = 0; i < 100; i++) {
            Blend blend = blend();
            Limits limits = limits(blend);
            SafeExchange safe = SafeExchange.of(blend, limits);
            for (double percent = 0; percent <= safe.sharePercent(); percent += 0.25) {
                assertThat(limits.overstepped(blend, mixed(blend, percent)))
                        .as(blend + " at " + percent)
                        .isEqualTo(Limit.NONE);
            }
            if (safe.limitedBy() != Limit.NONE) {
                limited++;
                assertThat(limits.overstepped(blend, mixed(blend, safe.sharePercent() + 0.01)))
                        .isNotEqualTo(Limit.NONE);
            }
        }
        assertThat(limited).isGreaterThan(50);
    }

    private static Mixture mixed(Blend blend, double percent) {
        return blend.mixture(blend.massShare(100 - percent, percent));
    }

    private static Limits limits(Blend blend) {
        return new Limits(OptionalDouble.of(blend.nh3NBeforeMgPerL()), 0.3, 2);
    }
}
