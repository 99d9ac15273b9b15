package freshet.nitrification;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Seen;

/**
 * How the rate of a biofilm rises with its substrate: half order up to a plateau, {@code g(S) = min(1, (S/S*)^(1/2))}.
 *
 * <p>Harremoës P. (1978) Biofilm kinetics, in Mitchell R. (ed) Water Pollution Microbiology 2:71-109; found for farm
 * filters by Bovendeur J. et al. (1987) Aquaculture 63:329-353 and, in fresh and sea water, by Nijhof M., Bovendeur J.
 * (1990) Aquaculture 87:133-143. S* about 2 mg/L of total ammonia as N, 1 to 3.
 */
public final class HalfOrder {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "harremoes-1978",
                    "Half-order kinetics of a biofilm up to a plateau",
                    Citation.withoutDoi(
                            "Harremoës 1978; Bovendeur et al. 1987",
                            "Harremoës P. (1978) Biofilm kinetics, in Mitchell R. (ed) Water Pollution Microbiology 2,"
                                    + " Wiley, 71-109; Bovendeur J., Eding E.H., Henken A.M. (1987) Aquaculture"
                                    + " 63:329-353; Nijhof M., Bovendeur J. (1990)"
                                    + " Fixed film nitrification characteristics in sea-water recirculation fish culture"
                                    + " systems. Aquaculture 87:133-143"),
                    Seen.SECONDARY)
            .equation(
                    "g(S) = min(1, (S/S*)^(1/2)); S total ammonia as N",
                    new Constant("S*", 2, "mg/L", "memory; 1 to 3 published"))
            .accuracy("a power law of exponent 0.7 is also published, 24 % lower at 0.5 mg/L");

    private static final HalfOrder PUBLISHED = new HalfOrder(METHOD.values());

    private final double plateauMgPerL;

    HalfOrder(double[] constants) {
        plateauMgPerL = constants[0];
    }

    static HalfOrder published() {
        return PUBLISHED;
    }

    /** Concentration from which the rate rises no more, mg/L as N. */
    double plateauMgPerL() {
        return plateauMgPerL;
    }

    /** Rate over plateau rate at {@code tanMgPerL}. */
    double share(double tanMgPerL) {
        return Math.min(1, StrictMath.sqrt(tanMgPerL / plateauMgPerL));
    }

    /** Total ammonia as N, mg/L, at which the rate is {@code share} of the plateau rate; 0 to 1. */
    double tanMgPerL(double share) {
        return plateauMgPerL * share * share;
    }
}
