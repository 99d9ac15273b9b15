package freshet.nitrification;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import freshet.acidity.PhScale;
import freshet.ammonia.AmmoniaSpeciation;
import freshet.ammonia.Water;
import java.util.OptionalDouble;
import java.util.SplittableRandom;
import org.hipparchus.analysis.UnivariateFunction;
import org.hipparchus.analysis.solvers.BracketingNthOrderBrentSolver;
import org.junit.jupiter.api.Test;

class LoadedBiofilterPropertyTest {

    private static final int RUNS = 3000;

    @Test
    void theEquilibriumIsTheRootOfTheRateBalance() {
        SplittableRandom random = new SplittableRandom(5);
        int solved = 0;
        for (int i = 0; i < RUNS; i++) {
            FilterWater water = Filters.water(random);
            BiofilterCapacity capacity = Filters.capacity(random, water);
            double ultimate = new LoadedBiofilter(capacity, TanLoad.given(1), water).ultimateTanGPerDay();
            LoadedBiofilter loaded =
                    new LoadedBiofilter(capacity, TanLoad.given(ultimate * random.nextDouble()), water);
            OptionalDouble closed = loaded.equilibriumTanMgPerL();
            if (closed.isPresent() && !loaded.atFloor()) {
                assertThat(closed.getAsDouble()).isEqualTo(root(loaded), within(1e-9));
                solved++;
            }
        }
        assertThat(solved).isGreaterThan(RUNS / 4);
    }

    /** The least total ammonia at which media and flow both remove the load, by bisection-like search. */
    private static double root(LoadedBiofilter loaded) {
        Rate rate = loaded.capacity().rate();
        Biofilter filter = loaded.capacity().filter();
        double usable = loaded.water().dissolvedOxygenMgPerL() / 3.4;
        UnivariateFunction surplus = c -> {
            double media = rate.plateau() * filter.amount() * Math.min(1, Math.sqrt(Math.min(c, usable) / 2));
            double brought = filter.flowLPerHour().isPresent()
                    ? 24
                            * filter.flowLPerHour().getAsDouble()
                            / 1000
                            * c
                            * filter.flow().removal().estimate()
                    : Double.POSITIVE_INFINITY;
            return Math.min(media, brought) - loaded.load().tanGPerDay();
        };
        double high = 1e-3;
        while (surplus.value(high) <= 0) {
            high *= 1.5;
        }
        return new BracketingNthOrderBrentSolver(1e-14, 1e-13, 1e-15, 5).solve(10000, surplus, 0, high);
    }

    @Test
    void theEquilibriumRisesWithTheLoadAndEndsWhereOxygenTakesOver() {
        SplittableRandom random = new SplittableRandom(6);
        for (int i = 0; i < RUNS; i++) {
            FilterWater water = Filters.water(random);
            Biofilter filter = new Biofilter(
                    new PublishedRate(Filters.media(random)), 100, OptionalDouble.empty(), Filters.plainFlow());
            BiofilterCapacity capacity = BiofilterCapacity.of(filter, water, Filters.temperature(random));
            double ultimate = new LoadedBiofilter(capacity, TanLoad.given(1), water).ultimateTanGPerDay();
            double last = 0;
            for (double share : new double[] {0, 0.1, 0.5, 0.9, 1}) {
                LoadedBiofilter loaded = new LoadedBiofilter(capacity, TanLoad.given(ultimate * share), water);
                double equilibrium = loaded.equilibriumTanMgPerL().orElseThrow();
                assertThat(equilibrium).isGreaterThanOrEqualTo(last);
                last = equilibrium;
            }
            assertThat(last)
                    .isCloseTo(
                            Math.max(0.088, Math.min(2, water.dissolvedOxygenMgPerL() / 3.4)), withinPercentage(1e-9));
            LoadedBiofilter over = new LoadedBiofilter(capacity, TanLoad.given(ultimate * 1.001), water);
            assertThat(over.carried()).isFalse();
            assertThat(over.equilibriumTanMgPerL()).isEmpty();
        }
    }

    @Test
    void noLoadRestsOnTheFloorEvenWhereNothingGrows() {
        FilterWater dead = new FilterWater(5, 20, 0, 1, 7, 100, 0);
        Biofilter filter =
                new Biofilter(new PublishedRate(Media.TRICKLING), 10, OptionalDouble.of(0), Filters.plainFlow());
        BiofilterCapacity capacity = BiofilterCapacity.of(filter, dead, TemperatureMethod.GUARDED_ARRHENIUS);
        LoadedBiofilter idle = new LoadedBiofilter(capacity, TanLoad.given(0), dead);
        assertThat(idle.equilibriumTanMgPerL()).hasValue(0.088);
        assertThat(idle.utilizationPercent()).isEmpty();
        assertThat(new LoadedBiofilter(capacity, TanLoad.given(0.001), dead).carried())
                .isFalse();
    }

    @Test
    void withoutFlowThroughItAFilterCarriesNoLoad() {
        FilterWater water = new FilterWater(7.4, 20, 0, 1, 7, 100, 0);
        Biofilter still =
                new Biofilter(new PublishedRate(Media.TRICKLING), 1000, OptionalDouble.of(0), Filters.plainFlow());
        BiofilterCapacity capacity = BiofilterCapacity.of(still, water, TemperatureMethod.GUARDED_ARRHENIUS);
        LoadedBiofilter loaded = new LoadedBiofilter(capacity, TanLoad.of(new Ration(1, 40), Meals.ONE), water);
        assertThat(loaded.carried()).isFalse();
        assertThat(loaded.feedCarriedKgPerDay()).hasValue(0);
        assertThat(capacity.limitingFactor()).isEqualTo(LimitingFactor.FLOW);
    }

    @Test
    void unIonizedAmmoniaIsThatOfTheSpeciation() {
        FilterWater water = new FilterWater(7.9, 24, 30, 1, 7, 150, 0);
        Biofilter filter =
                new Biofilter(new PublishedRate(Media.MOVING_BED), 1000, OptionalDouble.empty(), Filters.plainFlow());
        LoadedBiofilter loaded = new LoadedBiofilter(
                BiofilterCapacity.of(filter, water, TemperatureMethod.GUARDED_ARRHENIUS), TanLoad.given(100), water);
        assertThat(loaded.equilibriumNh3NMgPerL().orElseThrow())
                .isEqualTo(AmmoniaSpeciation.nh3NMgPerL(
                        loaded.equilibriumTanMgPerL().orElseThrow(), new Water(7.9, 24, 30, PhScale.NBS)));
    }
}
