package freshet.nitrification;

import java.util.OptionalDouble;
import java.util.SplittableRandom;

/** Filters and waters for tests. */
final class Filters {

    static final OptionalDouble NONE = OptionalDouble.empty();

    private Filters() {}

    /** A rate measured per m2 where nothing held the filter back but temperature. */
    static MeasuredRate measured(double perDay, double temperatureC) {
        return new MeasuredRate(perDay, false, true, new ReferenceState(temperatureC, NONE, NONE, NONE, NONE, NONE));
    }

    /** Any water in which some nitrification goes on. */
    static FilterWater water(SplittableRandom random) {
        return new FilterWater(
                random.nextDouble(6.05, 9.9),
                random.nextDouble(4, 44),
                random.nextDouble(0, 45),
                random.nextDouble(0, 8),
                random.nextDouble(0.1, 14),
                random.nextDouble(1, 300),
                random.nextDouble(0, 4));
    }

    static Media media(SplittableRandom random) {
        return Media.values()[random.nextInt(Media.values().length)];
    }

    static TemperatureMethod temperature(SplittableRandom random) {
        return TemperatureMethod.values()[random.nextInt(TemperatureMethod.values().length)];
    }

    /** Water without a limit on removal or oxygen of its own. */
    static FilterFlow plainFlow() {
        return new FilterFlow(NONE, NONE);
    }

    /** Any filter in {@code water}. */
    static BiofilterCapacity capacity(SplittableRandom random, FilterWater water) {
        FilterFlow flow = new FilterFlow(
                OptionalDouble.empty(),
                random.nextBoolean() ? OptionalDouble.empty() : OptionalDouble.of(random.nextDouble(0, 12)));
        Biofilter filter = new Biofilter(
                new PublishedRate(media(random)),
                random.nextDouble(1, 1000),
                random.nextBoolean() ? OptionalDouble.empty() : OptionalDouble.of(random.nextDouble(1, 1e5)),
                flow);
        return BiofilterCapacity.of(filter, water, temperature(random));
    }
}
