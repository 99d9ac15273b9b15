package freshet.nitrification;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Seen;

/**
 * How the rate of an adapted film falls with salinity: linear from 1 at 5 to 0.60 at 35 (0.40 to 0.65).
 *
 * <p>Nijhof M., Bovendeur J. (1990) Aquaculture 87:133-143: 0.28 against 0.69 g/m2/day, a factor of 0.41; Rusten B. et al.
 * (2006) about 0.60; Chen S., Ling J., Blancheton J.-P. (2006) Aquac. Eng. 34:179-197, 0.63.
 */
public final class SalinityFactor {

    /** Practical salinity up to which nothing is lost. */
    static final double HARMLESS = 5;

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "salinity-factor",
                    "Nitrification of an adapted film in saline water",
                    Citation.withoutDoi(
                            "This project's judgement after Nijhof & Bovendeur 1990",
                            "This project's judgement after Nijhof M., Bovendeur J. (1990) Fixed film nitrification"
                                    + " characteristics in sea-water recirculation fish culture systems. Aquaculture"
                                    + " 87:133-143 (0.41); Rusten B. et al. (2006) Aquac. Eng. 34:322-331 (about 0.60);"
                                    + " Chen S., Ling J., Blancheton J.-P. (2006) Aquac. Eng. 34:179-197 (0.63)"),
                    Seen.SECONDARY)
            .equation(
                    "f = 1 - (1 - q) max(0, S - S_0)/D",
                    new Constant("q", 0.60, "1", "factor at salinity 35"),
                    new Constant("q_low", 0.40, "1"),
                    new Constant("q_high", 0.65, "1"),
                    new Constant("S_0", HARMLESS, "1"),
                    new Constant("D", 30, "1"))
            .accuracy("for a film grown in that water: a step of more than 5 to 10 stalls even an adapted one");

    private static final SalinityFactor PUBLISHED = new SalinityFactor(METHOD.values());

    private final Spread inSeaWater;
    private final double harmless;
    private final double span;

    SalinityFactor(double[] constants) {
        inSeaWater = Spread.of(constants, 0);
        harmless = constants[3];
        span = constants[4];
    }

    static SalinityFactor published() {
        return PUBLISHED;
    }

    Spread at(double salinity) {
        double share = Math.max(0, salinity - harmless) / span;
        return new Spread(
                1 - (1 - inSeaWater.estimate()) * share,
                1 - (1 - inSeaWater.lower()) * share,
                1 - (1 - inSeaWater.upper()) * share);
    }
}
