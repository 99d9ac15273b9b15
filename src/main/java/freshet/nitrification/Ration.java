package freshet.nitrification;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Range;
import freshet.method.Seen;
import freshet.method.Validity;

/**
 * The feed of one day. Nitrogen is protein/6.25, the factor with which feed labels are made, so it holds for plant
 * protein too.
 *
 * <p>Jones D.B. (1931, revised 1941) Factors for converting percentages of nitrogen in foods and feeds into percentages of
 * proteins. USDA Circular 183.
 *
 * @param feedKgPerDay feed as fed, kg/day
 * @param proteinPercent crude protein as fed, %
 */
public record Ration(double feedKgPerDay, double proteinPercent) {

    /** Protein within which the methods of this topic are stated to hold. */
    static final Range PROTEIN = new Range("protein_percent", 25, 55, "%");

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "jones-1931",
                    "Nitrogen in protein",
                    Citation.withoutDoi(
                            "Jones 1931, USDA Circular 183",
                            "Jones D.B. (1931, revised 1941) Factors for converting percentages of nitrogen in foods and"
                                    + " feeds into percentages of proteins. USDA Circular 183. Washington DC"),
                    Seen.MEMORY)
            .equation("nitrogen = protein/f", new Constant("f", 6.25, "g/g", "protein per nitrogen"))
            .accuracy("other factors hold for single proteins (wheat 5.70 to 5.83, soy 5.71, milk 6.38), but labels are"
                    + " made with 6.25")
            .errata("a factor of 0.16 for nitrogen in protein is the same number");

    private static final double PROTEIN_PER_NITROGEN = METHOD.values()[0];

    /** Protein in the feed, g/day. */
    public double proteinGPerDay() {
        return 1000 * feedKgPerDay * proteinShare();
    }

    /** Nitrogen in the feed, g/day. */
    public double nitrogenGPerDay() {
        return nitrogenGPerDay(PROTEIN_PER_NITROGEN);
    }

    double nitrogenGPerDay(double proteinPerNitrogen) {
        return proteinGPerDay() / proteinPerNitrogen;
    }

    /** Nitrogen in one gram of feed, g. */
    double nitrogenGPerG() {
        return proteinShare() / PROTEIN_PER_NITROGEN;
    }

    /** Whether the protein lies within 25 to 55 %. */
    public Validity validity() {
        return Validity.of(PROTEIN, proteinPercent);
    }

    private double proteinShare() {
        return proteinPercent / 100;
    }
}
