package freshet.acidity;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Range;
import freshet.method.Seen;
import freshet.substance.Temperature;

/**
 * Dissociation of bisulfate in sea water, free scale, mol/kg of solution.
 *
 * <p>Dickson A.G. (1990) Standard potential of the reaction AgCl(s) + 1/2 H2(g) = Ag(s) + HCl(aq), and the standard
 * acidity constant of the ion HSO4- in synthetic sea water from 273.15 to 318.15 K. J. Chem. Thermodyn. 22:113-127,
 * doi:10.1016/0021-9614(90)90074-Z. Salinity 5-45, 0-45 °C. Coefficients read in public copies.
 */
public final class Dickson1990 {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "dickson-1990",
                    "Dissociation constant of bisulfate in sea water",
                    Citation.withDoi(
                            "Dickson 1990",
                            "Dickson A.G. (1990) Standard potential of the reaction AgCl(s) + 1/2 H2(g) = Ag(s) + HCl(aq),"
                                    + " and the standard acidity constant of the ion HSO4- in synthetic sea water from"
                                    + " 273.15 to 318.15 K. J. Chem. Thermodyn. 22:113-127",
                            "10.1016/0021-9614(90)90074-Z"),
                    Seen.SECONDARY)
            .equation(
                    "ln KS = a/T + b + c ln T + (d/T + e + f ln T) I^0.5 + (g/T + h + i ln T) I + j/T I^1.5 + k/T I^2"
                            + " + ln(1 - 0.001005 S); mol/kg of solution, free scale, T in K; I = 19.924 S/(1000 - 1.005 S);"
                            + " total sulfate 0.14/96.062 S/1.80655 mol/kg (Morris and Riley 1966)",
                    new Constant("a", -4276.1, "K"),
                    new Constant("b", 141.328, "1"),
                    new Constant("c", -23.093, "1"),
                    new Constant("d", -13856, "K"),
                    new Constant("e", 324.57, "1"),
                    new Constant("f", -47.986, "1"),
                    new Constant("g", 35474, "K"),
                    new Constant("h", -771.54, "1"),
                    new Constant("i", 114.723, "1"),
                    new Constant("j", -2698, "K"),
                    new Constant("k", 1776, "K"))
            .within(new Range("temperature_c", 0, 45, "Cel"), new Range("salinity", 5, 45, "1"))
            .accuracy(
                    "ln KS -2.30 at salinity 35, 25 °C in Dickson, Sabine and Christian 2007: reproduced to the print");

    private static final double[] CONSTANTS = METHOD.values();

    private Dickson1990() {}

    /**
     * Hydrogen ion on the total scale over that on the free scale, at least 1.
     *
     * @param temperatureC °C
     * @param salinity practical salinity
     */
    public static double totalPerFree(double temperatureC, double salinity) {
        return 1 + SeaSalt.sulfate(salinity) / StrictMath.exp(lnConstant(CONSTANTS, temperatureC, salinity));
    }

    /** ln KS, KS in mol/kg of solution on the free scale. */
    static double lnConstant(double[] c, double temperatureC, double salinity) {
        double t = Temperature.kelvin(temperatureC);
        double lnT = StrictMath.log(t);
        double i = SeaSalt.ionicStrength(salinity);
        double rootI = StrictMath.sqrt(i);
        return c[0] / t
                + c[1]
                + c[2] * lnT
                + (c[3] / t + c[4] + c[5] * lnT) * rootI
                + (c[6] / t + c[7] + c[8] * lnT) * i
                + c[9] / t * i * rootI
                + c[10] / t * i * i
                + StrictMath.log(SeaSalt.waterShare(salinity));
    }
}
