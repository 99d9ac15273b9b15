package freshet.carbonate;

/**
 * Other published formulas of what this topic computes, to hold against its own; T in K. Each is itself held to values of
 * its source by {@link CarbonateWitnessTest}.
 */
final class CarbonateWitnesses {

    private static final double[] PK1_2006 = {13.4191, 0.0331, -5.33e-5, -530.123, -6.103, -2.06950};
    private static final double[] PK2_2006 = {21.0894, 0.1248, -3.687e-4, -772.483, -20.051, -3.3336};
    private static final double[] PK1_2010 = {13.4038, 0.03206, -5.242e-5, -530.659, -5.8210, -2.0664};
    private static final double[] PK2_2010 = {21.3728, 0.1218, -3.688e-4, -788.289, -19.189, -3.374};

    private CarbonateWitnesses() {}

    /** Lueker, Dickson and Keeling 2000, total scale. */
    static double luekerPk1(double t, double s) {
        double k = kelvin(t);
        return 3633.86 / k - 61.2172 + 9.67770 * Math.log(k) - 0.011555 * s + 0.0001152 * s * s;
    }

    /** Lueker, Dickson and Keeling 2000, total scale. */
    static double luekerPk2(double t, double s) {
        double k = kelvin(t);
        return 471.78 / k + 25.9290 - 3.16967 * Math.log(k) - 0.01781 * s + 0.0001122 * s * s;
    }

    /** Millero et al. 2006, seawater scale. */
    static double millero2006Pk1(double t, double s) {
        return fresh1(t) + salt(PK1_2006, t, s);
    }

    /** Millero et al. 2006, seawater scale. */
    static double millero2006Pk2(double t, double s) {
        return fresh2(t) + salt(PK2_2006, t, s);
    }

    /** Millero 2010, seawater scale. */
    static double millero2010Pk1(double t, double s) {
        return fresh1(t) + salt(PK1_2010, t, s);
    }

    /** Millero 2010, seawater scale. */
    static double millero2010Pk2(double t, double s) {
        return fresh2(t) + salt(PK2_2010, t, s);
    }

    /** Plummer and Busenberg 1982 with the salt of Mucci 1983: log10 of the solubility product of aragonite. */
    static double logAragonite(double t, double s) {
        double k = kelvin(t);
        double fresh = -(s == 0 ? 171.9773 : 171.945) - 0.077993 * k + 2903.293 / k + 71.595 * Math.log10(k);
        return fresh
                + (-0.068393 + 0.0017276 * k + 88.135 / k) * Math.sqrt(s)
                - 0.10018 * s
                + 0.0059415 * Math.pow(s, 1.5);
    }

    /** Lee et al. 2010, total boron, mol/kg. */
    static double leeBoron(double s) {
        return 0.0004326 * s / 35;
    }

    private static double fresh1(double t) {
        double k = kelvin(t);
        return -126.34048 + 6320.813 / k + 19.568224 * Math.log(k);
    }

    private static double fresh2(double t) {
        double k = kelvin(t);
        return -90.18333 + 5143.692 / k + 14.613358 * Math.log(k);
    }

    private static double salt(double[] c, double t, double s) {
        double k = kelvin(t);
        double root = Math.sqrt(s);
        return c[0] * root + c[1] * s + c[2] * s * s + (c[3] * root + c[4] * s) / k + c[5] * root * Math.log(k);
    }

    private static double kelvin(double t) {
        return t + 273.15;
    }
}
