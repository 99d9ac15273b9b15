package freshet.nitrification;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Range;
import freshet.method.Seen;

/**
 * Growth of nitrifiers in suspension: {@code exp(0.098 dt)}.
 *
 * <p>US EPA (1993) Manual: Nitrogen Control, EPA/625/R-93/010, {@code mu = 0.47 exp(0.098(t - 15))}, 8-30 °C, after Downing
 * A.L. et al. (1964). For sludge, not for films: it overstates what warm water gains.
 */
final class UsEpa1993 implements TemperatureResponse {

    static final Method METHOD = Method.of(
                    "usepa-1993",
                    "Temperature of nitrifiers in suspension",
                    Citation.withoutDoi(
                            "US EPA 1993, EPA/625/R-93/010",
                            "US Environmental Protection Agency (1993) Manual: Nitrogen Control. EPA/625/R-93/010."
                                    + " Washington DC; after Downing A.L., Painter H.A., Knowles G. (1964)"),
                    Seen.SECONDARY)
            .equation("f = exp(k(x - y)); at most 30 °C", new Constant("k", 0.098, "1/Cel"))
            .within(new Range("temperature_c", 8, 30, "Cel"))
            .accuracy("for suspended sludge; at 28 °C it gives 60 % more than guarded-arrhenius from 20 °C");

    private final double exponent;

    UsEpa1993() {
        this(METHOD.values());
    }

    UsEpa1993(double[] constants) {
        exponent = constants[0];
    }

    @Override
    public Method method() {
        return METHOD;
    }

    @Override
    public double ratio(double temperatureC, double referenceC, boolean oxygenLimited) {
        return StrictMath.exp(exponent * (temperatureC - referenceC));
    }
}
