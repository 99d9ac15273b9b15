package freshet.nitrification;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Range;
import freshet.method.Seen;

/**
 * A rotating drum: {@code R = 140 + 8.5 t} mg TAN/m2/day, 7-35 °C; only its proportions are used.
 *
 * <p>Wortman B., Wheaton F. (1991) Temperature effects on biodrum nitrification. Aquac. Eng. 10:183-205.
 */
final class WortmanWheaton1991 implements TemperatureResponse {

    static final Method METHOD = Method.of(
                    "wortman-wheaton-1991",
                    "Temperature of a rotating drum, linear",
                    Citation.withoutDoi(
                            "Wortman & Wheaton 1991, Aquac. Eng. 10:183-205",
                            "Wortman B., Wheaton F. (1991) Temperature effects on biodrum nitrification. Aquac. Eng."
                                    + " 10:183-205"),
                    Seen.MEMORY)
            .equation(
                    "f = (a + b x)/(a + b y); at most 30 °C; a + b t the rate",
                    new Constant("a", 140, "mg/m2/d"),
                    new Constant("b", 8.5, "mg/m2/d/Cel"))
            .within(new Range("temperature_c", 7, 35, "Cel"))
            .accuracy("one drum; only the proportion of its rates is used");

    private final double atZero;
    private final double perDegree;

    WortmanWheaton1991() {
        this(METHOD.values());
    }

    WortmanWheaton1991(double[] constants) {
        atZero = constants[0];
        perDegree = constants[1];
    }

    @Override
    public Method method() {
        return METHOD;
    }

    @Override
    public double ratio(double temperatureC, double referenceC, boolean oxygenLimited) {
        return rateMgPerM2PerDay(temperatureC) / rateMgPerM2PerDay(referenceC);
    }

    /** Rate of the drum, mg TAN as N/m2/day, at °C. */
    double rateMgPerM2PerDay(double temperatureC) {
        return atZero + perDegree * temperatureC;
    }
}
