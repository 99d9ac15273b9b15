package freshet.nitrification;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Seen;

/**
 * Total ammonia as a fixed share of the protein fed: {@code TAN = protein x 0.092}.
 *
 * <p>Timmons M.B., Ebeling J.M., Recirculating Aquaculture; Ebeling J.M., Timmons M.B., Bisogni J.J. (2006) Aquaculture
 * 257:346-358, equation 1. For fed, growing fish, as a daily mean, 25-55 % protein. The share is 0.16 nitrogen in protein x
 * 0.80 assimilated x 0.80 excreted x 0.90 as ammonia. Where solids stay in the water (0.16 x 0.90) it is 0.144.
 */
public final class ProteinCoefficient {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "protein-coefficient",
                    "Total ammonia as a share of the protein fed",
                    Citation.withDoi(
                            "Ebeling et al. 2006, eq. 1",
                            "Timmons M.B., Ebeling J.M. Recirculating Aquaculture (2002 and later editions); restated as"
                                    + " equation 1 of Ebeling J.M., Timmons M.B., Bisogni J.J. (2006) Engineering"
                                    + " analysis of the stoichiometry of photoautotrophic, autotrophic, and"
                                    + " heterotrophic removal of ammonia-nitrogen in aquaculture systems. Aquaculture"
                                    + " 257:346-358",
                            "10.1016/j.aquaculture.2006.03.019"),
                    Seen.SECONDARY)
            .equation(
                    "TAN = protein c; where solids stay in the water TAN = protein s (g/day)",
                    new Constant("c", 0.092, "g/g", "seen in later texts"),
                    new Constant("c_low", 0.070, "g/g", "this project's reading of the published spread"),
                    new Constant("c_high", 0.112, "g/g", "this project's reading of the published spread"),
                    new Constant("s", 0.144, "g/g", "memory"),
                    new Constant("s_low", 0.112, "g/g", "this project's judgement"),
                    new Constant("s_high", 0.160, "g/g", "all nitrogen of the protein"))
            .within(Ration.PROTEIN)
            .accuracy("one number for every species, size and diet; accepted rules lie 22 % below to 12 % above it at"
                    + " 35 % protein, and 0.2 to 0.7 of feed nitrogen has been found as ammonia")
            .errata("teaching examples sometimes multiply by 1.2 and so give ammonia as NH3 under the name of nitrogen")
            .uses(Ration.METHOD);

    private static final ProteinCoefficient PUBLISHED = new ProteinCoefficient(METHOD.values());

    private final Spread solidsRemoved;
    private final Spread solidsRetained;

    ProteinCoefficient(double[] constants) {
        solidsRemoved = Spread.of(constants, 0);
        solidsRetained = Spread.of(constants, 3);
    }

    /** The coefficient as published. */
    public static ProteinCoefficient published() {
        return PUBLISHED;
    }

    /**
     * Total ammonia as N, g/day.
     *
     * @param ration the feed
     * @param retained whether solids stay in the water and decay there
     */
    public Spread tanGPerDay(Ration ration, boolean retained) {
        return (retained ? solidsRetained : solidsRemoved).times(ration.proteinGPerDay());
    }

    /** Total ammonia as N, g/day, for a filter that follows removal of solids. */
    static double tanGPerDay(Ration ration) {
        return PUBLISHED.solidsRemoved.estimate() * ration.proteinGPerDay();
    }

    /** The feed, kg/day, that gives {@code tanGPerDay} of total ammonia as N at a protein above 0 %. */
    static double feedKgPerDay(double tanGPerDay, double proteinPercent) {
        return tanGPerDay / tanGPerDay(new Ration(1, proteinPercent));
    }
}
