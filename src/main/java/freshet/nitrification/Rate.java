package freshet.nitrification;

import java.util.OptionalDouble;

/**
 * What a unit of media oxidizes, g TAN as N per m2 (or m3) and day.
 *
 * @param perVolume whether it is per m3; else per m2
 * @param estimate the estimate
 * @param lower the low corner of the published spread; empty where there is none
 * @param upper the high corner of the published spread; empty where there is none
 * @param plateau the rate if neither total ammonia nor the order of the reaction held it back
 * @param reference the reference rate it was made from
 * @param factors by how much each condition changed the reference rate
 */
public record Rate(
        boolean perVolume,
        double estimate,
        OptionalDouble lower,
        OptionalDouble upper,
        double plateau,
        double reference,
        Factors factors) {

    /** Differences of this relative size are rounding. */
    private static final double ROUNDING = 1e-9;

    /** Whether the estimate is above the rate it was made from. */
    public boolean aboveReference() {
        return estimate > reference * (1 + ROUNDING);
    }

    /** Whether the estimate is above the high corner of its published spread. */
    public boolean aboveSpread() {
        return upper.isPresent() && estimate > upper.getAsDouble() * (1 + ROUNDING);
    }
}
