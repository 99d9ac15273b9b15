package freshet.nitrate;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Seen;
import freshet.nitrification.Meals;
import freshet.nitrification.ProteinCoefficient;
import freshet.nitrification.Ration;
import freshet.nitrification.TanLoad;

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
                    "nitrate N = y TAN, g/day; TAN from the protein fed",
                    new Constant("y", 0.976, "g/g", "nitrate nitrogen per ammonia nitrogen oxidised; from memory"))
            .accuracy("as that of the ammonia from feed: accepted rules lie 22 % below to 12 % above")
            .uses(ProteinCoefficient.METHOD);

    private static final double NITRATE_PER_AMMONIA = METHOD.values()[0];

    private NitrateFromFeed() {}

    /** Nitrate nitrogen, g/day, from feed (kg/day) with protein (percent, as fed). */
    public static double gPerDay(double feedKgPerDay, double proteinPercent) {
        return TanLoad.of(new Ration(feedKgPerDay, proteinPercent), Meals.SEVERAL)
                        .tanGPerDay()
                * NITRATE_PER_AMMONIA;
    }
}
