package freshet.carbonate;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Range;
import freshet.method.Seen;
import freshet.substance.Temperature;

/**
 * Activity coefficients of ions in dilute water.
 *
 * <p>Davies C.W. (1962) Ion Association, Butterworths, London; the factor 0.3 of 1962, not the 0.2 of 1938. Good to an
 * ionic strength of 0.1 mol/kg. The constant A after the dielectric constant of water in the form of Standard Methods
 * 2330, from memory.
 */
public final class Davies1962 {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "davies-1962",
                    "Activity coefficients of ions in dilute water",
                    Citation.withoutDoi("Davies 1962", "Davies C.W. (1962) Ion Association. Butterworths, London"),
                    Seen.SECONDARY)
            .equation(
                    "log10 g = -A z^2 (I^0.5/(1 + I^0.5) - b I); A = c (e T)^-1.5; e = d/(T + f) - h; T in K, I in mol/kg",
                    new Constant("b", 0.3, "1"),
                    new Constant("c", 1.82e6, "1", "memory"),
                    new Constant("d", 60954, "K", "memory"),
                    new Constant("f", 116, "K", "memory"),
                    new Constant("h", 68.937, "1", "memory"))
            .within(new Range("ionic_strength_mol_per_kg", 0, 0.1, "mol/kg"))
            .accuracy("A 0.5108 at 25 °C; tolerable to 0.5 mol/kg for ions of one charge, not for sea water")
            .errata("the form of 1938 has 0.2 for 0.3");

    private static final double[] CONSTANTS = METHOD.values();

    private Davies1962() {}

    /**
     * log10 of the activity coefficient of an ion.
     *
     * @param charge number of charges
     * @param temperatureC °C
     * @param ionicStrength mol/kg of water
     */
    public static double logGamma(int charge, double temperatureC, double ionicStrength) {
        return logGamma(CONSTANTS, charge, temperatureC, ionicStrength);
    }

    static double logGamma(double[] c, int charge, double temperatureC, double ionicStrength) {
        double t = Temperature.kelvin(temperatureC);
        double dielectric = c[2] / (t + c[3]) - c[4];
        double a = c[1] * StrictMath.pow(dielectric * t, -1.5);
        double root = StrictMath.sqrt(ionicStrength);
        return -a * charge * charge * (root / (1 + root) - c[0] * ionicStrength);
    }
}
