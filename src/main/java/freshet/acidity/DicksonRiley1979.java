package freshet.acidity;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Range;
import freshet.method.Seen;
import freshet.substance.Temperature;

/**
 * Dissociation of hydrogen fluoride in sea water, free scale, mol/kg of solution.
 *
 * <p>Dickson A.G., Riley J.P. (1979) The estimation of acid dissociation constants in seawater media from
 * potentiometric titrations with strong base. I. Mar. Chem. 7:89-99, doi:10.1016/0304-4203(79)90002-1. Coefficients
 * read in public copies.
 */
public final class DicksonRiley1979 {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "dickson-riley-1979",
                    "Dissociation constant of hydrogen fluoride in sea water",
                    Citation.withDoi(
                            "Dickson & Riley 1979",
                            "Dickson A.G., Riley J.P. (1979) The estimation of acid dissociation constants in seawater"
                                    + " media from potentiometric titrations with strong base. I. The ionic product of"
                                    + " water - Kw. Mar. Chem. 7:89-99",
                            "10.1016/0304-4203(79)90002-1"),
                    Seen.SECONDARY)
            .equation(
                    "ln KF = a/T + b + c I^0.5 + ln(1 - 0.001005 S); mol/kg of solution, free scale, T in K;"
                            + " total fluoride 0.000067/18.998 S/1.80655 mol/kg (Riley 1965)",
                    new Constant("a", 1590.2, "K"),
                    new Constant("b", -12.641, "1"),
                    new Constant("c", 1.525, "1"))
            .within(new Range("temperature_c", 0, 45, "Cel"), new Range("salinity", 0, 45, "1"))
            .accuracy("moves log10 of the seawater over the total scale by 0.010 at salinity 35, 25 °C");

    private static final double[] CONSTANTS = METHOD.values();

    private DicksonRiley1979() {}

    /**
     * Hydrogen ion on the seawater scale over that on the free scale, at least 1.
     *
     * @param temperatureC °C
     * @param salinity practical salinity
     */
    public static double seawaterPerFree(double temperatureC, double salinity) {
        return Dickson1990.totalPerFree(temperatureC, salinity)
                + SeaSalt.fluoride(salinity) / StrictMath.exp(lnConstant(CONSTANTS, temperatureC, salinity));
    }

    /** ln KF, KF in mol/kg of solution on the free scale. */
    static double lnConstant(double[] c, double temperatureC, double salinity) {
        return c[0] / Temperature.kelvin(temperatureC)
                + c[1]
                + c[2] * StrictMath.sqrt(SeaSalt.ionicStrength(salinity))
                + StrictMath.log(SeaSalt.waterShare(salinity));
    }
}
