package freshet.nitrification;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Range;
import freshet.method.Seen;

/**
 * How the rate falls with pH: {@code 1 - 0.833(7.2 - pH)} below 7.2, 1 up to pH 9.
 *
 * <p>US EPA (1993) Manual: Nitrogen Control, EPA/625/R-93/010. It reaches 0 at pH 6.0; no credit is given below. Above pH
 * 9 the fall to 0 at pH 10 is this project's judgement.
 */
public final class PhFactor {

    /** pH below which films grown there lose less than the equation says; this project's judgement. */
    static final double ACCLIMATED_BELOW = 6.8;

    static final Range PH = new Range("ph", 6, 9, "[pH]");

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "usepa-1993-ph",
                    "Nitrification at low pH",
                    Citation.withoutDoi(
                            "US EPA 1993, EPA/625/R-93/010",
                            "US Environmental Protection Agency (1993) Manual: Nitrogen Control. EPA/625/R-93/010."
                                    + " Washington DC"),
                    Seen.SECONDARY)
            .equation(
                    "f = 1 - s(p - pH) below p, 0 from pH_0 down; 1 up to pH_1; (pH_2 - pH)/(pH_2 - pH_1) above",
                    new Constant("s", 0.833, "1"),
                    new Constant("p", 7.2, "[pH]"),
                    new Constant("pH_0", 6.0, "[pH]", "this project's judgement: the equation itself ends at 5.9995"),
                    new Constant("pH_1", 9, "[pH]", "this project's judgement"),
                    new Constant("pH_2", 10, "[pH]", "this project's judgement"))
            .within(PH)
            .accuracy("for sludge that is not used to low pH; films grown at pH 6.0 to 6.8 lose little where alkalinity"
                    + " suffices")
            .errata("must not be extrapolated above pH 9");

    private static final PhFactor PUBLISHED = new PhFactor(METHOD.values());

    private final double slope;
    private final double pivot;
    private final double lowest;
    private final double fallsAbove;
    private final double highest;

    PhFactor(double[] constants) {
        slope = constants[0];
        pivot = constants[1];
        lowest = constants[2];
        fallsAbove = constants[3];
        highest = constants[4];
    }

    static PhFactor published() {
        return PUBLISHED;
    }

    double at(double ph) {
        if (ph <= lowest || ph >= highest) {
            return 0;
        }
        return ph < pivot ? 1 - slope * (pivot - ph) : Math.min(1, (highest - ph) / (highest - fallsAbove));
    }
}
