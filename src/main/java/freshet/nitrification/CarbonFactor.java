package freshet.nitrification;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Seen;

/**
 * What nitrifiers lose to heterotrophs that live on organic carbon: {@code 1 - 0.7(1 - exp(-1.2 C/N))}; low corner {@code 1
 * - 0.7 min(1, C/N)}.
 *
 * <p>A fit of this project through Zhu S., Chen S. (2001) Aquac. Eng. 25:1-11, doi:10.1016/S0144-8609(01)00071-1 (0.30 at
 * C/N 1 to 2), Michaud L. et al. (2006) Aquac. Eng. 34:224-233 (0.70 at 0.5) and Ling J., Chen S. (2005) Aquac. Eng.
 * 33:150-162 (0.30 to 0.40 at 3).
 */
public final class CarbonFactor {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "carbon-factor",
                    "Nitrification beside the decay of organic carbon",
                    Citation.withoutDoi(
                            "This project's fit to Zhu & Chen 2001, Michaud et al. 2006",
                            "This project's fit to Zhu S., Chen S. (2001) Effects of organic carbon on nitrification rate"
                                    + " in fixed film biofilters. Aquac. Eng. 25:1-11, doi:10.1016/S0144-8609(01)00071-1;"
                                    + " Michaud L. et al. (2006) Aquac. Eng. 34:224-233; Ling J., Chen S. (2005) Aquac."
                                    + " Eng. 33:150-162"),
                    Seen.SECONDARY)
            .equation(
                    "f = 1 - b(1 - exp(-k C/N)); low corner 1 - b min(1, C/N); C biodegradable organic carbon, N total"
                            + " ammonia nitrogen",
                    new Constant("b", 0.7, "1"),
                    new Constant("k", 1.2, "1", "this project's fit"))
            .accuracy(
                    "0.68 at C/N 0.5 (measured 0.70), 0.51 at 1 and 0.36 at 2 (measured 0.30), 0.32 at 3 (measured 0.30"
                            + " to 0.40); the low corner follows Zhu and Chen alone, this project's judgement")
            .errata("a rate measured on a working farm has the carbon in it already: the factor is then 1");

    private static final CarbonFactor PUBLISHED = new CarbonFactor(METHOD.values());

    private final double loss;
    private final double steepness;

    CarbonFactor(double[] constants) {
        loss = constants[0];
        steepness = constants[1];
    }

    static CarbonFactor published() {
        return PUBLISHED;
    }

    /** Estimate, low corner, and the estimate again as high corner. */
    Spread at(double carbonToNitrogen) {
        double estimate = 1 - loss * (1 - StrictMath.exp(-steepness * carbonToNitrogen));
        return new Spread(estimate, 1 - loss * Math.min(1, carbonToNitrogen), estimate);
    }
}
