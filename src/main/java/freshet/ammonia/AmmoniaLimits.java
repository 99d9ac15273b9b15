package freshet.ammonia;

import java.util.OptionalDouble;

/**
 * What a limit on un-ionized ammonia means for total ammonia in a given water, and how far the water may move before
 * the present total ammonia meets it.
 *
 * @param nh3NLimitMgPerL the limit as N, mg/L, above 0
 * @param water the water
 * @param dissociation the constant
 */
public record AmmoniaLimits(double nh3NLimitMgPerL, Water water, AmmoniaDissociation dissociation) {

    private static final double LOWEST_PH = 0;
    private static final double HIGHEST_PH = 14;

    /** The total ammonia as N, mg/L, at which un-ionized ammonia meets the limit. */
    public double tanLimitMgPerL() {
        return nh3NLimitMgPerL
                / dissociation.fraction(water.ph(), water.temperatureC(), water.salinity(), water.scale());
    }

    /**
     * The pH, on the scale of the water, at which {@code tanMgPerL} meets the limit at the present temperature; empty
     * if it never does between pH 0 and 14.
     */
    public OptionalDouble phLimit(double tanMgPerL) {
        if (!canMeetLimit(tanMgPerL)) {
            return OptionalDouble.empty();
        }
        double pKa = dissociation.pKa(water.temperatureC(), water.salinity(), water.scale());
        double ph = AmmoniaDissociation.phAt(nh3NLimitMgPerL / tanMgPerL, pKa);
        return ph < LOWEST_PH || ph > HIGHEST_PH ? OptionalDouble.empty() : OptionalDouble.of(ph);
    }

    /**
     * The temperature, °C, at which {@code tanMgPerL} meets the limit at the present pH; empty if it never does between
     * -2 and 60 °C.
     */
    public OptionalDouble temperatureLimitC(double tanMgPerL) {
        if (!canMeetLimit(tanMgPerL)) {
            return OptionalDouble.empty();
        }
        double pKa = water.ph() + StrictMath.log10(tanMgPerL / nh3NLimitMgPerL - 1);
        return dissociation.temperatureAt(pKa, water.salinity(), water.scale());
    }

    private boolean canMeetLimit(double tanMgPerL) {
        return nh3NLimitMgPerL > 0 && tanMgPerL > nh3NLimitMgPerL;
    }
}
