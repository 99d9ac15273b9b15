package freshet.method;

import java.util.ArrayList;
import java.util.List;

/**
 * Whether the inputs of an answer lie within the ranges its source states.
 *
 * @param exceeded the ranges that an input lies outside of; empty when all is within
 */
public record Validity(List<Range> exceeded) {

    /** Every input lies within its range. */
    public static final Validity WITHIN = new Validity(List.of());

    /** Copies the list. */
    public Validity {
        exceeded = List.copyOf(exceeded);
    }

    /** Whether {@code value} lies within {@code range}. */
    public static Validity of(Range range, double value) {
        return range.contains(value) ? WITHIN : new Validity(List.of(range));
    }

    /** Both this and the validity of {@code value} in {@code range}. */
    public Validity and(Range range, double value) {
        return and(of(range, value));
    }

    /** Both this and {@code other}. */
    public Validity and(Validity other) {
        if (other.within()) {
            return this;
        }
        if (within()) {
            return other;
        }
        List<Range> both = new ArrayList<>(exceeded);
        both.addAll(other.exceeded);
        return new Validity(both);
    }

    /** Whether no range is exceeded. */
    public boolean within() {
        return exceeded.isEmpty();
    }
}
