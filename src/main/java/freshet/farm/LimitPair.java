package freshet.farm;

import java.util.OptionalDouble;

/**
 * The two limits on one side of a variable.
 *
 * @param caution where operators are told
 * @param critical where something must be done at once
 */
public record LimitPair(OptionalDouble caution, OptionalDouble critical) {

    /** No limit. */
    public static final LimitPair NONE = new LimitPair(OptionalDouble.empty(), OptionalDouble.empty());

    /** Both limits. */
    public static LimitPair of(double caution, double critical) {
        return new LimitPair(OptionalDouble.of(caution), OptionalDouble.of(critical));
    }

    /** Whether there is neither. */
    public boolean none() {
        return caution.isEmpty() && critical.isEmpty();
    }

    /** With a caution limit that is {@code share} of the critical one where only that is given. */
    public LimitPair cautionAtShare(double share) {
        return caution.isPresent() || critical.isEmpty()
                ? this
                : of(critical.getAsDouble() * share, critical.getAsDouble());
    }

    /** With a caution limit that is {@code distance} above the critical one where only that is given. */
    public LimitPair cautionAtDistance(double distance) {
        return caution.isPresent() || critical.isEmpty()
                ? this
                : of(critical.getAsDouble() + distance, critical.getAsDouble());
    }

    /** Both limits times {@code factor}. */
    public LimitPair times(double factor) {
        return new LimitPair(times(caution, factor), times(critical, factor));
    }

    private static OptionalDouble times(OptionalDouble limit, double factor) {
        return limit.isPresent() ? OptionalDouble.of(limit.getAsDouble() * factor) : limit;
    }

    /** Both limits moved by {@code distance}. */
    public LimitPair plus(double distance) {
        return new LimitPair(plus(caution, distance), plus(critical, distance));
    }

    private static OptionalDouble plus(OptionalDouble limit, double distance) {
        return limit.isPresent() ? OptionalDouble.of(limit.getAsDouble() + distance) : limit;
    }
}
