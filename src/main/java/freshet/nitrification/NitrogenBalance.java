package freshet.nitrification;

import freshet.answer.FaultCode;
import freshet.answer.Refusal;
import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Seen;
import java.util.OptionalDouble;

/**
 * Total ammonia as what is left of feed nitrogen: {@code TAN = N [e(D - R) + m(e(1 - D) + 1 - e)] a}.
 *
 * <p>Wheaton F.W. et al. (1994) Nitrification filter principles, in Timmons and Losordo (eds) Aquaculture Water Reuse
 * Systems, 101-126; Drennan D.G. et al. (2006) Aquac. Eng. 34:403-416. Use it where food conversion, body nitrogen or
 * digestibility are known; 25-55 % protein.
 */
public final class NitrogenBalance {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "nitrogen-balance",
                    "Total ammonia as feed nitrogen less what fish keep and do not dissolve",
                    Citation.withoutDoi(
                            "Wheaton et al. 1994, Nitrification filter principles",
                            "Wheaton F.W., Hochheimer J.N., Kaiser G.E., Krones M.J., Libey G.S., Easter C.C. (1994)"
                                    + " Nitrification filter principles, in Timmons M.B., Losordo T.M. (eds) Aquaculture"
                                    + " Water Reuse Systems, Elsevier, 101-126; Drennan D.G. et al. (2006) Aquac. Eng."
                                    + " 34:403-416"),
                    Seen.MEMORY)
            .equation(
                    "TAN = N [e(D - R) + m(e(1 - D) + 1 - e)] a; N feed nitrogen, g/day; R = w/(FCR N/feed) where the"
                            + " feed conversion ratio is given",
                    new Constant("e", 0.98, "1", "share of feed eaten"),
                    new Constant("e_low", 0.90, "1"),
                    new Constant("e_high", 1, "1"),
                    new Constant("D", 0.88, "1", "digestibility of protein"),
                    new Constant("D_low", 0.80, "1"),
                    new Constant("D_high", 0.95, "1"),
                    new Constant("R", 0.30, "1", "nitrogen retained per nitrogen eaten"),
                    new Constant("R_low", 0.45, "1", "for the low corner of TAN"),
                    new Constant("R_high", 0.15, "1", "for the high corner of TAN"),
                    new Constant("a", 0.85, "1", "ammonia in dissolved nitrogen"),
                    new Constant("a_low", 0.70, "1"),
                    new Constant("a_high", 0.95, "1"),
                    new Constant("m", 0, "1", "share of waste that decays in the water"),
                    new Constant("w", 0.0275, "g/g", "nitrogen in fish, wet weight, 0.025 to 0.030"))
            .within(Ration.PROTEIN)
            .accuracy("no better than its shares: retention of 0.12 to 0.44 was found for five species in one system"
                    + " (Summerfelt and Penne 2007)")
            .uses(Ration.METHOD);

    private static final NitrogenBalance PUBLISHED = new NitrogenBalance(METHOD.values());

    private final Spread eaten;
    private final Spread digestibility;
    private final Spread retained;
    private final Spread ammoniaShare;
    private final double mineralized;
    private final double fishNitrogenGPerG;

    NitrogenBalance(double[] constants) {
        eaten = Spread.of(constants, 0);
        digestibility = Spread.of(constants, 3);
        retained = Spread.of(constants, 6);
        ammoniaShare = Spread.of(constants, 9);
        mineralized = constants[12];
        fishNitrogenGPerG = constants[13];
    }

    /** The balance with the published shares. */
    public static NitrogenBalance published() {
        return PUBLISHED;
    }

    /**
     * Total ammonia as N, g/day; a corner that would be negative is 0.
     *
     * @throws Refusal if no less nitrogen is retained than is digested
     */
    public Spread tanGPerDay(Ration ration, NitrogenFate fate) {
        Spread e = known(fate.eaten(), eaten);
        Spread d = known(fate.digestibility(), digestibility);
        Spread r = retained(ration, fate);
        if (r.estimate() >= d.estimate()) {
            throw new Refusal(
                    fate.decidingField(),
                    FaultCode.INCONSISTENT,
                    "Fish cannot keep " + Math.round(100 * Math.min(r.estimate(), 10))
                            + " % of the nitrogen they eat (or more) and digest only " + Math.round(100 * d.estimate())
                            + " % of it.");
        }
        Spread a = known(fate.ammoniaShare(), ammoniaShare);
        double m = fate.mineralized().orElse(mineralized);
        double nitrogen = ration.nitrogenGPerDay();
        return new Spread(
                nitrogen * share(e.estimate(), d.estimate(), r.estimate(), m) * a.estimate(),
                nitrogen * share(e.lower(), d.lower(), r.lower(), m) * a.lower(),
                nitrogen * share(e.upper(), d.upper(), r.upper(), m) * a.upper());
    }

    private Spread retained(Ration ration, NitrogenFate fate) {
        if (fate.feedConversionRatio().isEmpty()) {
            return known(fate.retained(), retained);
        }
        double gained = fate.fishNitrogenGPerG().orElse(fishNitrogenGPerG);
        return Spread.known(gained / (fate.feedConversionRatio().getAsDouble() * ration.nitrogenGPerG()));
    }

    private static double share(double e, double d, double r, double m) {
        return Math.max(0, e * (d - r) + m * (e * (1 - d) + 1 - e));
    }

    private static Spread known(OptionalDouble given, Spread published) {
        return given.isPresent() ? Spread.known(given.getAsDouble()) : published;
    }
}
