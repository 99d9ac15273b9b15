package freshet.ammonia;

import freshet.acidity.Dickson1990;
import freshet.acidity.PhScale;
import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Seen;
import freshet.method.Validity;
import freshet.substance.Temperature;

/**
 * The constant with which the US criteria of 1989 for salt water were tabulated: {@code pKa = 9.245 + 0.116 I + 0.0324 (298
 * - T) + 0.0415 P/T}, ionic strength {@code I = 19.9273 S/(1000 - 1.005109 S)} mol/kg of water, P = 1 atm, T in K.
 *
 * <p>US Environmental Protection Agency (1989) EPA 440/5-88-004, after Hampson 1977. Only for comparison with those
 * criteria: linear in T, at salinity 0 it reads 8 % high in NH3 at 0 °C and 13 % at 40 °C. Taken for the free scale, whose
 * family it numerically belongs to; for the total scale converted with {@link Dickson1990}.
 */
public final class UsEpa1989Dissociation implements AmmoniaDissociation {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "usepa-1989-dissociation",
                    "Dissociation constant of ammonium in the US salt-water criteria",
                    Citation.withoutDoi(
                            "US EPA 1989, EPA 440/5-88-004",
                            Nh3Guideline.SaltWaterCriteria.FULL
                                    + "; the equation after Hampson 1977 (attribution from memory)"),
                    Seen.SECONDARY)
            .equation(
                    "pKa = a + b I + d (T0 - T) + e P/T; I = i S/(1000 - j S) mol/kg of water; P = 1 atm;"
                            + " T = t + 273.15 K; taken for the free and the NBS scale, total scale: less"
                            + " log10(1 + SO4/KS)",
                    new Constant("a", 9.245, "1"),
                    new Constant("b", 0.116, "kg/mol"),
                    new Constant("d", 0.0324, "K-1"),
                    new Constant("T0", 298, "K"),
                    new Constant("e", 0.0415, "K/atm"),
                    new Constant("i", 19.9273, "mol/kg"),
                    new Constant("j", 1.005109, "1"))
            .within(ReceivingWater.PH, ReceivingWater.TEMPERATURE, ReceivingWater.SALT)
            .accuracy("for comparison with the criteria of 1989 only: at salinity 35 it gives 7 to 14 % more NH3 than"
                    + " clegg-whitfield-1995 on the free scale")
            .errata("298 stands for 298.15, and some use T = t + 273: 0.005 in pKa, 1.1 % of NH3")
            .uses(Dickson1990.METHOD);

    private final double[] c;

    UsEpa1989Dissociation() {
        this(METHOD.values());
    }

    UsEpa1989Dissociation(double[] constants) {
        c = constants;
    }

    @Override
    public Method method() {
        return METHOD;
    }

    @Override
    public double pKa(double temperatureC, double salinity, PhScale scale) {
        double t = Temperature.kelvin(temperatureC);
        double ionicStrength = c[5] * salinity / (1000 - c[6] * salinity);
        double free = c[0] + c[1] * ionicStrength + c[2] * (c[3] - t) + c[4] / t;
        return scale == PhScale.TOTAL
                ? free - StrictMath.log10(Dickson1990.totalPerFree(temperatureC, salinity))
                : free;
    }

    @Override
    public Validity validity(double temperatureC, double salinity) {
        return Validity.of(ReceivingWater.TEMPERATURE, temperatureC).and(ReceivingWater.SALT, salinity);
    }
}
