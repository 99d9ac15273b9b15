package freshet.salinity;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Range;
import freshet.method.Seen;
import freshet.method.Validity;
import org.hipparchus.analysis.solvers.BracketingNthOrderBrentSolver;

/**
 * Practical salinity from conductivity at the surface, PSS-78, with the extension to low salinity.
 *
 * <p>UNESCO (1981) Background papers and supporting data on the Practical Salinity Scale 1978. UNESCO Tech. Pap. Mar. Sci.
 * 37; Fofonoff N.P., Millard R.C. (1983) Algorithms for computation of fundamental properties of seawater. UNESCO Tech.
 * Pap. Mar. Sci. 44. Salinity 2-42, -2 to 35 °C; below 2 after {@link Hill1986}. Temperature on the scale of 1968.
 */
public final class PracticalSalinity1978 {

    private static final Range TEMPERATURE = new Range("temperature_c", -2, 35, "Cel");
    private static final Range SALINITY = new Range("salinity", 0, 42, "1");

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "practical-salinity-1978",
                    "Practical salinity from conductivity (PSS-78), extended to low salinity",
                    Citation.withDoi(
                            "PSS-78; Hill et al. 1986",
                            "Fofonoff N.P., Millard R.C. (1983) Algorithms for computation of fundamental properties of"
                                    + " seawater. UNESCO Tech. Pap. Mar. Sci. 44; below salinity 2: Hill K.D., Dauphinee T.M.,"
                                    + " Woods D.J. (1986) IEEE J. Ocean. Eng. 11:109-112",
                            "10.1109/JOE.1986.1145154"),
                    Seen.SECONDARY)
            .equation(
                    "r = C/C(35, 15) / sum(c_i t^i); S = sum(a_i r^(i/2)) + f sum(b_i r^(i/2)), f = (t - t0)/(1 + k (t - t0));"
                            + " t = q t(1990); below 2 continued by hill-1986; density beside it by millero-poisson-1981",
                    new Constant("C(35, 15)", 42.914, "mS/cm"),
                    new Constant("c0", 0.6766097, "1"),
                    new Constant("c1", 2.00564e-2, "Cel-1"),
                    new Constant("c2", 1.104259e-4, "Cel-2"),
                    new Constant("c3", -6.9698e-7, "Cel-3"),
                    new Constant("c4", 1.0031e-9, "Cel-4"),
                    new Constant("a0", 0.0080, "1"),
                    new Constant("a1", -0.1692, "1"),
                    new Constant("a2", 25.3851, "1"),
                    new Constant("a3", 14.0941, "1"),
                    new Constant("a4", -7.0261, "1"),
                    new Constant("a5", 2.7081, "1"),
                    new Constant("b0", 0.0005, "1"),
                    new Constant("b1", -0.0056, "1"),
                    new Constant("b2", -0.0066, "1"),
                    new Constant("b3", -0.0375, "1"),
                    new Constant("b4", 0.0636, "1"),
                    new Constant("b5", -0.0144, "1"),
                    new Constant("k", 0.0162, "Cel-1"),
                    new Constant("t0", 15, "Cel"),
                    new Constant("q", 1.00024, "1", "the scale of 1968 over that of 1990"))
            .within(TEMPERATURE, SALINITY)
            .accuracy(
                    "the check values of UNESCO Technical Paper 44 are reproduced to the print; for sea salt: water whose"
                            + " salt is another gets an index only")
            .errata("two copies print 29.995347 for the check value 27.995347")
            .uses(Hill1986.METHOD, MilleroPoisson1981.METHOD);

    private static final int ROOTS = 6;

    private final double[] c;
    private final Hill1986 low;

    PracticalSalinity1978(double[] constants, Hill1986 low) {
        c = constants;
        this.low = low;
    }

    /** With the published constants. */
    public static PracticalSalinity1978 published() {
        return new PracticalSalinity1978(METHOD.values(), new Hill1986(Hill1986.METHOD.values()));
    }

    /**
     * Practical salinity, never negative; beyond 42 the scale is drawn out.
     *
     * @param conductivityMsPerCm conductivity at {@code temperatureC}, mS/cm, not compensated
     * @param temperatureC °C
     */
    public double salinity(double conductivityMsPerCm, double temperatureC) {
        double t = temperatureC * c[20];
        double temperatureRatio = c[1] + t * (c[2] + t * (c[3] + t * (c[4] + t * c[5])));
        return ofRatio(conductivityMsPerCm / c[0] / temperatureRatio, t);
    }

    /** Whether temperature in °C and the salinity found lie within the ranges of the scale. */
    public static Validity validity(double temperatureC, double salinity) {
        return Validity.of(TEMPERATURE, temperatureC).and(SALINITY, salinity);
    }

    /** From the ratio of conductivities at the same temperature, °C of 1968, and at the surface. */
    double ofRatio(double ratio, double t) {
        double salinity = scale(ratio, t);
        if (salinity >= low.joint()) {
            return salinity;
        }
        double atJoint = continued(low.joint(), ratioAtJoint(t), t);
        return Math.max(0, continued(salinity, ratio, t) * low.joint() / atJoint);
    }

    private double scale(double ratio, double t) {
        double root = StrictMath.sqrt(ratio);
        double a = 0;
        double b = 0;
        for (int i = ROOTS - 1; i >= 0; i--) {
            a = a * root + c[6 + i];
            b = b * root + c[6 + ROOTS + i];
        }
        return a + warmth(t) * b;
    }

    private double continued(double salinity, double ratio, double t) {
        return low.continued(salinity, ratio, c[6], c[12] * warmth(t));
    }

    private double warmth(double t) {
        return (t - c[19]) / (1 + c[18] * (t - c[19]));
    }

    /** The ratio at which the scale gives the salinity where both meet. */
    private double ratioAtJoint(double t) {
        return new BracketingNthOrderBrentSolver(1e-15, 1e-15, 0, 5)
                .solve(100, ratio -> scale(ratio, t) - low.joint(), 0.02, 0.15);
    }
}
