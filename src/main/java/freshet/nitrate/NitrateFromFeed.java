package freshet.nitrate;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Seen;

/**
 * Nitrate nitrogen made from feed: total ammonia by the protein coefficient, less what nitrifiers build into cells.
 *
 * <p>Ebeling J.M., Timmons M.B., Bisogni J.J. (2006) Aquaculture 257:346-358, doi:10.1016/j.aquaculture.2006.03.019.
 */
public final class NitrateFromFeed {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "nitrate-from-feed",
                    "Nitrate nitrogen that nitrification makes of the feed",
                    Citation.withDoi(
                            "Ebeling et al. 2006",
                            "Ebeling J.M., Timmons M.B., Bisogni J.J. (2006) Engineering analysis of the stoichiometry of"
                                    + " photoautotrophic, autotrophic, and heterotrophic removal of ammonia-nitrogen in"
                                    + " aquaculture systems. Aquaculture 257:346-358",
                            "10.1016/j.aquaculture.2006.03.019"),
                    Seen.SECONDARY)
            .equation(
                    "nitrate N = 1000 feed protein/100 c y, g/day; feed in kg/day as fed, protein in percent",
                    new Constant("c", 0.092, "g/g", "total ammonia nitrogen per protein fed"),
                    new Constant("y", 0.976, "g/g", "nitrate nitrogen per ammonia nitrogen oxidised; from memory"))
            .accuracy("accepted rules spread from 0.070 to 0.112 for c");

    private static final double[] CONSTANTS = METHOD.values();

    private NitrateFromFeed() {}

    /** Nitrate nitrogen, g/day, from feed (kg/day) with protein (percent, as fed). */
    public static double gPerDay(double feedKgPerDay, double proteinPercent) {
        return 1000 * feedKgPerDay * (proteinPercent / 100) * CONSTANTS[0] * CONSTANTS[1];
    }
}
