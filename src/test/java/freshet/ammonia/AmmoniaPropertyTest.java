package freshet.ammonia;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import freshet.acidity.PhScale;
import freshet.substance.Basis;
import java.util.OptionalDouble;
import java.util.SplittableRandom;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** What must hold for every dissociation constant, at any water. */
class AmmoniaPropertyTest {

    private static final int WATERS = 5000;

    @ParameterizedTest
    @EnumSource(AmmoniaMethod.class)
    void theTwoFormsAddUpToTheTotal(AmmoniaMethod method) {
        waters().forEach(water -> {
            AmmoniaSpeciation split = AmmoniaSpeciation.of(3.7, water, method.dissociation());
            assertThat(split.nh3NMgPerL() + split.nh4NMgPerL()).isCloseTo(3.7, within(1e-12));
            assertThat(split.nh3Fraction()).isBetween(0.0, 1.0);
        });
    }

    @ParameterizedTest
    @EnumSource(AmmoniaMethod.class)
    void theToxicShareRisesWithPhAndWithTemperature(AmmoniaMethod method) {
        waters().forEach(water -> {
            double here = fraction(method, water);
            Water moreAlkaline = new Water(water.ph() + 0.01, water.temperatureC(), water.salinity(), water.scale());
            Water warmer = new Water(water.ph(), water.temperatureC() + 0.1, water.salinity(), water.scale());
            assertThat(fraction(method, moreAlkaline)).isGreaterThan(here);
            assertThat(fraction(method, warmer)).isGreaterThan(here);
        });
    }

    @ParameterizedTest
    @EnumSource(AmmoniaMethod.class)
    void theTemperatureIsFoundAgainFromTheConstant(AmmoniaMethod method) {
        waters().forEach(water -> {
            AmmoniaDissociation dissociation = method.dissociation();
            double pKa = dissociation.pKa(water.temperatureC(), water.salinity(), water.scale());
            OptionalDouble found = dissociation.temperatureAt(pKa, water.salinity(), water.scale());
            assertThat(found.orElseThrow()).isCloseTo(water.temperatureC(), within(1e-9));
        });
    }

    @ParameterizedTest
    @EnumSource(AmmoniaMethod.class)
    void aConstantThatNoTemperatureHasGivesNoTemperature(AmmoniaMethod method) {
        assertThat(method.dissociation().temperatureAt(12, 20, PhScale.FREE)).isEmpty();
        assertThat(method.dissociation().temperatureAt(7, 20, PhScale.FREE)).isEmpty();
    }

    @ParameterizedTest
    @EnumSource(AmmoniaMethod.class)
    void theLimitOfTotalAmmoniaLeadsBackToTheLimitOfAmmonia(AmmoniaMethod method) {
        waters().forEach(water -> {
            AmmoniaLimits limits = new AmmoniaLimits(0.02, water, method.dissociation());
            AmmoniaSpeciation atLimit = AmmoniaSpeciation.of(limits.tanLimitMgPerL(), water, method.dissociation());
            assertThat(atLimit.nh3NMgPerL()).isCloseTo(0.02, within(1e-12));
        });
    }

    @ParameterizedTest
    @EnumSource(AmmoniaMethod.class)
    void atTheLimitingPhAndTemperatureThePresentTotalMeetsTheLimit(AmmoniaMethod method) {
        waters().forEach(water -> {
            AmmoniaLimits limits = new AmmoniaLimits(0.02, water, method.dissociation());
            limits.phLimit(1.3).ifPresent(ph -> {
                Water there = new Water(ph, water.temperatureC(), water.salinity(), water.scale());
                assertThat(1.3 * fraction(method, there)).isCloseTo(0.02, within(1e-10));
            });
            limits.temperatureLimitC(1.3).ifPresent(t -> {
                Water there = new Water(water.ph(), t, water.salinity(), water.scale());
                assertThat(1.3 * fraction(method, there)).isCloseTo(0.02, within(1e-10));
            });
        });
    }

    @Test
    void aTotalBelowTheLimitNeverMeetsIt() {
        AmmoniaLimits limits = new AmmoniaLimits(0.5, new Water(8, 20, 0, PhScale.NBS), new Emerson1975());
        for (double tan : new double[] {0, 0.3, 0.5}) {
            assertThat(limits.phLimit(tan)).isEmpty();
            assertThat(limits.temperatureLimitC(tan)).isEmpty();
        }
        assertThat(limits.phLimit(0.6)).isPresent();
    }

    @Test
    void aLimitOfZeroIsNeverMet() {
        AmmoniaLimits limits = new AmmoniaLimits(0, new Water(8, 20, 0, PhScale.NBS), new Emerson1975());
        assertThat(limits.tanLimitMgPerL()).isZero();
        assertThat(limits.phLimit(1)).isEmpty();
        assertThat(limits.temperatureLimitC(1)).isEmpty();
    }

    @Test
    void basesConvertThereAndBack() {
        assertThat(Basis.ammoniaToNitrogen(Basis.nitrogenToAmmonia(0.37))).isCloseTo(0.37, within(1e-15));
        assertThat(Basis.nitrogenToAmmonia(1)).isCloseTo(1.21589, within(5e-6));
        assertThat(Basis.nitrogenToAmmonium(1)).isCloseTo(1.28786, within(5e-6));
    }

    @Test
    void theDefaultMethodFollowsTheSalinity() {
        assertThat(AmmoniaMethod.defaultFor(0.5)).isEqualTo(AmmoniaMethod.EMERSON_1975);
        assertThat(AmmoniaMethod.defaultFor(Math.nextUp(0.5))).isEqualTo(AmmoniaMethod.CLEGG_WHITFIELD_1995);
    }

    private static double fraction(AmmoniaMethod method, Water water) {
        return method.dissociation().fraction(water.ph(), water.temperatureC(), water.salinity(), water.scale());
    }

    private static Stream<Water> waters() {
        SplittableRandom random = new SplittableRandom(1975);
        PhScale[] scales = PhScale.values();
        return Stream.generate(() -> new Water(
                        random.nextDouble(4, 11),
                        random.nextDouble(-2, 59.9),
                        random.nextDouble(0, 45),
                        scales[random.nextInt(scales.length)]))
                .limit(WATERS);
    }
}
