package freshet.carbonate;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Range;
import freshet.method.Seen;
import freshet.substance.Temperature;

/**
 * Carbonic acid and calcite in fresh water, activities.
 *
 * <p>Plummer L.N., Busenberg E. (1982) The solubilities of calcite, aragonite and vaterite in CO2-H2O solutions between
 * 0 and 90 °C, and an evaluation of the aqueous model for the system CaCO3-CO2-H2O. Geochim. Cosmochim. Acta
 * 46:1011-1040, doi:10.1016/0016-7037(82)90056-4; all coefficients stand in its abstract. Erratum: the abstract prints
 * the third term of calcite as a factor of T; it is 2839.319/T.
 */
public final class PlummerBusenberg1982 {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "plummer-busenberg-1982",
                    "Carbonic acid and calcite in fresh water",
                    Citation.withDoi(
                            "Plummer & Busenberg 1982",
                            "Plummer L.N., Busenberg E. (1982) The solubilities of calcite, aragonite and vaterite in CO2-H2O"
                                    + " solutions between 0 and 90 °C, and an evaluation of the aqueous model for the system"
                                    + " CaCO3-CO2-H2O. Geochim. Cosmochim. Acta 46:1011-1040",
                            "10.1016/0016-7037(82)90056-4"),
                    Seen.PRINTED)
            .equation(
                    "log10 K = a + b T + c/T + d log10 T + e/T^2; activities, T in K; K1, K2, then calcite",
                    new Constant("a1", -356.3094, "1"),
                    new Constant("b1", -0.06091964, "K-1"),
                    new Constant("c1", 21834.37, "K"),
                    new Constant("d1", 126.8339, "1"),
                    new Constant("e1", -1684915, "K2"),
                    new Constant("a2", -107.8871, "1"),
                    new Constant("b2", -0.03252849, "K-1"),
                    new Constant("c2", 5151.79, "K"),
                    new Constant("d2", 38.92561, "1"),
                    new Constant("e2", -563713.9, "K2"),
                    new Constant("a_calcite", -171.9065, "1"),
                    new Constant("b_calcite", -0.077993, "K-1"),
                    new Constant("c_calcite", 2839.319, "K"),
                    new Constant("d_calcite", 71.595, "1"),
                    new Constant("e_calcite", 0, "K2"))
            .within(new Range("temperature_c", 0, 90, "Cel"))
            .accuracy("calcite ±0.020 in log10 at 25 °C as stated by the source")
            .errata("a copy of the abstract prints 2839.319 T for 2839.319/T");

    private static final double[] CONSTANTS = METHOD.values();

    private PlummerBusenberg1982() {}

    /** log10 K1 at °C. */
    public static double logK1(double temperatureC) {
        return logK(CONSTANTS, 0, temperatureC);
    }

    /** log10 K2 at °C. */
    public static double logK2(double temperatureC) {
        return logK(CONSTANTS, 5, temperatureC);
    }

    /** log10 of the solubility product of calcite at °C. */
    public static double logCalcite(double temperatureC) {
        return logK(CONSTANTS, 10, temperatureC);
    }

    static double logK(double[] c, int from, double temperatureC) {
        double t = Temperature.kelvin(temperatureC);
        return c[from] + c[from + 1] * t + c[from + 2] / t + c[from + 3] * StrictMath.log10(t) + c[from + 4] / (t * t);
    }
}
