package freshet.ammonia;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Seen;
import java.util.EnumSet;
import java.util.OptionalDouble;
import java.util.Set;

/**
 * US criteria of 1999 for fresh water, mg/L of total ammonia as N; superseded in 2013 but still in many rules. With {@code
 * F(pH; a, b, c) = a/(1 + 10^(c - pH)) + b/(1 + 10^(pH - c))}: acute {@code F(0.275, 39.0, 7.204)} with and {@code
 * F(0.411, 58.4, 7.204)} without salmonids; chronic {@code F(0.0577, 2.487, 7.688)} times {@code min(2.85, 1.45
 * 10^(0.028 (25 - t)))} with and {@code 1.45 10^(0.028 (25 - max(t, 7)))} without early life stages of fish; the average of
 * four days at most 2.5 times the chronic criterion.
 *
 * <p>US Environmental Protection Agency (1999) 1999 update of ambient water quality criteria for ammonia.
 * EPA-822-R-99-014. pH 6.5-9, 0-30 °C. Erratum: one state rule lost the "x 10^" between 1.45 and the exponent.
 */
public final class UsEpa1999 implements AmmoniaCriterion {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "usepa-1999",
                    "Total ammonia in receiving fresh waters that protects fish, salmonids and early life stages among them",
                    Citation.withoutDoi(
                            "US EPA 1999, EPA-822-R-99-014 (superseded 2013)",
                            "US Environmental Protection Agency (1999) 1999 update of ambient water quality criteria for"
                                    + " ammonia. EPA-822-R-99-014. Washington DC; superseded in 2013"),
                    Seen.SECONDARY)
            .equation(
                    "F(a, b, c) = a/(1 + 10^(c - pH)) + b/(1 + 10^(pH - c)); as N;"
                            + " acute: F(aS, bS, c) with salmonids, F(a, b, c) without;"
                            + " chronic: F(A, B, C) min(E, M 10^(S (t0 - t))) with early life stages of fish,"
                            + " F(A, B, C) M 10^(S (t0 - max(t, t7))) without; four days: 2.5 x chronic",
                    new Constant("aS", 0.275, "mg/L"),
                    new Constant("bS", 39.0, "mg/L"),
                    new Constant("a", 0.411, "mg/L"),
                    new Constant("b", 58.4, "mg/L"),
                    new Constant("c", 7.204, "[pH]"),
                    new Constant("A", 0.0577, "mg/L"),
                    new Constant("B", 2.487, "mg/L"),
                    new Constant("C", 7.688, "[pH]"),
                    new Constant("E", 2.85, "1"),
                    new Constant("M", 1.45, "1"),
                    new Constant("S", 0.028, "Cel-1"),
                    new Constant("t0", 25, "Cel"),
                    new Constant("t7", 7, "Cel"),
                    new Constant("four days", 2.5, "1"),
                    new Constant("acute average", 1, "h"),
                    new Constant("chronic average", 30, "d"))
            .within(ReceivingWater.PH, ReceivingWater.TEMPERATURE, ReceivingWater.FRESH)
            .accuracy(
                    "of 112 recalled cells of its tables 104 follow to the printed figure and the others within 0.4 %;"
                            + " each average may be exceeded once in three years; mussels are not protected: see usepa-2013;"
                            + " for receiving waters, neither advice for a culture tank nor a permit")
            .errata("a state rule prints \"1.45 0.028*(25-T)\" without the power of ten");

    private final PhResponse salmonid;
    private final PhResponse otherFish;
    private final PhResponse chronic;
    private final double[] c;

    UsEpa1999() {
        this(METHOD.values());
    }

    UsEpa1999(double[] constants) {
        c = constants;
        salmonid = new PhResponse(c[0], c[1], c[4]);
        otherFish = new PhResponse(c[2], c[3], c[4]);
        chronic = new PhResponse(c[5], c[6], c[7]);
    }

    @Override
    public Method method() {
        return METHOD;
    }

    @Override
    public double acuteTanMgPerL(Water water, Set<SensitiveLife> present) {
        return (present.contains(SensitiveLife.SALMONIDS) ? salmonid : otherFish).at(water.ph());
    }

    @Override
    public double chronicTanMgPerL(Water water, Set<SensitiveLife> present) {
        double t = water.temperatureC();
        return chronic.at(water.ph())
                * (present.contains(SensitiveLife.EARLY_LIFE_STAGES)
                        ? Math.min(c[8], warmth(t))
                        : warmth(Math.max(t, c[12])));
    }

    @Override
    public OptionalDouble chronicFourDayTanMgPerL(Water water, Set<SensitiveLife> present) {
        return OptionalDouble.of(c[13] * chronicTanMgPerL(water, present));
    }

    @Override
    public double acuteAveragingHours() {
        return c[14];
    }

    @Override
    public double chronicAveragingDays() {
        return c[15];
    }

    @Override
    public Set<SensitiveLife> heeded(Set<SensitiveLife> present) {
        return EnumSet.of(SensitiveLife.SALMONIDS, SensitiveLife.EARLY_LIFE_STAGES);
    }

    @Override
    public boolean forSaltWater() {
        return false;
    }

    private double warmth(double temperatureC) {
        return c[9] * StrictMath.pow(10, c[10] * (c[11] - temperatureC));
    }
}
