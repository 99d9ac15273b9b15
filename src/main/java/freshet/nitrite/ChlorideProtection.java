package freshet.nitrite;

import freshet.method.Citation;
import freshet.method.Method;
import freshet.method.Seen;
import java.util.OptionalDouble;

/**
 * Chloride held against nitrite: both enter by the same exchanger of the gills, so enough chloride keeps nitrite out. What
 * is enough is a ratio, here always mg/L of chloride per mg/L of nitrite as N.
 *
 * @param no2NMgPerL nitrite as N, mg/L
 * @param chlorideMgPerL chloride, mg/L
 * @param massRatio wanted ratio of chloride to nitrite as N by mass, above 0
 */
public record ChlorideProtection(double no2NMgPerL, double chlorideMgPerL, double massRatio) {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "chloride-protection",
                    "Chloride that keeps nitrite out of fish, at a ratio the caller chooses",
                    Citation.withDoi(
                            "Tomasso et al. 1979",
                            "Tomasso J.R., Simco B.A., Davis K.B. (1979) Chloride inhibition of nitrite-induced"
                                    + " methemoglobinemia in channel catfish (Ictalurus punctatus). J. Fish. Res. Board"
                                    + " Can. 36:1141-1144; published ratios: see nitrite-chloride-ratios",
                            "10.1139/f79-160"),
                    Seen.SECONDARY)
            .equation("required chloride = r NO2-N; deficit = max(0, required - chloride); greatest NO2-N = chloride/r;"
                    + " r = mg/L chloride per mg/L NO2-N, chosen by the caller")
            .accuracy("observed in channel catfish without added chloride, 24 h, 1.0, 2.5 and 5.0 mg/L NO2: 20.7, 59.8"
                    + " and 77.4 % methaemoglobin (Tomasso et al. 1979), none with 25, 50 and 100 mg/L NaCl; 1, 4 and 5"
                    + " mg/L NO2: 35, 85 and 90 % (Huey et al. 1980). The two disagree twofold at 1 mg/L: there is no"
                    + " dose and response here. Species differ: 24-h LC50 of striped bass 163 mg/L NO2, and CaCl2 did"
                    + " more than twice as much as NaCl; largemouth bass gained nothing from chloride. Calcium protects"
                    + " by another way: of chinook fingerlings in 30 mg/L NO2 died 80 % at 32 mg/L calcium and 0 % at"
                    + " 200")
            .errata("a ratio is quoted as molar, per NO2 by mass, or per NO2-N by mass: 16, 12.3 and 40.5 are the same")
            .uses(ChlorideRatios.METHOD, SaltDose.METHOD);

    /** Least nitrite as N, mg/L, that a ratio is told for; nothing measures less. */
    private static final double LEAST_NITRITE = 1e-9;

    private static final double ROUNDING = 1e-12;

    /** Whether the chloride suffices. */
    public boolean suffices() {
        return chlorideMgPerL >= requiredMgPerL() * (1 - ROUNDING);
    }

    /** Chloride that the nitrite calls for, mg/L. */
    public double requiredMgPerL() {
        return massRatio * no2NMgPerL;
    }

    /** Chloride that is missing, mg/L; 0 if none is. */
    public double deficitMgPerL() {
        return suffices() ? 0 : requiredMgPerL() - chlorideMgPerL;
    }

    /** The greatest nitrite as N, mg/L, for which the chloride suffices. */
    public double no2NLimitMgPerL() {
        return chlorideMgPerL / massRatio;
    }

    /** The ratio of chloride to nitrite as N by mass; empty without nitrite. */
    public OptionalDouble presentMassRatio() {
        return no2NMgPerL < LEAST_NITRITE ? OptionalDouble.empty() : OptionalDouble.of(chlorideMgPerL / no2NMgPerL);
    }
}
