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

    /** Both this and {@code other}; of ranges that lie within each other only the narrowest is kept. */
    public Validity and(Validity other) {
        if (other.within()) {
            return this;
        }
        if (within()) {
            return other;
        }
        List<Range> both = new ArrayList<>(exceeded);
        both.addAll(other.exceeded);
        return new Validity(narrowest(both));
    }

    /** Whether no range is exceeded. */
    public boolean within() {
        return exceeded.isEmpty();
    }

    private static List<Range> narrowest(List<Range> ranges) {
        return ranges.stream()
                .distinct()
                .filter(range -> ranges.stream().noneMatch(other -> !other.equals(range) && other.liesWithin(range)))
                .toList();
    }
}
