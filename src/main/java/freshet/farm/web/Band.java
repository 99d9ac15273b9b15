package freshet.farm.web;

import java.util.OptionalDouble;
import java.util.stream.Stream;

/** The alarms of one variable in the terms of ISA-18.2; empty where there is none. */
record Band(
        OptionalDouble lowLow,
        OptionalDouble low,
        OptionalDouble high,
        OptionalDouble highHigh,
        OptionalDouble deadband) {

    static final Band NOTHING = new Band(
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            OptionalDouble.empty());

    /** Whether each alarm lies above the one before it. */
    boolean inOrder() {
        double[] given = Stream.of(lowLow, low, high, highHigh)
                .filter(OptionalDouble::isPresent)
                .mapToDouble(OptionalDouble::getAsDouble)
                .toArray();
        for (int i = 1; i < given.length; i++) {
            if (given[i] <= given[i - 1]) {
                return false;
            }
        }
        return true;
    }

    /** With a deadband that leaves at least half of the way from low to high. */
    Band withDeadband(double wanted) {
        double most = low.isPresent() && high.isPresent()
                ? (high.getAsDouble() - low.getAsDouble()) / 2
                : Double.POSITIVE_INFINITY;
        return new Band(lowLow, low, high, highHigh, OptionalDouble.of(Math.min(wanted, most)));
    }
}
