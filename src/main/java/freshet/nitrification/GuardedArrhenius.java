package freshet.nitrification;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Range;
import freshet.method.Seen;

/**
 * Cautious both ways: {@code 1.09^dt} for colder, {@code 1.04^dt} for warmer water; the pivot is the reference temperature.
 *
 * <p>This project's judgement between Rusten B. et al. (2006) Aquac. Eng. 34:322-331 (1.09), Hoang V. et al. (2014) Water
 * Res. 49:215-224 (18 % of the 20 °C rate at 1 °C) and Zhu S., Chen S. (2002) Aquac. Eng. 26:221-237 (1.011 to 1.043).
 */
final class GuardedArrhenius implements TemperatureResponse {

    static final Method METHOD = Method.of(
                    "guarded-arrhenius",
                    "Temperature of a biofilm, cautious both ways",
                    Citation.withoutDoi(
                            "This project's judgement after Rusten et al. 2006",
                            "This project's judgement after Rusten B., Eikebrokk B., Ulgenes Y., Lygren E. (2006) Aquac."
                                    + " Eng. 34:322-331; Hoang V. et al. (2014) Water Res. 49:215-224; Zhu S., Chen S."
                                    + " (2002) Aquac. Eng. 26:221-237"),
                    Seen.SECONDARY)
            .equation(
                    "f = w^(x - y) if x >= y, else c^(x - y); x, y temperature and reference temperature, at most 30 °C",
                    new Constant("w", 1.04, "1", "this project's judgement"),
                    new Constant("c", 1.09, "1", "memory; agrees with the 18 % measured at 1 °C"))
            .within(new Range("temperature_c", 8, 34, "Cel"))
            .accuracy("published factors per degree span 1.00 to 1.127")
            .errata("a rate measured in warm or cold water is not at 20 °C: give its own temperature");

    private final double warmer;
    private final double colder;

    GuardedArrhenius() {
        this(METHOD.values());
    }

    GuardedArrhenius(double[] constants) {
        warmer = constants[0];
        colder = constants[1];
    }

    @Override
    public Method method() {
        return METHOD;
    }

    @Override
    public double ratio(double temperatureC, double referenceC, boolean oxygenLimited) {
        double rise = temperatureC - referenceC;
        return StrictMath.pow(rise >= 0 ? warmer : colder, rise);
    }
}
