package freshet.carbonate;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Range;
import freshet.method.Seen;
import freshet.substance.Temperature;

/**
 * Dissociation of boric acid in sea water, total scale, mol/kg of solution.
 *
 * <p>Dickson A.G. (1990) Thermodynamics of the dissociation of boric acid in synthetic seawater from 273.15 to 318.15 K.
 * Deep-Sea Res. 37:755-766, doi:10.1016/0198-0149(90)90004-F. Salinity 5-45, 0-45 °C. Total boron after Uppström 1974,
 * in proportion to salinity; salt mixed without boron holds none.
 */
public final class Dickson1990Borate {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "dickson-1990-borate",
                    "Dissociation constant of boric acid in sea water",
                    Citation.withDoi(
                            "Dickson 1990",
                            "Dickson A.G. (1990) Thermodynamics of the dissociation of boric acid in synthetic seawater from"
                                    + " 273.15 to 318.15 K. Deep-Sea Res. 37:755-766",
                            "10.1016/0198-0149(90)90004-F"),
                    Seen.SECONDARY)
            .equation(
                    "ln KB = (a + b S^0.5 + c S + d S^1.5 + e S^2)/T + f + g S^0.5 + h S + (i + j S^0.5 + k S) ln T"
                            + " + l S^0.5 T; total scale, mol/kg of solution, T in K; total boron 0.0004157 S/35 mol/kg"
                            + " (Uppstroem 1974)",
                    new Constant("a", -8966.90, "K"),
                    new Constant("b", -2890.53, "K"),
                    new Constant("c", -77.942, "K"),
                    new Constant("d", 1.728, "K"),
                    new Constant("e", -0.0996, "K"),
                    new Constant("f", 148.0248, "1"),
                    new Constant("g", 137.1942, "1"),
                    new Constant("h", 1.62142, "1"),
                    new Constant("i", -24.4344, "1"),
                    new Constant("j", -25.085, "1"),
                    new Constant("k", -0.2474, "1"),
                    new Constant("l", 0.053105, "K-1"))
            .within(new Range("temperature_c", 0, 45, "Cel"), new Range("salinity", 5, 45, "1"))
            .accuracy(
                    "ln KB -19.7964 at salinity 35, 25 °C in Dickson, Sabine and Christian 2007: reproduced to the print");

    private static final double[] CONSTANTS = METHOD.values();

    private Dickson1990Borate() {}

    /** ln KB on the total scale at °C and practical salinity. */
    public static double lnKb(double temperatureC, double salinity) {
        return lnKb(CONSTANTS, temperatureC, salinity);
    }

    /** Total boron, mol/kg of solution, at practical salinity {@code salinity}. */
    public static double boron(double salinity) {
        return 0.0004157 * salinity / 35;
    }

    static double lnKb(double[] c, double temperatureC, double s) {
        double t = Temperature.kelvin(temperatureC);
        double root = StrictMath.sqrt(s);
        return (c[0] + c[1] * root + c[2] * s + c[3] * s * root + c[4] * s * s) / t
                + c[5]
                + c[6] * root
                + c[7] * s
                + (c[8] + c[9] * root + c[10] * s) * StrictMath.log(t)
                + c[11] * root * t;
    }
}
