package freshet.nitrification;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Seen;

/**
 * The total ammonia a biofilm can use with the oxygen it has, {@code min(TAN, O/3.4)}, and no half-order credit below 2
 * mg/L of oxygen.
 *
 * <p>Hem L.J., Rusten B., Ødegaard H. (1994) Water Res. 28:1425-1433; Rusten B. et al. (2006) Aquac. Eng. 34:322-331: a
 * moving bed turns from ammonia to oxygen limitation at 3.2 to 3.4 mg/L oxygen per mg/L total ammonia as N (2.7 to 3.6).
 */
public final class OxygenLimit {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "hem-1994",
                    "Total ammonia that a biofilm can use with the oxygen at hand",
                    Citation.withoutDoi(
                            "Hem, Rusten & Ødegaard 1994, Water Res. 28:1425-1433",
                            "Hem L.J., Rusten B., Ødegaard H. (1994) Nitrification in a moving bed biofilm reactor. Water"
                                    + " Res. 28:1425-1433; Rusten B., Eikebrokk B., Ulgenes Y., Lygren E. (2006)"
                                    + " Aquac. Eng. 34:322-331"),
                    Seen.MEMORY)
            .equation(
                    "usable TAN = min(TAN, O/q); below O_min the rate is multiplied by O/O_min",
                    new Constant("q", 3.4, "mg/mg", "2.7 to 3.6 published"),
                    new Constant("O_min", 2, "mg/L", "this project's judgement: the stated minimum at the media"))
            .accuracy("the switch is gradual; q also depends on the thickness of the film");

    private static final OxygenLimit PUBLISHED = new OxygenLimit(METHOD.values());

    private final double oxygenPerTan;
    private final double leastOxygenMgPerL;

    OxygenLimit(double[] constants) {
        oxygenPerTan = constants[0];
        leastOxygenMgPerL = constants[1];
    }

    static OxygenLimit published() {
        return PUBLISHED;
    }

    /** Total ammonia as N, mg/L, that {@code oxygenMgPerL} lets a film use. */
    double usableTanMgPerL(double oxygenMgPerL) {
        return oxygenMgPerL / oxygenPerTan;
    }

    /** Whether oxygen, not ammonia, sets the rate. */
    boolean limits(double tanMgPerL, double oxygenMgPerL) {
        return usableTanMgPerL(oxygenMgPerL) < tanMgPerL;
    }

    /** The part of the rate that is left at low oxygen, 0 to 1. */
    double cut(double oxygenMgPerL) {
        return Math.min(1, oxygenMgPerL / leastOxygenMgPerL);
    }

    /** Whether {@code oxygenMgPerL} is below the minimum at the media. */
    boolean critical(double oxygenMgPerL) {
        return oxygenMgPerL < leastOxygenMgPerL;
    }
}
