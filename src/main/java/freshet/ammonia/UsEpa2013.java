package freshet.ammonia;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Seen;
import java.util.EnumSet;
import java.util.OptionalDouble;
import java.util.Set;

/**
 * US criteria of 2013 for fresh water, mg/L of total ammonia as N. With {@code F(pH; a, b, c) = a/(1 + 10^(c - pH)) +
 * b/(1 + 10^(pH - c))} and {@code W = m 10^(s (20 - t))}, where {@code m} is that of mussels or, without them, of the next
 * sensitive animal: acute {@code k F W}, at most {@code F} of salmonids where these are present and {@code k F fish} where
 * not; chronic {@code K F M 10^(S (20 - max(t, 7)))}; the average of four days at most 2.5 times the chronic criterion.
 *
 * <p>US Environmental Protection Agency (2013) Aquatic life ambient water quality criteria for ammonia - freshwater 2013.
 * EPA-822-R-13-001, equations of the criteria and Appendix N (mussels absent). pH 6.5-9, 0-30 °C. Erratum: a public copy
 * of the chronic equation has 10 for 20 in the exponent and gives 1.0 for 1.9 at pH 7 and 20 °C.
 */
public final class UsEpa2013 implements AmmoniaCriterion {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "usepa-2013",
                    "Total ammonia in receiving fresh waters that protects mussels, salmonids and other animals",
                    Citation.withoutDoi(
                            "US EPA 2013, EPA-822-R-13-001",
                            "US Environmental Protection Agency (2013) Aquatic life ambient water quality criteria for"
                                    + " ammonia - freshwater 2013. EPA-822-R-13-001. Washington DC; Appendix N for waters"
                                    + " without mussels"),
                    Seen.SECONDARY)
            .equation(
                    "F(a, b, c) = a/(1 + 10^(c - pH)) + b/(1 + 10^(pH - c)); as N;"
                            + " acute: k F(a, b, c) m 10^(s (t0 - t)), at most F(aS, bS, c) with salmonids (Oncorhynchus)"
                            + " and k F(a, b, c) fish without, m of mussels or without them m';"
                            + " chronic with mussels: K F(A, B, C) M 10^(S (t0 - max(t, t7))); without mussels"
                            + " K' F(A, B, C) min(E, N 10^(S (t0 - t))) with early life stages of fish,"
                            + " K' F(A, B, C) N 10^(S (t0 - max(t, t7))) without; four days: 2.5 x chronic",
                    new Constant("aS", 0.275, "mg/L"),
                    new Constant("bS", 39.0, "mg/L"),
                    new Constant("c", 7.204, "[pH]"),
                    new Constant("k", 0.7249, "1"),
                    new Constant("a", 0.0114, "1"),
                    new Constant("b", 1.6181, "1"),
                    new Constant("fish", 51.93, "mg/L"),
                    new Constant("m", 23.12, "mg/L"),
                    new Constant("m'", 62.15, "mg/L", "mussels absent"),
                    new Constant("s", 0.036, "Cel-1"),
                    new Constant("t0", 20, "Cel"),
                    new Constant("K", 0.8876, "1"),
                    new Constant("A", 0.0278, "1"),
                    new Constant("B", 1.1994, "1"),
                    new Constant("C", 7.688, "[pH]"),
                    new Constant("M", 2.126, "mg/L"),
                    new Constant("S", 0.028, "Cel-1"),
                    new Constant("t7", 7, "Cel"),
                    new Constant("K'", 0.9405, "1", "mussels absent"),
                    new Constant("E", 6.920, "mg/L", "mussels absent, early life stages present"),
                    new Constant("N", 7.547, "mg/L", "mussels absent"),
                    new Constant("four days", 2.5, "1"),
                    new Constant("acute average", 1, "h"),
                    new Constant("chronic average", 30, "d"))
            .within(ReceivingWater.PH, ReceivingWater.TEMPERATURE, ReceivingWater.FRESH)
            .accuracy(
                    "all 54 cells known of its tables 5a, 5b and 6 follow to their two figures; each average may be"
                            + " exceeded once in three years; for receiving waters, neither advice for a culture tank nor a permit")
            .errata(
                    "a public copy has 10 - max(t, 7) for 20 - max(t, 7) in the chronic equation: 1.0 for 1.9 at pH 7, 20 °C",
                    "the headline of 4.8 mg/L over four days at pH 7, 20 °C is 2.5 x 1.9; unrounded it is 4.72",
                    "a US state page calls the four-day average a four-hour one");

    private final PhResponse salmonid;
    private final PhResponse acute;
    private final PhResponse chronic;
    private final double[] c;

    UsEpa2013() {
        this(METHOD.values());
    }

    UsEpa2013(double[] constants) {
        c = constants;
        salmonid = new PhResponse(c[0], c[1], c[2]);
        acute = new PhResponse(c[4], c[5], c[2]);
        chronic = new PhResponse(c[12], c[13], c[14]);
    }

    @Override
    public Method method() {
        return METHOD;
    }

    @Override
    public double acuteTanMgPerL(Water water, Set<SensitiveLife> present) {
        double most = present.contains(SensitiveLife.MUSSELS) ? c[7] : c[8];
        double scale = c[3] * acute.at(water.ph());
        double invertebrates = scale * most * StrictMath.pow(10, c[9] * (c[10] - water.temperatureC()));
        double fish = present.contains(SensitiveLife.SALMONIDS) ? salmonid.at(water.ph()) : scale * c[6];
        return Math.min(fish, invertebrates);
    }

    @Override
    public double chronicTanMgPerL(Water water, Set<SensitiveLife> present) {
        double ph = chronic.at(water.ph());
        double warm = Math.max(water.temperatureC(), c[17]);
        if (present.contains(SensitiveLife.MUSSELS)) {
            return c[11] * ph * c[15] * warmth(warm);
        }
        return c[18]
                * ph
                * (present.contains(SensitiveLife.EARLY_LIFE_STAGES)
                        ? Math.min(c[19], c[20] * warmth(water.temperatureC()))
                        : c[20] * warmth(warm));
    }

    @Override
    public OptionalDouble chronicFourDayTanMgPerL(Water water, Set<SensitiveLife> present) {
        return OptionalDouble.of(c[21] * chronicTanMgPerL(water, present));
    }

    @Override
    public double acuteAveragingHours() {
        return c[22];
    }

    @Override
    public double chronicAveragingDays() {
        return c[23];
    }

    /** Where mussels are, they decide the chronic criterion, and early life stages of fish do not matter. */
    @Override
    public Set<SensitiveLife> heeded(Set<SensitiveLife> present) {
        return present.contains(SensitiveLife.MUSSELS)
                ? EnumSet.of(SensitiveLife.SALMONIDS, SensitiveLife.MUSSELS)
                : EnumSet.allOf(SensitiveLife.class);
    }

    @Override
    public boolean forSaltWater() {
        return false;
    }

    private double warmth(double temperatureC) {
        return StrictMath.pow(10, c[16] * (c[10] - temperatureC));
    }
}
