package freshet.carbonate;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Range;
import freshet.method.Seen;
import freshet.substance.Temperature;

/**
 * First and second dissociation constant of carbonic acid from fresh to sea water, seawater scale, mol/kg of solution.
 *
 * <p>Waters J., Millero F.J., Woosley R.J. (2014) Corrigendum to "The free proton concentration scale for seawater pH".
 * Mar. Chem. 165:66-67, doi:10.1016/j.marchem.2014.07.004. Salinity 1-50, 0-50 °C; at salinity 0 the equation is the
 * fresh-water constant of Harned and Davis 1943 and of Harned and Scholes 1941 in the form of Millero 1979. Only the
 * coefficients of the seawater scale are used; those printed for other scales do not agree with them.
 */
public final class WatersMilleroWoosley2014 {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "waters-millero-woosley-2014",
                    "Dissociation constants of carbonic acid from fresh to sea water",
                    Citation.withDoi(
                            "Waters, Millero & Woosley 2014",
                            "Waters J., Millero F.J., Woosley R.J. (2014) Corrigendum to \"The free proton concentration"
                                    + " scale for seawater pH\" [Mar. Chem. 149 (2013) 8-22]. Mar. Chem. 165:66-67",
                            "10.1016/j.marchem.2014.07.004"),
                    Seen.SECONDARY)
            .equation(
                    "pK = p + q/T + r ln T + a0 S^0.5 + a1 S + a2 S^2 + (b0 S^0.5 + b1 S)/T + c0 S^0.5 ln T;"
                            + " seawater scale, mol/kg of solution, T in K; first for pK1, then for pK2",
                    new Constant("p1", -126.34048, "1"),
                    new Constant("q1", 6320.813, "K"),
                    new Constant("r1", 19.568224, "1"),
                    new Constant("a0_1", 13.409160, "1"),
                    new Constant("a1_1", 0.031646, "1"),
                    new Constant("a2_1", -5.1895e-5, "1"),
                    new Constant("b0_1", -531.3642, "K"),
                    new Constant("b1_1", -5.713, "K"),
                    new Constant("c0_1", -2.0669166, "1"),
                    new Constant("p2", -90.18333, "1"),
                    new Constant("q2", 5143.692, "K"),
                    new Constant("r2", 14.613358, "1"),
                    new Constant("a0_2", 21.225890, "1"),
                    new Constant("a1_2", 0.12450870, "1"),
                    new Constant("a2_2", -3.7243e-4, "1"),
                    new Constant("b0_2", -779.3444, "K"),
                    new Constant("b1_2", -19.91739, "K"),
                    new Constant("c0_2", -3.3534679, "1"))
            .within(new Range("temperature_c", 0, 50, "Cel"), new Range("salinity", 0, 50, "1"))
            .accuracy(
                    "agrees with the independent fresh-water constants of plummer-busenberg-1982 within 0.002 in pK at"
                            + " salinity 0; with Millero et al. 2006 (standard deviation 0.005 in pK1, 0.011 in pK2) within 0.006")
            .errata(
                    "the coefficient sets printed with Millero 2010 for the total and the free scale contradict its set for"
                            + " the seawater scale by up to 0.07 in pK");

    private static final double[] CONSTANTS = METHOD.values();
    private static final int SECOND = CONSTANTS.length / 2;

    private WatersMilleroWoosley2014() {}

    /** pK1 on the seawater scale at °C and practical salinity. */
    public static double pK1(double temperatureC, double salinity) {
        return pK(CONSTANTS, 0, temperatureC, salinity);
    }

    /** pK2 on the seawater scale at °C and practical salinity. */
    public static double pK2(double temperatureC, double salinity) {
        return pK(CONSTANTS, SECOND, temperatureC, salinity);
    }

    static double pK(double[] constants, int from, double temperatureC, double salinity) {
        double t = Temperature.kelvin(temperatureC);
        double lnT = StrictMath.log(t);
        double root = StrictMath.sqrt(salinity);
        return constants[from]
                + constants[from + 1] / t
                + constants[from + 2] * lnT
                + constants[from + 3] * root
                + constants[from + 4] * salinity
                + constants[from + 5] * salinity * salinity
                + (constants[from + 6] * root + constants[from + 7] * salinity) / t
                + constants[from + 8] * root * lnT;
    }
}
