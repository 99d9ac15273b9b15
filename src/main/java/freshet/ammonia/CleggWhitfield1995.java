package freshet.ammonia;

import freshet.acidity.Dickson1990;
import freshet.acidity.PhScale;
import freshet.acidity.SeaSalt;
import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Range;
import freshet.method.Seen;
import freshet.method.Validity;
import freshet.substance.Temperature;

/**
 * Brackish and sea water, equation 18: total scale, mol/kg of water, converted to mol/kg of solution; for the free and
 * the NBS scale converted with the bisulfate constant of {@link Dickson1990}.
 *
 * <p>Clegg S.L., Whitfield M. (1995) A chemical model of seawater including dissolved ammonia and the stoichiometric
 * dissociation constant of ammonia in estuarine water and seawater from -2 to 40 °C. Geochim. Cosmochim. Acta
 * 59(12):2403-2421, doi:10.1016/0016-7037(95)00135-2. Salinity 0-40, -2 to 40 °C; K better than 5 %. Erratum: one public
 * copy misplaces a bracket so that all salinity terms are multiplied by 2729.33.
 */
public final class CleggWhitfield1995 implements AmmoniaDissociation {

    private static final Range TEMPERATURE = new Range("temperature_c", -2, 40, "Cel");
    private static final Range SALINITY = new Range("salinity", 0, 40, "1");

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "clegg-whitfield-1995",
                    "Dissociation constant of ammonium in brackish and sea water",
                    Citation.withDoi(
                            "Clegg & Whitfield 1995",
                            "Clegg S.L., Whitfield M. (1995) A chemical model of seawater including dissolved ammonia and"
                                    + " the stoichiometric dissociation constant of ammonia in estuarine water and seawater"
                                    + " from -2 to 40 °C. Geochim. Cosmochim. Acta 59(12):2403-2421",
                            "10.1016/0016-7037(95)00135-2"),
                    Seen.SECONDARY)
            .equation(
                    "pK = p - q (1/298.15 - 1/T) + (a1 + d1/T) S^0.25 + (a2 + b2 T^0.5 + c2 T + d2/T) S^0.5"
                            + " + (a3 + b3 T^0.5 + c3 T + d3/T) S^1.5 + (a4 + b4 T^0.5 + d4/T) S^2 + (a5 + d5/T) S^2.5;"
                            + " total scale, mol/kg of water; K per kg of solution = 10^-pK (1 - 0.001005 S);"
                            + " free and NBS scale: pK + log10(1 + SO4/KS)",
                    new Constant("p", 9.244605, "1"),
                    new Constant("q", 2729.33, "K"),
                    new Constant("a1", 0.04203362, "1"),
                    new Constant("d1", -11.24742, "K"),
                    new Constant("a2", -13.6416, "1"),
                    new Constant("b2", 1.176949, "K-0.5"),
                    new Constant("c2", -0.02860785, "K-1"),
                    new Constant("d2", 545.4834, "K"),
                    new Constant("a3", -0.1462507, "1"),
                    new Constant("b3", 0.0090226468, "K-0.5"),
                    new Constant("c3", -0.0001471361, "K-1"),
                    new Constant("d3", 10.5425, "K"),
                    new Constant("a4", 0.004669309, "1"),
                    new Constant("b4", -0.0001691742, "K-0.5"),
                    new Constant("d4", -0.5677934, "K"),
                    new Constant("a5", -2.354039e-05, "1"),
                    new Constant("d5", 0.009698623, "K"))
            .within(TEMPERATURE, SALINITY)
            .accuracy("K better than 5 % as stated by the source; fit of the equation ±0.00015 in pK; at salinity 0 it"
                    + " lies 0.002 below emerson-1975 (0.4 % of NH3)")
            .errata("one public copy misplaces a bracket so that every salinity term is multiplied by 2729.33")
            .uses(Dickson1990.METHOD);

    private static final double KELVIN_25C = 298.15;

    private final double[] c;

    CleggWhitfield1995() {
        this(METHOD.values());
    }

    CleggWhitfield1995(double[] constants) {
        c = constants;
    }

    @Override
    public Method method() {
        return METHOD;
    }

    @Override
    public double pKa(double temperatureC, double salinity, PhScale scale) {
        double total = totalPerKgOfWater(temperatureC, salinity) - StrictMath.log10(SeaSalt.waterShare(salinity));
        return scale == PhScale.TOTAL
                ? total
                : total + StrictMath.log10(Dickson1990.totalPerFree(temperatureC, salinity));
    }

    @Override
    public Validity validity(double temperatureC, double salinity) {
        return Validity.of(TEMPERATURE, temperatureC).and(SALINITY, salinity);
    }

    private double totalPerKgOfWater(double temperatureC, double salinity) {
        double t = Temperature.kelvin(temperatureC);
        double rootT = StrictMath.sqrt(t);
        double rootS = StrictMath.sqrt(salinity);
        return c[0]
                - c[1] * (1 / KELVIN_25C - 1 / t)
                + (c[2] + c[3] / t) * StrictMath.sqrt(rootS)
                + (c[4] + c[5] * rootT + c[6] * t + c[7] / t) * rootS
                + (c[8] + c[9] * rootT + c[10] * t + c[11] / t) * salinity * rootS
                + (c[12] + c[13] * rootT + c[14] / t) * salinity * salinity
                + (c[15] + c[16] / t) * salinity * salinity * rootS;
    }
}
