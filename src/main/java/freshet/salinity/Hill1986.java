package freshet.salinity;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Range;
import freshet.method.Seen;

/**
 * Continuation of {@link PracticalSalinity1978} to water of almost no salt.
 *
 * <p>Hill K.D., Dauphinee T.M., Woods D.J. (1986) The extension of the Practical Salinity Scale 1978 to low salinities.
 * IEEE J. Ocean. Eng. 11:109-112, doi:10.1109/JOE.1986.1145154. Below salinity 2; without conductivity it gives exactly 0.
 * By itself it leaves a jump of up to 0.0004 at 2, which is scaled away here.
 */
public final class Hill1986 {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "hill-1986",
                    "Practical salinity from conductivity below 2",
                    Citation.withDoi(
                            "Hill et al. 1986",
                            "Hill K.D., Dauphinee T.M., Woods D.J. (1986) The extension of the Practical Salinity Scale 1978"
                                    + " to low salinities. IEEE J. Ocean. Eng. 11:109-112",
                            "10.1109/JOE.1986.1145154"),
                    Seen.SECONDARY)
            .equation(
                    "S - a0/(1 + l x + x^2) - b0 f/(1 + y^0.5 + y + y^1.5), x = m r, y = n r; S, r, a0, b0 and f of"
                            + " practical-salinity-1978; used below S = j and multiplied by j over its own value at S = j",
                    new Constant("j", 2, "1", "where the two meet"),
                    new Constant("l", 1.5, "1"),
                    new Constant("m", 400, "1"),
                    new Constant("n", 100, "1"))
            .within(new Range("salinity", 0, 2, "1"))
            .accuracy(
                    "two values of a public library are reproduced to 1e-8; the scaling moves the result by at most 0.0002 of"
                            + " itself from -2 to 35 °C");

    private final double[] c;

    Hill1986(double[] constants) {
        c = constants;
    }

    /** The practical salinity at which it meets the scale. */
    double joint() {
        return c[0];
    }

    /**
     * Practical salinity, not yet scaled to meet the scale.
     *
     * @param salinity what the scale itself gives
     * @param ratio ratio of conductivities at the same temperature
     * @param fixed the part of the scale that stays without salt at 15 °C, a0
     * @param warm what temperature adds to that part, b0 f
     */
    double continued(double salinity, double ratio, double fixed, double warm) {
        double x = c[2] * ratio;
        double y = c[3] * ratio;
        double root = StrictMath.sqrt(y);
        return salinity - fixed / (1 + c[1] * x + x * x) - warm / (1 + root + y + y * root);
    }
}
