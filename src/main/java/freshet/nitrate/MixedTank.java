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

    /** Change of the stock now, g/day. */
    public double netGPerDay() {
        return sources.surplusGPerDay() + sources.exchangeLPerDay() * (sources.sourceMgPerL() - nowMgPerL) / 1000;
    }

    /** Nitrate after {@code days}, mg/L. */
    public double mgPerLAfter(double days) {
        double turnover = turnoverPerDay();
        double effectiveDays = turnover == 0 ? days : -StrictMath.expm1(-turnover * days) / turnover;
        return Math.max(0, nowMgPerL + slopeMgPerLPerDay() * effectiveDays);
    }

    /** Nitrate in the long run, mg/L; empty if it rises without end. */
    public OptionalDouble plateauMgPerL() {
        if (sources.exchangeLPerDay() > 0) {
            double steady = sources.sourceMgPerL() + 1000 * sources.surplusGPerDay() / sources.exchangeLPerDay();
            return OptionalDouble.of(Math.max(0, steady));
        }
        if (sources.surplusGPerDay() > 0) {
            return OptionalDouble.empty();
        }
        return OptionalDouble.of(sources.surplusGPerDay() == 0 ? nowMgPerL : 0);
    }

    /** When nitrate comes to 0 because the sinks take more than there is, days; empty if it never does. */
    public OptionalDouble daysToNothing() {
        boolean sinksWin = sources.exchangeLPerDay() > 0
                ? sources.sourceMgPerL() * sources.exchangeLPerDay() + 1000 * sources.surplusGPerDay() < 0
                : sources.surplusGPerDay() < 0;
        return sinksWin ? OptionalDouble.of(daysTo(0)) : OptionalDouble.empty();
    }

    /** When nitrate passes {@code mgPerL}, days, for a value on its way. */
    double daysTo(double mgPerL) {
        double turnover = turnoverPerDay();
        double straight = (mgPerL - nowMgPerL) / slopeMgPerLPerDay();
        return turnover == 0 ? straight : -StrictMath.log1p(-turnover * straight) / turnover;
    }

    private double turnoverPerDay() {
        return sources.exchangeLPerDay() / volumeL;
    }

    private double slopeMgPerLPerDay() {
        return 1000 * netGPerDay() / volumeL;
    }
}
