package freshet.nitrification;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Range;
import freshet.method.Seen;

/**
 * A film between diffusion and growth: 4.3 % per degree where ammonia limits, 1.1 % where oxygen does.
 *
 * <p>Zhu S., Chen S. (2002) The impact of temperature on nitrification rate in fixed film biofilters. Aquac. Eng.
 * 26:221-237: 4.275 % and 1.108 % at 20 °C; 14 to 27 °C measured (memory).
 */
final class ZhuChen2002 implements TemperatureResponse {

    static final Method METHOD = Method.of(
                    "zhu-chen-2002",
                    "Temperature of a biofilm limited by ammonia or by oxygen",
                    Citation.withoutDoi(
                            "Zhu & Chen 2002, Aquac. Eng. 26:221-237",
                            "Zhu S., Chen S. (2002) The impact of temperature on nitrification rate in fixed film"
                                    + " biofilters. Aquac. Eng. 26:221-237"),
                    Seen.SECONDARY)
            .equation(
                    "f = n^(x - y) where ammonia limits, o^(x - y) where oxygen does; at most 30 °C",
                    new Constant("n", 1.043, "1", "printed as 4.275 % per degree"),
                    new Constant("o", 1.011, "1", "printed as 1.108 % per degree"))
            .within(new Range("temperature_c", 14, 27, "Cel"))
            .accuracy("sensitivities at 20 °C, carried on as powers by this project; range from memory");

    private final double ammoniaLimited;
    private final double oxygenLimited;

    ZhuChen2002() {
        this(METHOD.values());
    }

    ZhuChen2002(double[] constants) {
        ammoniaLimited = constants[0];
        oxygenLimited = constants[1];
    }

    @Override
    public Method method() {
        return METHOD;
    }

    @Override
    public double ratio(double temperatureC, double referenceC, boolean byOxygen) {
        return StrictMath.pow(byOxygen ? oxygenLimited : ammoniaLimited, temperatureC - referenceC);
    }
}
