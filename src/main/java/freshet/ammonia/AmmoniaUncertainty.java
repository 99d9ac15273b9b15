package freshet.ammonia;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Seen;

/**
 * How uncertain un-ionized ammonia is, to first order in its logarithm: JCGM 100:2008, inputs independent.
 *
 * <p>{@code u^2 = r^2 + k^2 (u(pH)^2 + u(pKa)^2 + (dpKa/dT u(T))^2)}, {@code k = ln10 (1 - f)}, r the relative standard
 * uncertainty of total ammonia, f the un-ionized share.
 */
public final class AmmoniaUncertainty {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "ammonia-uncertainty",
                    "Standard uncertainty of un-ionized ammonia and bounds of 95 %",
                    Citation.withoutDoi(
                            "JCGM 100:2008",
                            "JCGM 100:2008 Evaluation of measurement data - Guide to the expression of uncertainty in"
                                    + " measurement; checked against the Monte Carlo method of JCGM 101:2008"),
                    Seen.MEMORY)
            .equation(
                    "u^2 = r^2 + k^2 (u(pH)^2 + u(pKa)^2 + (dpKa/dT u(T))^2), k = ln10 (1 - f); 95 %: NH3 exp(-w(1 -"
                            + " z r)) and NH3 exp(w(1 + z r)), w(x)^2 = z^2 (u^2 - r^2) + (ln x)^2; inputs independent",
                    new Constant("z", 1.96, "1", "95 %, two-sided"),
                    new Constant("u(pKa) fresh", 0.005, "1", "salinity to 0.5, without the neglected ionic strength"),
                    new Constant("u(pKa) saline", 0.022, "1", "5 % of K as Clegg and Whitfield 1995 state"))
            .accuracy(
                    "bounds within 2 % of those by Monte Carlo (JCGM 101, normal errors of 0.1 in pH, 0.5 °C and 10 % of total"
                            + " ammonia) over the ranges of the alarm profiles");

    private static final double Z = METHOD.values()[0];
    private static final double FRESH_PKA = METHOD.values()[1];
    private static final double SALINE_PKA = METHOD.values()[2];
    private static final double LN_10 = StrictMath.log(10);
    private static final double STEP_C = 0.01;

    private AmmoniaUncertainty() {}

    /**
     * Standard uncertainties of what is measured.
     *
     * @param tan of total ammonia, relative
     * @param ph of pH
     * @param temperatureC of temperature, °C
     */
    public record Sensors(double tan, double ph, double temperatureC) {}

    /** Relative standard uncertainty of un-ionized ammonia, or of the limit of total ammonia against a measured one. */
    public static double relative(Water water, AmmoniaDissociation dissociation, Sensors sensors) {
        double fraction = dissociation.fraction(water.ph(), water.temperatureC(), water.salinity(), water.scale());
        double k = LN_10 * (1 - fraction);
        double constant = pKa(water.salinity());
        double drift = slope(water, dissociation) * sensors.temperatureC();
        return StrictMath.sqrt(sensors.tan() * sensors.tan()
                + k * k * (sensors.ph() * sensors.ph() + constant * constant + drift * drift));
    }

    /** Standard uncertainty of the dissociation constant at a practical salinity. */
    public static double pKa(double salinity) {
        return salinity > AmmoniaMethod.FRESH_SALINITY ? SALINE_PKA : FRESH_PKA;
    }

    /**
     * Bounds of 95 %, as factors of un-ionized ammonia. The fraction is taken in its logarithm, total ammonia as it is, so
     * that near the limit of detection the lower bound is 0 and the upper one no more than what was measured allows.
     *
     * @param relative relative standard uncertainty of all
     * @param tan that of total ammonia, a part of it
     */
    public static Bounds bounds(double relative, double tan) {
        double fraction = Z * Z * (relative * relative - tan * tan);
        double least = Math.max(0, 1 - Z * tan);
        return new Bounds(
                least == 0 ? 0 : StrictMath.exp(-widened(fraction, least)),
                StrictMath.exp(widened(fraction, 1 + Z * tan)));
    }

    private static double widened(double square, double factor) {
        double logarithm = StrictMath.log(factor);
        return StrictMath.sqrt(Math.max(0, square) + logarithm * logarithm);
    }

    /**
     * An interval of 95 %.
     *
     * @param lower lower bound over the value
     * @param upper upper bound over the value
     */
    public record Bounds(double lower, double upper) {}

    private static double slope(Water water, AmmoniaDissociation dissociation) {
        double above = dissociation.pKa(water.temperatureC() + STEP_C, water.salinity(), water.scale());
        double below = dissociation.pKa(water.temperatureC() - STEP_C, water.salinity(), water.scale());
        return (above - below) / (2 * STEP_C);
    }
}
