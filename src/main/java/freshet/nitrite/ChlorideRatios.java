package freshet.nitrite;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Seen;
import freshet.substance.MolarMass;

/**
 * Published ratios of chloride to nitrite, brought to one basis: mg/L of chloride per mg/L of nitrite as N.
 *
 * <p>Tomasso et al. (1979) J. Fish. Res. Board Can. 36:1141-1144 (molar); Durborow et al. (1997) SRAC Publication 462 (per
 * nitrite as the test kit reports it, so on either basis); British Columbia water quality guidelines and EIFAC (1984)
 * Technical Paper 46 (limits of NO2-N by chloride, both staircases).
 */
public final class ChlorideRatios {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "nitrite-chloride-ratios",
                    "Published ratios of chloride to nitrite on one basis, Cl : NO2-N by mass",
                    Citation.withoutDoi(
                            "Durborow et al. 1997, SRAC Publication 462; and others",
                            "Tomasso J.R., Simco B.A., Davis K.B. (1979) J. Fish. Res. Board Can. 36:1141-1144; Durborow"
                                    + " R.M., Crosby M.D., Brunson M.W. (1997) Nitrite in fish ponds. SRAC Publication"
                                    + " 462; British Columbia approved water quality guidelines, nitrite; EIFAC (1984)"
                                    + " Water quality criteria for European freshwater fish: nitrite. EIFAC Technical"
                                    + " Paper 46"),
                    Seen.SECONDARY)
            .equation(
                    "per NO2-N by mass: full = 35.45/14.007 m; kit = s if the kit reads NO2-N, 46.005/14.007 s if it reads"
                            + " NO2; guideline: 1/a short-term, 1/b 30-day mean; EIFAC at low chloride: e salmonids,"
                            + " f coarse fish",
                    new Constant("m", 16, "mol/mol", "Cl to NO2, no methaemoglobin in channel catfish; Tomasso et al."),
                    new Constant("s", 10, "g/g", "Cl to nitrite as the kit reads it, catfish ponds; Durborow et al."),
                    new Constant("a", 0.03, "g/g", "NO2-N per Cl, short-term maximum; British Columbia"),
                    new Constant("b", 0.01, "g/g", "NO2-N per Cl, 30-day mean; British Columbia"),
                    new Constant("e", 100, "g/g", "Cl to NO2-N, salmonids, mean, up to 5 mg/L Cl; EIFAC, from memory"),
                    new Constant("f", 50, "g/g", "Cl to NO2-N, coarse fish, mean, up to 5 mg/L Cl; EIFAC, from memory"))
            .accuracy(
                    "the guidelines are for receiving waters; above 5 mg/L chloride EIFAC asks for more, up to 167 for"
                            + " salmonids at 20 and 133 for coarse fish at 40 mg/L; as insurance catfish farmers hold 100 mg/L"
                            + " chloride (Durborow et al.); Directive 2006/44/EC asked for 0.01 mg/L NO2 (salmonid) and 0.03 (cyprinid)"
                            + " whatever the chloride; 3 protected catfish in part only (Bowser et al. 1983, from memory)")
            .errata(
                    "the ratio of Durborow et al. is quoted without saying whether it is per NO2 or per NO2-N: the factor"
                            + " is 3.28");

    private static final ChlorideRatios PUBLISHED = new ChlorideRatios(METHOD.values());

    private final double[] c;

    ChlorideRatios(double[] constants) {
        c = constants;
    }

    /** With the published constants. */
    public static ChlorideRatios published() {
        return PUBLISHED;
    }

    /** Cl : NO2-N by mass that kept channel catfish free of methaemoglobin. */
    public double full() {
        return fromMolar(c[0]);
    }

    /** Cl : NO2-N by mass of the rule for catfish ponds, if the kit reads NO2-N. */
    public double pondPerNitrogen() {
        return c[1];
    }

    /** Cl : NO2-N by mass of the rule for catfish ponds, if the kit reads NO2. */
    public double pondPerNitrite() {
        return c[1] * MolarMass.NITRITE / MolarMass.NITROGEN;
    }

    /** Cl : NO2-N by mass of the short-term guideline of British Columbia. */
    public double guidelineMaximum() {
        return 1 / c[2];
    }

    /** Cl : NO2-N by mass of the 30-day guideline of British Columbia. */
    public double guidelineMean() {
        return 1 / c[3];
    }

    /** Cl : NO2-N by mass of the EIFAC criterion for salmonids at low chloride. */
    public double eifacSalmonids() {
        return c[4];
    }

    /** Cl : NO2-N by mass of the EIFAC criterion for coarse fish at low chloride. */
    public double eifacCoarseFish() {
        return c[5];
    }

    /** Cl : NO2-N by mass from a molar ratio of Cl to NO2. */
    public static double fromMolar(double molar) {
        return molar * MolarMass.CHLORIDE / MolarMass.NITROGEN;
    }
}
