package freshet.oxygen;

/**
 * Other published formulas of what this topic computes, to hold against its own. Coefficients as public copies print them.
 * Each is itself held to values of its source by {@link OxygenWitnessTest}.
 */
final class OxygenWitnesses {

    static final double MICROMOL_PER_ML = 44.6596;
    static final double G_PER_MICROMOL = 31.998e-6;
    private static final double MG_PER_ML = 1.42903;
    /** Oxygen in dry air, by volume. */
    private static final double SHARE = 0.2094;

    private OxygenWitnesses() {}

    /** Garcia and Gordon 1992, umol/kg at 1 atm, °C of 1968. */
    static double garciaGordonPerKg(double t, double salinity) {
        double x = Math.log((298.15 - t) / (273.15 + t));
        double fresh = polynomial(x, 5.80871, 3.20291, 4.17887, 5.10006, -9.86643e-2, 3.80369);
        double salt = polynomial(x, -7.01577e-3, -7.70028e-3, -1.13864e-2, -9.51519e-3);
        return Math.exp(fresh + salinity * salt - 2.75915e-7 * salinity * salinity);
    }

    /** Garcia and Gordon 1992, mL of gas at standard temperature and pressure per L at 1 atm, °C of 1968. */
    static double garciaGordonMlPerL(double t, double salinity) {
        double x = Math.log((298.15 - t) / (273.15 + t));
        double fresh = polynomial(x, 2.00907, 3.22014, 4.05010, 4.94457, -2.56847e-1, 3.88767);
        double salt = polynomial(x, -6.24523e-3, -7.37614e-3, -1.03410e-2, -8.17083e-3);
        return Math.exp(fresh + salinity * salt - 4.88682e-7 * salinity * salinity);
    }

    /** Weiss 1970, Bunsen coefficient of oxygen. */
    static double weissBunsen(double t, double salinity) {
        double h = (t + 273.15) / 100;
        return Math.exp(-58.3877
                + 85.8079 / h
                + 23.8439 * Math.log(h)
                + salinity * polynomial(h, -0.034892, 0.015568, -0.0019387));
    }

    /** Weiss and Price 1980, vapour pressure of water, atm. */
    static double weissPriceVapour(double t, double salinity) {
        double h = (t + 273.15) / 100;
        return Math.exp(24.4543 - 67.4509 / h - 4.8489 * Math.log(h) - 0.000544 * salinity);
    }

    /** Weiss 1970 as mg/L in air saturated with vapour, 1 atm. */
    static double weissMgPerL(double t, double salinity) {
        return 1000 * MG_PER_ML * weissBunsen(t, salinity) * SHARE * (1 - weissPriceVapour(t, salinity));
    }

    /** FAO Irrigation and Drainage Paper 56, equation 7, kPa. */
    static double fao56(double altitudeM) {
        return 101.3 * Math.pow((293 - 0.0065 * altitudeM) / 293, 5.26);
    }

    private static double polynomial(double x, double... coefficients) {
        double sum = 0;
        for (int i = coefficients.length - 1; i >= 0; i--) {
            sum = sum * x + coefficients[i];
        }
        return sum;
    }
}
