package freshet.nitrification;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Seen;

/**
 * How the rate falls at low alkalinity: {@code min(1, alkalinity/50)}.
 *
 * <p>After Rusten B. et al. (2006) Aquac. Eng. 34:322-331, where the rate of a moving bed fell below 1 to 2 meq/L and thin
 * films held to 0.7 meq/L.
 */
public final class AlkalinityFactor {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "alkalinity-factor",
                    "Nitrification at low alkalinity",
                    Citation.withoutDoi(
                            "This project's judgement after Rusten et al. 2006",
                            "This project's judgement after Rusten B., Eikebrokk B., Ulgenes Y., Lygren E. (2006)"
                                    + " Aquac. Eng. 34:322-331"),
                    Seen.SECONDARY)
            .equation("f = min(1, A/A_0); A as CaCO3", new Constant("A_0", 50, "mg/L", "35 to 100 published"))
            .accuracy("a target of 100 mg/L, 70 to 200, keeps clear of it");

    private static final AlkalinityFactor PUBLISHED = new AlkalinityFactor(METHOD.values());

    private final double sufficientMgPerL;

    AlkalinityFactor(double[] constants) {
        sufficientMgPerL = constants[0];
    }

    static AlkalinityFactor published() {
        return PUBLISHED;
    }

    double at(double alkalinityMgPerLAsCaco3) {
        return Math.min(1, alkalinityMgPerLAsCaco3 / sufficientMgPerL);
    }
}
