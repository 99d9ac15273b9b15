package freshet.dilution;

import freshet.dilution.Blend.Mixture;
import java.util.OptionalDouble;

/**
 * The largest exchange that keeps within limits, as a share of the full tank; total volume held.
 *
 * @param sharePercent source water of the full tank, 0 to 100 %
 * @param limitedBy what would be overstepped by more
 */
public record SafeExchange(double sharePercent, Limit limitedBy) {

    /** What can limit an exchange. */
    public enum Limit {
        /** Un-ionized ammonia. */
        NH3,
        /** The change of pH. */
        PH,
        /** The change of temperature. */
        TEMPERATURE,
        /** Nothing. */
        NONE
    }

    /**
     * What must not be overstepped.
     *
     * @param nh3NMgPerL un-ionized ammonia as N, mg/L; empty where total ammonia is not known
     * @param phChange change of pH, more than 0
     * @param temperatureChangeC change of temperature, °C, more than 0
     */
    public record Limits(OptionalDouble nh3NMgPerL, double phChange, double temperatureChangeC) {

        private static final double ROUNDING = 1e-9;

        Limit overstepped(Blend blend, Mixture mixture) {
            if (nh3NMgPerL.isPresent() && blend.worseNh3NMgPerL(mixture) > nh3NMgPerL.getAsDouble() * (1 + ROUNDING)) {
                return Limit.NH3;
            }
            if (Math.abs(blend.phChange(mixture)) > phChange + ROUNDING) {
                return Limit.PH;
            }
            return Math.abs(blend.temperatureChangeC(mixture)) > temperatureChangeC + ROUNDING
                    ? Limit.TEMPERATURE
                    : Limit.NONE;
        }
    }

    private static final int STEPS = 50;
    private static final double ACCURACY = 1e-4 / 2;

    /** Goes up in steps to the first that oversteps a limit, then closes in on where it does. */
    public static SafeExchange of(Blend blend, Limits limits) {
        double safe = 0;
        Limit limit = at(0, blend, limits);
        for (int step = 1; step <= STEPS && limit == Limit.NONE; step++) {
            double share = (double) step / STEPS;
            limit = at(share, blend, limits);
            safe = limit == Limit.NONE ? share : safe;
        }
        if (limit == Limit.NONE) {
            return new SafeExchange(100, limit);
        }
        double unsafe = Math.min(1, safe + 1.0 / STEPS);
        while (unsafe - safe > ACCURACY) {
            double middle = (safe + unsafe) / 2;
            Limit there = at(middle, blend, limits);
            if (there == Limit.NONE) {
                safe = middle;
            } else {
                unsafe = middle;
                limit = there;
            }
        }
        return new SafeExchange(safe < ACCURACY ? 0 : 100 * safe, limit);
    }

    private static Limit at(double volumeShare, Blend blend, Limits limits) {
        double massShare = blend.massShare(1 - volumeShare, volumeShare);
        return limits.overstepped(blend, blend.mixture(massShare));
    }
}
