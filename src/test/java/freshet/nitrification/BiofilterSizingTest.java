package freshet.nitrification;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import freshet.PublishedTable;
import freshet.PublishedTable.Row;
import java.util.OptionalDouble;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;

class BiofilterSizingTest {

    private static final FilterWater AT_REFERENCE = new FilterWater(7.5, 25, 0, 2, 8, 100, 0);

    @Test
    void publishedSizesAreReproduced() {
        for (Row row : PublishedTable.of(BiofilterSizing.METHOD.id()).rows()) {
            boolean perVolume = row.inputs().containsKey("volumetric_rate");
            double measured = row.number(perVolume ? "volumetric_rate" : "areal_rate");
            ReferenceState state = Filters.measured(1, 25).state();
            SizingGoal goal = new SizingGoal(
                    TanLoad.given(row.number("load")),
                    OptionalDouble.of(1),
                    Filters.plainFlow(),
                    perVolume ? OptionalDouble.empty() : OptionalDouble.of(row.number("surface")));
            BiofilterSizing sizing = BiofilterSizing.of(
                    goal,
                    new MeasuredRate(measured, perVolume, true, state),
                    AT_REFERENCE,
                    TemperatureMethod.GUARDED_ARRHENIUS);
            OptionalDouble size = row.output().equals("media_area_m2")
                    ? sizing.areaM2(sizing.amount())
                    : sizing.volumeM3(sizing.amount());
            assertThat(size.orElseThrow()).as(row.id()).isEqualTo(row.expected(), within(row.tolerance()));
        }
    }

    @Test
    void publishedFlowsAreReproduced() {
        for (Row row : PublishedTable.of(FilterFlow.METHOD.id()).rows()) {
            FilterFlow flow = new FilterFlow(OptionalDouble.of(row.number("removal")), OptionalDouble.empty());
            double litresPerHour = flow.litresPerHour(row.number("tan_load"), row.number("tan"));
            assertThat(litresPerHour * 24 / 1000).as(row.id()).isEqualTo(row.expected(), within(row.tolerance()));
        }
        assertThat(FilterFlow.METHOD.values()).containsExactly(0.5, 0.3, 0.6, 2);
        assertThat(BiofilterSizing.METHOD.values()).containsExactly(1.5);
    }

    @Test
    void theFilterSizedForALoadHasThatCapacity() {
        SplittableRandom random = new SplittableRandom(11);
        for (int i = 0; i < 2000; i++) {
            FilterWater water = Filters.water(random);
            ReferenceRate reference = new PublishedRate(Filters.media(random));
            TemperatureMethod temperature = Filters.temperature(random);
            FilterFlow flow = new FilterFlow(
                    OptionalDouble.empty(),
                    random.nextBoolean() ? OptionalDouble.empty() : OptionalDouble.of(random.nextDouble(2.5, 12)));
            double safety = random.nextDouble(1, 3);
            SizingGoal goal = new SizingGoal(
                    TanLoad.given(random.nextDouble(1, 1000)), OptionalDouble.of(safety), flow, OptionalDouble.of(200));
            BiofilterSizing sizing = BiofilterSizing.of(goal, reference, water, temperature);
            Biofilter filter = new Biofilter(
                    reference, sizing.amount().orElseThrow(), OptionalDouble.of(sizing.flowLPerHour()), flow);
            assertThat(BiofilterCapacity.of(filter, water, temperature).tanGPerDay())
                    .isCloseTo(goal.load().tanGPerDay() * safety, withinPercentage(1e-9));
            assertThat(sizing.amount().orElseThrow())
                    .isBetween(sizing.lower().orElseThrow(), sizing.upper().orElseThrow());
        }
    }

    @Test
    void thePeakAndTheSafetyFactorAreNotMultiplied() {
        TanLoad feed = TanLoad.of(new Ration(10, 42), Meals.SEVERAL);
        assertThat(goal(feed, OptionalDouble.empty()).multiplier()).isEqualTo(1.7);
        assertThat(goal(feed, OptionalDouble.of(2)).multiplier()).isEqualTo(2);
        assertThat(goal(feed, OptionalDouble.of(1)).multiplier()).isEqualTo(1.7);
        assertThat(goal(feed, OptionalDouble.of(1)).safetyBelowPeak()).isTrue();
        assertThat(goal(feed, OptionalDouble.empty()).safetyBelowPeak()).isFalse();
        assertThat(goal(TanLoad.given(1), OptionalDouble.empty()).multiplier()).isEqualTo(1.5);
    }

    private static SizingGoal goal(TanLoad load, OptionalDouble safety) {
        return new SizingGoal(load, safety, Filters.plainFlow(), OptionalDouble.empty());
    }
}
