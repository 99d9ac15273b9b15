package freshet.nitrite;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Range;
import freshet.method.Seen;
import freshet.method.Validity;

/**
 * The constant behind the published thresholds of inhibition: {@code Ka = exp(-2300/(273 + t))}, t in °C.
 *
 * <p>Anthonisen A.C., Loehr R.C., Prakasam T.B.S., Srinath E.G. (1976) Inhibition of nitrification by ammonia and nitrous
 * acid. J. Water Pollut. Control Fed. 48(5):835-852. Printed as HNO2 = (46/14) NO2-N/(Ka 10^pH), mg/L, with NO2-N the ion.
 * Quirks: 273 for 273.15; 46 is nitrite, nitrous acid is 47.013; taken for total nitrite it lacks "+ 1", which counts
 * below pH 6. Here the ion and the acid add up to the total. The source states no range that was seen.
 */
public final class Anthonisen1976 implements NitrousAcidDissociation {

    private static final Range TEMPERATURE = new Range("temperature_c", 0, 40, "Cel");

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "anthonisen-1976",
                    "Dissociation constant of nitrous acid that the published thresholds of inhibition rest on",
                    Citation.withoutDoi(
                            "Anthonisen et al. 1976, J. Water Pollut. Control Fed. 48:835-852",
                            "Anthonisen A.C., Loehr R.C., Prakasam T.B.S., Srinath E.G. (1976) Inhibition of"
                                    + " nitrification by ammonia and nitrous acid. J. Water Pollut. Control Fed."
                                    + " 48(5):835-852"),
                    Seen.SECONDARY)
            .equation(
                    "Ka = exp(-b/(z + t)), t in °C; pKa = b/((z + t) ln 10); fraction = 1/(1 + 10^(pH - pKa))",
                    new Constant("b", 2300, "K"),
                    new Constant("z", 273, "K", "printed so, not 273.15"))
            .within(TEMPERATURE, SALINITY)
            .accuracy("pKa 3.35 at 25 °C, while later measurements give 3.16: it shows 55 % more HNO2 than"
                    + " da-silva-2006 at 25 °C and twice as much at 10 °C, on the safe side; the range is this project's judgement, the source states none"
                    + " that was seen")
            .errata(
                    "the printed equation divides by Ka 10^pH, not by 1 + Ka 10^pH: 0.08 % too much at pH 6.5, 2.6 % at"
                            + " pH 5; here the two forms add up to the total",
                    "its mg/L HNO2 are counted with 46/14, the mass of nitrite; nitrous acid is 47.013/14.007");

    private final double[] c;

    Anthonisen1976() {
        this(METHOD.values());
    }

    Anthonisen1976(double[] constants) {
        c = constants;
    }

    @Override
    public Method method() {
        return METHOD;
    }

    @Override
    public double pKa(double temperatureC) {
        return c[0] / (c[1] + temperatureC) / StrictMath.log(10);
    }

    @Override
    public Validity validity(double temperatureC, double salinity) {
        return Validity.of(TEMPERATURE, temperatureC).and(SALINITY, salinity);
    }
}
