package freshet.salinity;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Range;
import freshet.method.Seen;
import freshet.method.Validity;

/**
 * Density of sea water at one atmosphere, the equation of state EOS-80, kg/m3.
 *
 * <p>Millero F.J., Poisson A. (1981) International one-atmosphere equation of state of seawater. Deep-Sea Res.
 * 28A:625-629, doi:10.1016/0198-0149(81)90122-9. Salinity 0-42, -2 to 40 °C, standard error 0.0036 kg/m3. The difference
 * between the temperature scales of 1968 and 1990 moves it by less than 0.003 kg/m3 and is left aside.
 */
public final class MilleroPoisson1981 {

    private static final Range TEMPERATURE = new Range("temperature_c", -2, 40, "Cel");
    private static final Range SALINITY = new Range("salinity", 0, 42, "1");

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "millero-poisson-1981",
                    "Density of fresh, brackish and sea water at one atmosphere (EOS-80)",
                    Citation.withDoi(
                            "Millero & Poisson 1981",
                            "Millero F.J., Poisson A. (1981) International one-atmosphere equation of state of seawater."
                                    + " Deep-Sea Res. 28A:625-629",
                            "10.1016/0198-0149(81)90122-9"),
                    Seen.SECONDARY)
            .equation(
                    "density = w0 + w1 t + w2 t^2 + w3 t^3 + w4 t^4 + w5 t^5 + S (a0 + a1 t + a2 t^2 + a3 t^3 + a4 t^4)"
                            + " + S^1.5 (b0 + b1 t + b2 t^2) + c S^2; kg/m3, t in degrees Celsius",
                    new Constant("w0", 999.842594, "kg/m3"),
                    new Constant("w1", 6.793952e-2, "kg/m3/Cel"),
                    new Constant("w2", -9.095290e-3, "kg/m3/Cel2"),
                    new Constant("w3", 1.001685e-4, "kg/m3/Cel3"),
                    new Constant("w4", -1.120083e-6, "kg/m3/Cel4"),
                    new Constant("w5", 6.536332e-9, "kg/m3/Cel5"),
                    new Constant("a0", 0.824493, "kg/m3"),
                    new Constant("a1", -4.0899e-3, "kg/m3/Cel"),
                    new Constant("a2", 7.6438e-5, "kg/m3/Cel2"),
                    new Constant("a3", -8.2467e-7, "kg/m3/Cel3"),
                    new Constant("a4", 5.3875e-9, "kg/m3/Cel4"),
                    new Constant("b0", -5.72466e-3, "kg/m3"),
                    new Constant("b1", 1.0227e-4, "kg/m3/Cel"),
                    new Constant("b2", -1.6546e-6, "kg/m3/Cel2"),
                    new Constant("c", 4.8314e-4, "kg/m3"))
            .within(TEMPERATURE, SALINITY)
            .accuracy("the check values of UNESCO Technical Paper 44 are reproduced to the last printed digit");

    private static final double[] CONSTANTS = METHOD.values();

    private MilleroPoisson1981() {}

    /**
     * Density, kg/m3.
     *
     * @param temperatureC °C
     * @param salinity practical salinity
     */
    public static double kgPerM3(double temperatureC, double salinity) {
        return kgPerM3(CONSTANTS, temperatureC, salinity);
    }

    /** Whether temperature (°C) and practical salinity lie within the range that the source states. */
    public static Validity validity(double temperatureC, double salinity) {
        return Validity.of(TEMPERATURE, temperatureC).and(SALINITY, salinity);
    }

    static double kgPerM3(double[] c, double t, double s) {
        double fresh = c[0] + t * (c[1] + t * (c[2] + t * (c[3] + t * (c[4] + t * c[5]))));
        double linear = c[6] + t * (c[7] + t * (c[8] + t * (c[9] + t * c[10])));
        double bent = c[11] + t * (c[12] + t * c[13]);
        return fresh + s * linear + s * StrictMath.sqrt(s) * bent + c[14] * s * s;
    }
}
