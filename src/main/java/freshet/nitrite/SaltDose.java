package freshet.nitrite;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Seen;

/**
 * The salt that brings a wanted rise of chloride.
 *
 * @param chlorideRiseMgPerL wanted rise of chloride, mg/L
 * @param volumeL volume of water, L
 * @param salt the salt
 * @param purity share of the salt in the product, above 0, at most 1
 */
public record SaltDose(double chlorideRiseMgPerL, double volumeL, ChlorideSalt salt, double purity) {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "salt-dose",
                    "Salt for a rise of chloride",
                    Citation.withoutDoi(
                            "Durborow et al. 1997, SRAC Publication 462",
                            "Durborow R.M., Crosby M.D., Brunson M.W. (1997) Nitrite in fish ponds. SRAC Publication 462;"
                                    + " dose by stoichiometry; the two limits are this project's judgement"),
                    Seen.SECONDARY)
            .equation(
                    "dose = rise V/(1000 w p), g; w = chloride in the salt by mass (NaCl 0.6066, CaCl2.2H2O 0.4823, KCl"
                            + " 0.4755), p = purity; rise of dissolved salt = rise of chloride x ions/chloride",
                    new Constant("d", 1000, "mg/L", "greatest rise of dissolved salt in one day; judgement"),
                    new Constant("g", 500, "mg/L", "rise of dissolved salt from which plants may suffer; judgement"))
            .accuracy(
                    "exact for the stated purity; 4.48 lb of NaCl per acre-foot and mg/L, which handbooks round to 4.5")
            .errata("calcium chloride is sold with and without water: 0.4823 and 0.6389 of it are chloride");

    private static final double MG_PER_G = 1000;

    /** Product to dose, g. */
    public double grams() {
        return chlorideRiseMgPerL * volumeL / MG_PER_G / (salt.chlorideShare() * purity);
    }

    /** Rise of dissolved salt, mg/L: the ions of the salt only. */
    public double dissolvedSaltRiseMgPerL() {
        return chlorideRiseMgPerL * salt.ionsPerChloride();
    }

    /** The least number of days over which to spread the dose; 0 for no dose. */
    public double days() {
        return days(METHOD.values());
    }

    double days(double[] c) {
        return StrictMath.ceil(dissolvedSaltRiseMgPerL() / c[0]);
    }

    /** Whether plants may suffer. */
    public boolean harmsPlants() {
        return harmsPlants(METHOD.values());
    }

    boolean harmsPlants(double[] c) {
        return dissolvedSaltRiseMgPerL() >= c[1];
    }
}
