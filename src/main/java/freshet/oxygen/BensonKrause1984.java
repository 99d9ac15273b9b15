package freshet.oxygen;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Range;
import freshet.method.Seen;
import freshet.method.Validity;
import freshet.substance.Temperature;

/**
 * Dissolved oxygen in water at equilibrium with air saturated with water vapour, mg/L.
 *
 * <p>Benson B.B., Krause D. (1984) The concentration and isotopic fractionation of oxygen dissolved in freshwater and
 * seawater in equilibrium with the atmosphere. Limnol. Oceanogr. 29:620-632, doi:10.4319/lo.1984.29.3.0620; pressure
 * after their 1980 paper, as USGS Technical Memorandum 2011.03 and Standard Methods 4500-O adopt it. 0-40 °C, salinity
 * 0-40, 0.5-1.1 atm, ±0.1 %.
 */
public final class BensonKrause1984 {

    /** Standard atmosphere, hPa. */
    public static final double ATMOSPHERE_HPA = 1013.25;

    private static final Range TEMPERATURE = new Range("temperature_c", 0, 40, "Cel");
    private static final Range SALINITY = new Range("salinity", 0, 40, "1");
    private static final Range PRESSURE = new Range("station_pressure_hpa", 506.625, 1114.575, "hPa");

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "benson-krause-1984",
                    "Dissolved oxygen at saturation in fresh to sea water",
                    Citation.withDoi(
                            "Benson & Krause 1984",
                            "Benson B.B., Krause D. (1984) The concentration and isotopic fractionation of oxygen dissolved in"
                                    + " freshwater and seawater in equilibrium with the atmosphere. Limnol. Oceanogr."
                                    + " 29:620-632; pressure: Benson and Krause (1980) Limnol. Oceanogr. 25:662-671",
                            "10.4319/lo.1984.29.3.0620"),
                    Seen.SECONDARY)
            .equation(
                    "ln C = a + b/T + c/T^2 + d/T^3 + e/T^4 - S (f + g/T + h/T^2), mg/L at 1 atm;"
                            + " C(P) = C P (1 - u/P)(1 - o P)/((1 - u)(1 - o)), P in atm; o = i + j t + k t^2;"
                            + " u = exp(l + m/T + n/T^2) atm; T in K, t in degrees Celsius;"
                            + " where only the altitude is known, P by standard-atmosphere-1976",
                    new Constant("a", -139.34411, "1"),
                    new Constant("b", 1.575701e5, "K"),
                    new Constant("c", -6.642308e7, "K2"),
                    new Constant("d", 1.243800e10, "K3"),
                    new Constant("e", -8.621949e11, "K4"),
                    new Constant("f", 1.7674e-2, "1"),
                    new Constant("g", -10.754, "K"),
                    new Constant("h", 2140.7, "K2"),
                    new Constant("i", 0.000975, "1"),
                    new Constant("j", -1.426e-5, "Cel-1"),
                    new Constant("k", 6.436e-8, "Cel-2"),
                    new Constant("l", 11.8571, "1"),
                    new Constant("m", -3840.70, "K"),
                    new Constant("n", -216961, "K2"))
            .within(TEMPERATURE, SALINITY, PRESSURE)
            .accuracy("±0.1 % as stated by the source; tables of older standards differ by up to 0.4 %")
            .errata("a textbook table prints 10.3 for 10.03 mg/L at 5 °C and chlorinity 20 g/kg")
            .uses(StandardAtmosphere1976.METHOD);

    private static final double[] CONSTANTS = METHOD.values();

    private BensonKrause1984() {}

    /**
     * Dissolved oxygen at saturation, mg/L.
     *
     * @param temperatureC °C
     * @param salinity practical salinity
     * @param pressureHpa pressure of the air at the place, not reduced to sea level, hPa
     */
    public static double mgPerL(double temperatureC, double salinity, double pressureHpa) {
        return mgPerL(CONSTANTS, temperatureC, salinity, pressureHpa / ATMOSPHERE_HPA);
    }

    /** Whether the inputs lie within the ranges that the source states. */
    public static Validity validity(double temperatureC, double salinity, double pressureHpa) {
        return Validity.of(TEMPERATURE, temperatureC).and(SALINITY, salinity).and(PRESSURE, pressureHpa);
    }

    static double mgPerL(double[] c, double t, double salinity, double atmospheres) {
        double per = 1 / Temperature.kelvin(t);
        double fresh = c[0] + per * (c[1] + per * (c[2] + per * (c[3] + per * c[4])));
        double salt = salinity * (c[5] + per * (c[6] + per * c[7]));
        double theta = c[8] + t * (c[9] + t * c[10]);
        double vapour = StrictMath.exp(c[11] + per * (c[12] + per * c[13]));
        double pressure = (atmospheres - vapour) * (1 - theta * atmospheres) / ((1 - vapour) * (1 - theta));
        return StrictMath.exp(fresh - salt) * pressure;
    }
}
