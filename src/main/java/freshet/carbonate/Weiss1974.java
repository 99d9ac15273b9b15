package freshet.carbonate;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Range;
import freshet.method.Seen;
import freshet.substance.Temperature;

/**
 * Carbon dioxide that water holds in balance with a gas, mol/kg of solution for each atm of its partial pressure.
 *
 * <p>Weiss R.F. (1974) Carbon dioxide in water and seawater: the solubility of a non-ideal gas. Mar. Chem. 2:203-215,
 * doi:10.1016/0304-4203(74)90015-2. -1 to 40 °C, salinity 0-40, 0.2 to 0.3 %; the gas at 1 atm in all.
 */
public final class Weiss1974 {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "weiss-1974",
                    "Solubility of carbon dioxide, and what water in balance with air holds",
                    Citation.withDoi(
                            "Weiss 1974",
                            "Weiss R.F. (1974) Carbon dioxide in water and seawater: the solubility of a non-ideal gas."
                                    + " Mar. Chem. 2:203-215",
                            "10.1016/0304-4203(74)90015-2"),
                    Seen.SECONDARY)
            .equation(
                    "ln K0 = a + b/h + c ln h + S (d + e h + f h^2), mol/(kg of solution atm), h = T/100; fugacity over partial"
                            + " pressure = exp((B + 2 D) P/(R T)), B = g + i T + j T^2 + k T^3, D = l + m T, P = 1 atm;"
                            + " CO2 = K0 times fugacity; T in K",
                    new Constant("a", -60.2409, "1"),
                    new Constant("b", 93.4517, "1"),
                    new Constant("c", 23.3585, "1"),
                    new Constant("d", 0.023517, "1"),
                    new Constant("e", -0.023656, "1"),
                    new Constant("f", 0.0047036, "1"),
                    new Constant("g", -1636.75, "cm3/mol"),
                    new Constant("i", 12.0408, "cm3/(mol.K)"),
                    new Constant("j", -3.27957e-2, "cm3/(mol.K2)"),
                    new Constant("k", 3.16528e-5, "cm3/(mol.K3)"),
                    new Constant("l", 57.7, "cm3/mol"),
                    new Constant("m", -0.118, "cm3/(mol.K)"),
                    new Constant("P/R", 1.01325 / 83.14462618, "K.mol/cm3"))
            .within(new Range("temperature_c", -1, 40, "Cel"), new Range("salinity", 0, 40, "1"))
            .accuracy(
                    "0.2 to 0.3 %; ln K0 -3.5617 at salinity 35, 25 °C (Dickson et al. 2007) is reproduced to the print");

    /**
     * Partial pressure of carbon dioxide in clean outdoor air, atm: 420 parts per million, from memory of the yearly means
     * of 2022 to 2024; vapour, which would take off 1 to 4 %, is left aside. Air in a closed house holds much more.
     */
    public static final double OUTDOOR_AIR_ATM = 420e-6;

    private static final double[] CONSTANTS = METHOD.values();

    private Weiss1974() {}

    /**
     * Carbon dioxide in balance with a gas, mol/kg of solution.
     *
     * @param temperatureC °C
     * @param salinity practical salinity
     * @param partialPressureAtm partial pressure of carbon dioxide, atm
     */
    public static double co2(double temperatureC, double salinity, double partialPressureAtm) {
        return co2(CONSTANTS, temperatureC, salinity, partialPressureAtm);
    }

    /** Whether water holds so much less than in balance with outdoor air that an error of pH by 0.3 does not explain it. */
    public static boolean farBelowAir(double co2, double temperatureC, double salinity) {
        return co2 < co2(temperatureC, salinity, OUTDOOR_AIR_ATM) / 2;
    }

    static double co2(double[] c, double temperatureC, double salinity, double partialPressureAtm) {
        return StrictMath.exp(lnK0(c, temperatureC, salinity)) * fugacity(c, temperatureC) * partialPressureAtm;
    }

    static double lnK0(double[] c, double temperatureC, double salinity) {
        double h = Temperature.kelvin(temperatureC) / 100;
        return c[0] + c[1] / h + c[2] * StrictMath.log(h) + salinity * (c[3] + h * (c[4] + h * c[5]));
    }

    /** Cross virial coefficient of carbon dioxide and air, cm3/mol. */
    static double delta(double[] c, double temperatureC) {
        return c[10] + c[11] * Temperature.kelvin(temperatureC);
    }

    private static double fugacity(double[] c, double temperatureC) {
        double t = Temperature.kelvin(temperatureC);
        double virial = c[6] + t * (c[7] + t * (c[8] + t * c[9]));
        return StrictMath.exp((virial + 2 * delta(c, temperatureC)) * c[12] / t);
    }
}
