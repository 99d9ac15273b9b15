package freshet.ammonia;

import freshet.acidity.Dickson1990;
import freshet.acidity.DicksonRiley1979;
import freshet.acidity.PhScale;
import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Range;
import freshet.method.Seen;
import freshet.method.Validity;
import freshet.substance.Temperature;

/**
 * Fresh to sea water: seawater scale, mol/kg of solution, converted to the caller's scale with {@link Dickson1990} and
 * {@link DicksonRiley1979}.
 *
 * <p>Yao W., Millero F.J. (1995) The chemistry of the anoxic waters in the Framvaren Fjord, Norway. Aquat. Geochem.
 * 1:53-88; restated in Millero F.J. (1995) Geochim. Cosmochim. Acta 59:661-677, doi:10.1016/0016-7037(94)00354-O.
 * Salinity 0-45, 0-45 °C.
 */
public final class YaoMillero1995 implements AmmoniaDissociation {

    private static final Range TEMPERATURE = new Range("temperature_c", 0, 45, "Cel");
    private static final Range SALINITY = new Range("salinity", 0, 45, "1");

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "yao-millero-1995",
                    "Dissociation constant of ammonium from fresh to sea water",
                    Citation.withDoi(
                            "Yao & Millero 1995; Millero 1995",
                            "Yao W., Millero F.J. (1995) The chemistry of the anoxic waters in the Framvaren Fjord, Norway."
                                    + " Aquat. Geochem. 1:53-88; restated in Millero F.J. (1995) Thermodynamics of the"
                                    + " carbon dioxide system in the oceans. Geochim. Cosmochim. Acta 59:661-677",
                            "10.1016/0016-7037(94)00354-O"),
                    Seen.SECONDARY)
            .equation(
                    "ln K = a/T + b T + c + (d + e/T) S^0.5 + (f + g/T) S; seawater scale, mol/kg of solution;"
                            + " free and NBS scale: pK + log10(1 + SO4/KS + F/KF), total scale: less log10(1 + SO4/KS)",
                    new Constant("a", -6285.33, "K"),
                    new Constant("b", 0.0001635, "K-1"),
                    new Constant("c", -0.25444, "1"),
                    new Constant("d", 0.46532, "1"),
                    new Constant("e", -123.7184, "K"),
                    new Constant("f", -0.01992, "1"),
                    new Constant("g", 3.17556, "K"))
            .within(TEMPERATURE, SALINITY)
            .accuracy(
                    "at salinity 0 equal to emerson-1975 within 0.0027 in pKa at 0 to 40 °C; K 5.4790e-10 at salinity 35"
                            + " and 298 K")
            .uses(Dickson1990.METHOD, DicksonRiley1979.METHOD);

    private final double[] c;

    YaoMillero1995() {
        this(METHOD.values());
    }

    YaoMillero1995(double[] constants) {
        c = constants;
    }

    @Override
    public Method method() {
        return METHOD;
    }

    @Override
    public double pKa(double temperatureC, double salinity, PhScale scale) {
        double seawater = -lnConstant(temperatureC, salinity) / StrictMath.log(10);
        double free = seawater + StrictMath.log10(DicksonRiley1979.seawaterPerFree(temperatureC, salinity));
        return scale == PhScale.TOTAL
                ? free - StrictMath.log10(Dickson1990.totalPerFree(temperatureC, salinity))
                : free;
    }

    @Override
    public Validity validity(double temperatureC, double salinity) {
        return Validity.of(TEMPERATURE, temperatureC).and(SALINITY, salinity);
    }

    private double lnConstant(double temperatureC, double salinity) {
        double t = Temperature.kelvin(temperatureC);
        return c[0] / t
                + c[1] * t
                + c[2]
                + (c[3] + c[4] / t) * StrictMath.sqrt(salinity)
                + (c[5] + c[6] / t) * salinity;
    }
}
