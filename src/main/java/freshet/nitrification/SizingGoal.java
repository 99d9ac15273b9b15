package freshet.nitrification;

import java.util.OptionalDouble;

/**
 * What a filter is designed for.
 *
 * @param load the load
 * @param safetyFactor by which the mean load is multiplied; empty for 1.5
 * @param flow what the water through it will bring
 * @param specificSurfaceM2PerM3 surface per bulk volume of media; empty if not known
 */
public record SizingGoal(
        TanLoad load, OptionalDouble safetyFactor, FilterFlow flow, OptionalDouble specificSurfaceM2PerM3) {

    /** By what the mean load is multiplied: the safety factor, or the daily peak where that is higher. */
    public double multiplier() {
        return Math.max(
                safetyFactor.orElse(BiofilterSizing.USUAL_SAFETY),
                load.peakFactor().orElse(0));
    }

    /** Whether the caller's safety factor is less than the daily peak. */
    public boolean safetyBelowPeak() {
        return safetyFactor.orElse(Double.POSITIVE_INFINITY) < load.peakFactor().orElse(0);
    }

    /** The load designed for, g TAN as N per day. */
    public double designTanGPerDay() {
        return load.tanGPerDay() * multiplier();
    }
}
