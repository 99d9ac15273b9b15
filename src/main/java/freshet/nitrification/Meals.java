package freshet.nitrification;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Seen;

/** How feed is spread over the day, and so how high excretion peaks above its daily mean. */
public enum Meals {
    /** Over 16 hours or more. */
    CONTINUOUS,
    /** Two to four meals. */
    SEVERAL,
    /** One meal. */
    ONE;

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "excretion-peak",
                    "Peak of the daily course of ammonia excretion over its mean",
                    Citation.withoutDoi(
                            "This project's judgement after Porter et al. 1987",
                            "This project's judgement after daily courses of excretion: Porter C.B. et al. (1987) on"
                                    + " gilthead seabream, peaks 1.6 to 2.4 times the mean; Brett J.R., Zala C.A. (1975)"
                                    + " on sockeye salmon, peak 4.3 times the baseline after one meal"),
                    Seen.SECONDARY)
            .equation(
                    "peak rate = mean rate x factor, before the volume of the tank dampens it",
                    new Constant("continuous", 1.2, "1", "1.1 to 1.3"),
                    new Constant("several", 1.7, "1", "1.5 to 2.0"),
                    new Constant("one", 2.4, "1", "2.0 to 4"))
            .accuracy("fish of 40 to 90 g at 24 °C; colder water peaks later and lower");

    /** The rate at the daily peak, in the unit of {@code meanRate}. */
    public double peakRate(double meanRate) {
        return meanRate * peakFactor();
    }

    /** Peak rate over daily mean rate. */
    public double peakFactor() {
        return METHOD.values()[ordinal()];
    }
}
