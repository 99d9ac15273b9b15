package freshet.nitrite;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Range;
import freshet.method.Seen;
import freshet.method.Validity;
import freshet.substance.Temperature;

/**
 * The measured constant at 25 °C, carried to other temperatures by the measured enthalpy (van 't Hoff).
 *
 * <p>da Silva G., Kennedy E.M., Dlugogorski B.Z. (2006) Ab initio procedure for aqueous-phase pKa calculation: the acidity
 * of nitrous acid. J. Phys. Chem. A 110:11371-11376, doi:10.1021/jp0639243. Stopped-flow spectrophotometry, 25-45 °C (the
 * span from memory).
 */
public final class DaSilva2006 implements NitrousAcidDissociation {

    private static final Range TEMPERATURE = new Range("temperature_c", 25, 45, "Cel");
    private static final double GAS_CONSTANT = 8.314462618;
    private static final double C25 = 25;

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "da-silva-2006",
                    "Dissociation constant of nitrous acid, measured",
                    Citation.withDoi(
                            "da Silva et al. 2006",
                            "da Silva G., Kennedy E.M., Dlugogorski B.Z. (2006) Ab initio procedure for aqueous-phase pKa"
                                    + " calculation: the acidity of nitrous acid. J. Phys. Chem. A 110:11371-11376",
                            "10.1021/jp0639243"),
                    Seen.SECONDARY)
            .equation(
                    "pKa = p + H/(R ln 10) (1/T - 1/298.15), R = 8.314462618 J/mol/K, T in K;"
                            + " fraction = 1/(1 + 10^(pH - pKa))",
                    new Constant("p", 3.16, "1", "pKa at 25 °C"),
                    new Constant("H", 6700, "J/mol", "enthalpy of dissociation"))
            .within(TEMPERATURE, SALINITY)
            .accuracy(
                    "pKa and enthalpy as the abstract states them; the temperature range is from memory; other modern"
                            + " values at 25 °C lie between 3.15 and 3.22; the enthalpy is small, so 10 °C lies 0.06 above 25 °C");

    private final double[] c;

    DaSilva2006() {
        this(METHOD.values());
    }

    DaSilva2006(double[] constants) {
        c = constants;
    }

    @Override
    public Method method() {
        return METHOD;
    }

    @Override
    public double pKa(double temperatureC) {
        double inverse = 1 / Temperature.kelvin(temperatureC) - 1 / Temperature.kelvin(C25);
        return c[0] + c[1] / (GAS_CONSTANT * StrictMath.log(10)) * inverse;
    }

    @Override
    public Validity validity(double temperatureC, double salinity) {
        return Validity.of(TEMPERATURE, temperatureC).and(SALINITY, salinity);
    }
}
