package freshet.nitrification;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Seen;

/**
 * The total ammonia below which a film cannot live: {@code S_min = K b/(mu - b)}.
 *
 * <p>Rittmann B.E., McCarty P.L. (1980) Model of steady-state-biofilm kinetics. Biotechnol. Bioeng. 22:2343-2357, with the
 * constants for nitrifiers of Metcalf and Eddy: 0.088 mg/L as N. Zhu and Chen measured 0.07 mg/L near 27 °C.
 */
public final class SubstrateFloor {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "rittmann-mccarty-1980",
                    "Least total ammonia that sustains a film of nitrifiers",
                    Citation.withoutDoi(
                            "Rittmann & McCarty 1980, Biotechnol. Bioeng. 22:2343",
                            "Rittmann B.E., McCarty P.L. (1980) Model of steady-state-biofilm kinetics. Biotechnol."
                                    + " Bioeng. 22:2343-2357; constants of Metcalf and Eddy, Wastewater Engineering"),
                    Seen.MEMORY)
            .equation(
                    "S_min = K b/(mu - b) with K 0.74 mg/L, b 0.08 1/d, mu 0.75 1/d, rounded",
                    new Constant("S_min", 0.088, "mg/L", "as N"))
            .accuracy("0.07 mg/L was measured near 27 °C");

    /** Total ammonia as N, mg/L. */
    static final double TAN_MG_PER_L = METHOD.values()[0];

    private SubstrateFloor() {}
}
