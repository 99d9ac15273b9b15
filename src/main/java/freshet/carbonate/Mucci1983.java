package freshet.carbonate;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Range;
import freshet.method.Seen;
import freshet.substance.Temperature;

/**
 * Solubility product of calcite in sea water, (mol/kg of solution) squared; at salinity 0 that of fresh water.
 *
 * <p>Mucci A. (1983) The solubility of calcite and aragonite in seawater at various salinities, temperatures, and one
 * atmosphere total pressure. Am. J. Sci. 283:780-799, doi:10.2475/ajs.283.7.780. Salinity 5-44, 5-40 °C.
 */
public final class Mucci1983 {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "mucci-1983",
                    "Solubility of calcite in brackish and sea water",
                    Citation.withDoi(
                            "Mucci 1983",
                            "Mucci A. (1983) The solubility of calcite and aragonite in seawater at various salinities,"
                                    + " temperatures, and one atmosphere total pressure. Am. J. Sci. 283:780-799",
                            "10.2475/ajs.283.7.780"),
                    Seen.SECONDARY)
            .equation(
                    "log10 K = log10 K(plummer-busenberg-1982) + (a + b T + c/T) S^0.5 + d S + e S^1.5; (mol/kg of"
                            + " solution)^2, T in K; saturation index = log10([Ca][CO3]/K)",
                    new Constant("a", -0.77712, "1"),
                    new Constant("b", 0.0028426, "K-1"),
                    new Constant("c", 178.34, "K"),
                    new Constant("d", -0.07711, "1"),
                    new Constant("e", 0.0041249, "1"))
            .within(new Range("temperature_c", 5, 40, "Cel"), new Range("salinity", 5, 44, "1"))
            .accuracy(
                    "log10 K -6.3693 at salinity 35, 25 °C (Zeebe and Wolf-Gladrow 2001): reproduced to the print; between"
                            + " salinity 0 and 5 the equation is interpolated by its own form")
            .uses(PlummerBusenberg1982.METHOD);

    private static final double[] CONSTANTS = METHOD.values();

    private Mucci1983() {}

    /** log10 of the solubility product at °C and practical salinity. */
    public static double logCalcite(double temperatureC, double salinity) {
        return logCalcite(CONSTANTS, temperatureC, salinity);
    }

    static double logCalcite(double[] c, double temperatureC, double s) {
        double t = Temperature.kelvin(temperatureC);
        double root = StrictMath.sqrt(s);
        return PlummerBusenberg1982.logCalcite(temperatureC)
                + (c[0] + c[1] * t + c[2] / t) * root
                + c[3] * s
                + c[4] * s * root;
    }
}
