package freshet.nitrification;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Range;
import freshet.method.Seen;

/**
 * The middle of what is published for biofilms, {@code 1.06^dt}; not cautious.
 *
 * <p>This project's judgement within Salvetti R. et al. (2006) Water Res. 40:2981-2993: 1.058 where oxygen limits, 1.098
 * where ammonia does, near 1 as it appears outside the film.
 */
final class CentralArrhenius implements TemperatureResponse {

    static final Method METHOD = Method.of(
                    "central-arrhenius",
                    "Temperature of a biofilm, middle of what is published",
                    Citation.withoutDoi(
                            "This project's judgement after Salvetti et al. 2006",
                            "This project's judgement after Salvetti R., Azzellino A., Canziani R., Bonomo L. (2006)"
                                    + " Effects of temperature on tertiary nitrification in moving-bed biofilm reactors."
                                    + " Water Res. 40:2981-2993"),
                    Seen.SECONDARY)
            .equation("f = c^(x - y); at most 30 °C", new Constant("c", 1.06, "1", "this project's judgement"))
            .within(new Range("temperature_c", 8, 34, "Cel"))
            .accuracy("published factors per degree span 1.00 to 1.127");

    private final double perDegree;

    CentralArrhenius() {
        this(METHOD.values());
    }

    CentralArrhenius(double[] constants) {
        perDegree = constants[0];
    }

    @Override
    public Method method() {
        return METHOD;
    }

    @Override
    public double ratio(double temperatureC, double referenceC, boolean oxygenLimited) {
        return StrictMath.pow(perDegree, temperatureC - referenceC);
    }
}
