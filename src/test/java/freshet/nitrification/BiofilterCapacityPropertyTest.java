package freshet.nitrification;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.util.OptionalDouble;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;

class BiofilterCapacityPropertyTest {

    private static final int RUNS = 3000;

    @Test
    void theEstimateLiesWithinItsCornersAndBelowEveryLimit() {
        SplittableRandom random = new SplittableRandom(1);
        for (int i = 0; i < RUNS; i++) {
            BiofilterCapacity capacity = Filters.capacity(random, Filters.water(random));
            assertThat(capacity.lowerTanGPerDay().orElseThrow()).isLessThanOrEqualTo(capacity.tanGPerDay());
            assertThat(capacity.upperTanGPerDay().orElseThrow()).isGreaterThanOrEqualTo(capacity.tanGPerDay());
            assertThat(capacity.tanGPerDay())
                    .isBetween(0.0, capacity.mediaTanGPerDay())
                    .isLessThanOrEqualTo(capacity.oxygenTransportTanGPerDay().orElse(1e99));
        }
    }

    @Test
    void factorsMultiplyToTheRate() {
        SplittableRandom random = new SplittableRandom(2);
        for (int i = 0; i < RUNS; i++) {
            FilterWater water = Filters.water(random);
            Media media = Filters.media(random);
            Rate rate = new PublishedRate(media).in(water, Filters.temperature(random));
            Factors f = rate.factors();
            assertThat(media.rate().estimate()
                            * f.temperature()
                            * f.tan()
                            * f.oxygen()
                            * f.ph()
                            * f.alkalinity()
                            * f.salinity()
                            * f.carbon())
                    .isCloseTo(rate.estimate(), withinPercentage(1e-10));
        }
    }

    @Test
    void moreAmmoniaOxygenOrAlkalinityNeverLowersTheRateAndMoreSaltOrCarbonNeverRaisesIt() {
        SplittableRandom random = new SplittableRandom(3);
        for (int i = 0; i < RUNS; i++) {
            FilterWater w = Filters.water(random);
            double more = 1 + random.nextDouble();
            double rate = rate(w);
            assertThat(rate(new FilterWater(
                            w.ph(),
                            w.temperatureC(),
                            w.salinity(),
                            w.tanMgPerL() * more,
                            w.dissolvedOxygenMgPerL(),
                            w.alkalinityMgPerLAsCaco3(),
                            w.carbonToNitrogen())))
                    .isGreaterThanOrEqualTo(rate * (1 - 1e-12));
            assertThat(rate(new FilterWater(
                            w.ph(),
                            w.temperatureC(),
                            w.salinity(),
                            w.tanMgPerL(),
                            w.dissolvedOxygenMgPerL() * more,
                            w.alkalinityMgPerLAsCaco3(),
                            w.carbonToNitrogen())))
                    .isGreaterThanOrEqualTo(rate * (1 - 1e-12));
            assertThat(rate(new FilterWater(
                            w.ph(),
                            w.temperatureC(),
                            w.salinity(),
                            w.tanMgPerL(),
                            w.dissolvedOxygenMgPerL(),
                            w.alkalinityMgPerLAsCaco3() * more,
                            w.carbonToNitrogen())))
                    .isGreaterThanOrEqualTo(rate * (1 - 1e-12));
            assertThat(rate(new FilterWater(
                            w.ph(),
                            w.temperatureC(),
                            Math.min(45, w.salinity() * more),
                            w.tanMgPerL(),
                            w.dissolvedOxygenMgPerL(),
                            w.alkalinityMgPerLAsCaco3(),
                            w.carbonToNitrogen() * more)))
                    .isLessThanOrEqualTo(rate * (1 + 1e-12));
        }
    }

    @Test
    void oxygenNeverCountsTwice() {
        SplittableRandom random = new SplittableRandom(4);
        for (int i = 0; i < RUNS; i++) {
            double tan = random.nextDouble(0, 8);
            double oxygen = random.nextDouble(0, 14);
            SubstrateKinetics kinetics = new SubstrateKinetics(tan, oxygen);
            double direct = Math.min(1, oxygen / 2) * Math.min(1, Math.sqrt(Math.min(tan, oxygen / 3.4) / 2));
            assertThat(kinetics.tanFactor() * kinetics.oxygenFactor()).isEqualTo(direct, within(1e-12));
        }
        assertThat(new SubstrateKinetics(0, 1).oxygenFactor()).isEqualTo(0.5);
    }

    @Test
    void aMeasuredRateComesBackUnchangedAtItsOwnConditions() {
        SplittableRandom random = new SplittableRandom(9);
        for (int i = 0; i < RUNS; i++) {
            FilterWater water = Filters.water(random);
            double t = random.nextDouble(4, 34);
            FilterWater same = new FilterWater(
                    water.ph(),
                    t,
                    water.salinity(),
                    water.tanMgPerL(),
                    water.dissolvedOxygenMgPerL(),
                    water.alkalinityMgPerLAsCaco3(),
                    0);
            ReferenceState state = new ReferenceState(
                    t,
                    OptionalDouble.of(same.tanMgPerL()),
                    OptionalDouble.of(same.dissolvedOxygenMgPerL()),
                    OptionalDouble.of(same.ph()),
                    OptionalDouble.of(same.alkalinityMgPerLAsCaco3()),
                    OptionalDouble.of(same.salinity()));
            Rate rate = new MeasuredRate(0.3, true, false, state).in(same, Filters.temperature(random));
            assertThat(rate.estimate()).isCloseTo(0.3, withinPercentage(1e-10));
            assertThat(rate.lower()).isEmpty();
        }
    }

    private static double rate(FilterWater water) {
        return new PublishedRate(Media.MOVING_BED)
                .in(water, TemperatureMethod.GUARDED_ARRHENIUS)
                .estimate();
    }
}
