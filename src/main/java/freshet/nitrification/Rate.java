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
        Factors factors) {}
