package freshet.carbonate;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Range;
import freshet.method.Seen;
import freshet.substance.Temperature;

/**
 * Ionic product of water from fresh to sea water, seawater scale, (mol/kg of solution) squared.
 *
 * <p>Millero F.J. (1995) Thermodynamics of the carbon dioxide system in the oceans. Geochim. Cosmochim. Acta 59:661-677,
 * doi:10.1016/0016-7037(94)00354-O. Salinity 0-45; at salinity 0 the constant of Harned and Owen 1958, 0-50 °C.
 */
public final class Millero1995 {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "millero-1995-water",
                    "Ionic product of water from fresh to sea water",
                    Citation.withDoi(
                            "Millero 1995",
                            "Millero F.J. (1995) Thermodynamics of the carbon dioxide system in the oceans. Geochim."
                                    + " Cosmochim. Acta 59:661-677",
                            "10.1016/0016-7037(94)00354-O"),
                    Seen.SECONDARY)
            .equation(
                    "ln Kw = a - b/T - c ln T + (d/T - e + f ln T) S^0.5 - g S; seawater scale, mol/kg of solution, T in K",
                    new Constant("a", 148.9802, "1"),
                    new Constant("b", 13847.26, "K"),
                    new Constant("c", 23.6521, "1"),
                    new Constant("d", 118.67, "K"),
                    new Constant("e", 5.977, "1"),
                    new Constant("f", 1.0495, "1"),
                    new Constant("g", 0.01615, "1"))
            .within(new Range("temperature_c", 0, 50, "Cel"), new Range("salinity", 0, 45, "1"))
            .accuracy("pKw 13.995 at 25 °C and salinity 0; moves pH only above about 9");

    private static final double[] CONSTANTS = METHOD.values();

    private Millero1995() {}

    /** ln Kw on the seawater scale at °C and practical salinity. */
    public static double lnKw(double temperatureC, double salinity) {
        return lnKw(CONSTANTS, temperatureC, salinity);
    }

    static double lnKw(double[] c, double temperatureC, double salinity) {
        double t = Temperature.kelvin(temperatureC);
        double lnT = StrictMath.log(t);
        return c[0]
                - c[1] / t
                - c[2] * lnT
                + (c[3] / t - c[4] + c[5] * lnT) * StrictMath.sqrt(salinity)
                - c[6] * salinity;
    }
}
