package freshet.ammonia;

import freshet.acidity.PhScale;
import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Range;
import freshet.method.Seen;
import freshet.method.Validity;
import freshet.substance.Temperature;

/**
 * Fresh water: {@code pKa = 0.09018 + 2729.92/T}, T in K.
 *
 * <p>Emerson K., Russo R.C., Lund R.E., Thurston R.V. (1975) Aqueous ammonia equilibrium calculations: effect of pH and
 * temperature. J. Fish. Res. Board Can. 32(12):2379-2383, doi:10.1139/f75-274. A regression on zero-ionic-strength
 * data, 0-50 °C; for a pH that reads activity. Salinity and pH scale are ignored. Erratum: the slope is often copied as
 * 2727.92, which reads 1.7 % high; the published fraction table decides for 2729.92 with T = t + 273.15.
 */
public final class Emerson1975 implements AmmoniaDissociation {

    private static final Range TEMPERATURE = new Range("temperature_c", 0, 50, "Cel");
    private static final Range SALINITY = new Range("salinity", 0, 0.5, "1");

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "emerson-1975",
                    "Dissociation constant of ammonium in fresh water",
                    Citation.withDoi(
                            "Emerson et al. 1975",
                            "Emerson K., Russo R.C., Lund R.E., Thurston R.V. (1975) Aqueous ammonia equilibrium"
                                    + " calculations: effect of pH and temperature. J. Fish. Res. Board Can."
                                    + " 32(12):2379-2383",
                            "10.1139/f75-274"),
                    Seen.SECONDARY)
            .equation(
                    "pKa = a + b/T; fraction = 1/(1 + 10^(pKa - pH)); T = t + 273.15 K; pH an activity pH",
                    new Constant("a", 0.09018, "1"),
                    new Constant("b", 2729.92, "K"))
            .within(TEMPERATURE, SALINITY)
            .accuracy(
                    "within 0.0035 of the Bates and Pinching pKa it was fitted to (0.8 % of NH3); reproduces 109 of 116"
                            + " cells of the fraction table derived from it, the other 7 in the last digit or misprinted;"
                            + " neglecting ionic strength overstates NH3 by 4 to 14 % at 50 to 1000 mg/L dissolved solids")
            .errata(
                    "b is widely copied as 2727.92, which overstates NH3 by 1.7 %",
                    "some regulations use 273.2 for 273.15, which changes NH3 by 0.4 %");

    private final double a;
    private final double b;

    Emerson1975() {
        this(METHOD.values());
    }

    Emerson1975(double[] constants) {
        a = constants[0];
        b = constants[1];
    }

    @Override
    public Method method() {
        return METHOD;
    }

    @Override
    public double pKa(double temperatureC, double salinity, PhScale scale) {
        return a + b / Temperature.kelvin(temperatureC);
    }

    @Override
    public Validity validity(double temperatureC, double salinity) {
        return Validity.of(TEMPERATURE, temperatureC).and(SALINITY, salinity);
    }

    @Override
    public boolean coversSaltWater() {
        return false;
    }
}
