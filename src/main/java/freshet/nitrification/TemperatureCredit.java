package freshet.nitrification;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Range;
import freshet.method.Seen;

/**
 * How far any response to temperature is believed: no gain above 30 °C, nothing below 4 °C, a fall to nothing from 34 to 45
 * °C.
 *
 * <p>This project's judgement; nitrification is reported from 4 to 45 °C (Sharma and Ahlert 1977).
 */
public final class TemperatureCredit {

    static final Range TEMPERATURE = new Range("temperature_c", 8, 34, "Cel");

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "temperature-credit",
                    "Limits to the credit for temperature",
                    Citation.withoutDoi(
                            "This project's judgement after Sharma & Ahlert 1977",
                            "This project's judgement after Sharma B., Ahlert R.C. (1977) Nitrification and nitrogen"
                                    + " removal. Water Res. 11:897-925"),
                    Seen.MEMORY)
            .equation(
                    "x = min(t, t_flat); factor 0 below t_cold, (t_dead - t)/(t_dead - t_hot) above t_hot, 0 from t_dead",
                    new Constant("t_flat", 30, "Cel"),
                    new Constant("t_cold", 4, "Cel"),
                    new Constant("t_hot", 34, "Cel"),
                    new Constant("t_dead", 45, "Cel"))
            .within(TEMPERATURE)
            .accuracy("judgement; optima of 29 to 42 °C are published");

    private static final TemperatureCredit PUBLISHED = new TemperatureCredit(METHOD.values());

    private final double flat;
    private final double cold;
    private final double hot;
    private final double dead;

    TemperatureCredit(double[] constants) {
        flat = constants[0];
        cold = constants[1];
        hot = constants[2];
        dead = constants[3];
    }

    static TemperatureCredit published() {
        return PUBLISHED;
    }

    /** The temperature that counts, °C. */
    double effectiveC(double temperatureC) {
        return Math.min(temperatureC, flat);
    }

    /** What cold and heat leave, 0 to 1. */
    double cut(double temperatureC) {
        if (temperatureC < cold) {
            return 0;
        }
        return Math.max(0, Math.min(1, (dead - temperatureC) / (dead - hot)));
    }
}
