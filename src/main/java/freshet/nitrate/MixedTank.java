package freshet.nitrate;

import freshet.method.Citation;
import freshet.method.Method;
import freshet.method.Seen;
import java.util.OptionalDouble;

/**
 * Nitrate in a completely mixed tank: V dC/dt = surplus + Q (Ci - C), with plants that take nothing once C is 0.
 *
 * <p>The textbook balance of a completely mixed reactor; its exchange part in Kraul S., Szyper J., Bourke B. (1985)
 * Practical formulas for computing water exchange rates. Prog. Fish-Cult. 47:69-70. All concentrations as N.
 *
 * @param volumeL volume, L
 * @param nowMgPerL nitrate now, mg/L
 * @param sources what comes and goes
 */
public record MixedTank(double volumeL, double nowMgPerL, NitrateSources sources) {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "mixed-tank-nitrate",
                    "Nitrate of a completely mixed tank with production, exchange, plants and denitrification",
                    Citation.withoutDoi(
                            "Mixed-reactor balance; exchange: Kraul et al. 1985",
                            "Balance of a completely mixed reactor (textbook form). Its exchange part: Kraul S., Szyper J.,"
                                    + " Bourke B. (1985) Practical formulas for computing water exchange rates. Prog."
                                    + " Fish-Cult. 47:69-70"),
                    Seen.SECONDARY)
            .equation(
                    "V dC/dt = P (1 - d) + E Ci - U + Q (Ci - C); with lambda = Q/V and Css = Ci + (P (1 - d) + E Ci - U)/Q:"
                            + " C(t) = Css + (C0 - Css) exp(-lambda t); without exchange C(t) = C0 + (P (1 - d) + E Ci - U) t/V;"
                            + " never below 0, where plants take up nothing")
            .accuracy("exact for a tank that is mixed and sources that stay the same; real tanks have dead corners")
            .errata(
                    "a time to the limit must not be evaluated when the plateau lies below it",
                    "plants cannot take up nitrate that is not there")
            .uses(NitrateFromFeed.METHOD);

    /** Share of a turnover or of the way to the plateau below which a double sees a straight line. */
    private static final double NEGLIGIBLE = 1e-18;

    /** Change of the stock now, g/day. */
    public double netGPerDay() {
        return sources.surplusGPerDay() + sources.exchangeLPerDay() * (sources.sourceMgPerL() - nowMgPerL) / 1000;
    }

    /** Nitrate after {@code days}, mg/L. */
    public double mgPerLAfter(double days) {
        // What is left of the present stock, and what came in meanwhile: no small value as a difference of large ones.
        double turnovers = turnoverPerDay() * days;
        double left = nowMgPerL * StrictMath.exp(-turnovers);
        double share = turnovers < NEGLIGIBLE ? 1 : -StrictMath.expm1(-turnovers) / turnovers;
        return Math.max(0, left + inflowMgPerLPerDay() * days * share);
    }

    /** Nitrate in the long run, mg/L; empty if it rises without end. */
    public OptionalDouble plateauMgPerL() {
        if (sources.exchangeLPerDay() > 0) {
            return OptionalDouble.of(Math.max(0, steadyMgPerL()));
        }
        if (sources.surplusGPerDay() > 0) {
            return OptionalDouble.empty();
        }
        return OptionalDouble.of(sources.surplusGPerDay() == 0 ? nowMgPerL : 0);
    }

    /** When nitrate comes to 0 because the sinks take more than there is, days; empty if it never does. */
    public OptionalDouble daysToNothing() {
        boolean sinksWin = sources.exchangeLPerDay() > 0 ? steadyMgPerL() < 0 : sources.surplusGPerDay() < 0;
        return sinksWin ? OptionalDouble.of(daysTo(0)) : OptionalDouble.empty();
    }

    /** When nitrate passes {@code mgPerL}, days, for a value on its way. */
    double daysTo(double mgPerL) {
        if (mgPerL == nowMgPerL) {
            return 0;
        }
        double straight = Math.abs((mgPerL - nowMgPerL) / slopeMgPerLPerDay());
        double steady = steadyMgPerL();
        double wayGone = (mgPerL - nowMgPerL) / (steady - nowMgPerL);
        if (!(wayGone >= NEGLIGIBLE)) {
            return straight;
        }
        // Near the plateau the way left must be taken as it is: 1 less nearly 1 would end in an infinite time.
        return (wayGone < 0.5 ? -StrictMath.log1p(-wayGone) : StrictMath.log((nowMgPerL - steady) / (mgPerL - steady)))
                / turnoverPerDay();
    }

    /** Where exchange alone would lead; negative where sinks win, not finite without exchange. */
    private double steadyMgPerL() {
        return sources.sourceMgPerL() + 1000 * sources.surplusGPerDay() / sources.exchangeLPerDay();
    }

    private double turnoverPerDay() {
        return sources.exchangeLPerDay() / volumeL;
    }

    private double slopeMgPerLPerDay() {
        return 1000 * netGPerDay() / volumeL;
    }

    private double inflowMgPerLPerDay() {
        return (1000 * sources.surplusGPerDay() + sources.exchangeLPerDay() * sources.sourceMgPerL()) / volumeL;
    }
}
