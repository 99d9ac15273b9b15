package freshet.nitrification;

import freshet.answer.Fault;
import freshet.answer.FaultCode;
import freshet.answer.Refusal;
import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Seen;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;

/**
 * The media and flow that a load needs. The lower amount is the optimistic end: it takes the upper rate.
 *
 * @param rate what a unit of media does at the design conditions
 * @param specificSurfaceM2PerM3 surface per bulk volume of media; empty if not known
 * @param amount media in the unit of the rate, m2 or m3
 * @param lower the same at the upper rate; empty where the rate has no published spread
 * @param upper the same at the lower rate; empty where the rate has no published spread
 * @param flowLPerHour water through the filter, L/h
 */
public record BiofilterSizing(
        Rate rate,
        OptionalDouble specificSurfaceM2PerM3,
        OptionalDouble amount,
        OptionalDouble lower,
        OptionalDouble upper,
        double flowLPerHour) {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "biofilter-sizing",
                    "Media and flow that a load of total ammonia needs",
                    Citation.withoutDoi(
                            "Freshet, biofilter sizing (composite)",
                            "This project's construction: the rate of biofilter-capacity turned round, with a margin"),
                    Seen.SECONDARY)
            .equation(
                    "media = load m/rate; flow = load m/(C eta), or that which brings the oxygen; m = max(safety factor,"
                            + " daily peak of the meals)",
                    new Constant("m", 1.5, "1", "safety factor unless another is given, this project's judgement"))
            .within(TemperatureCredit.TEMPERATURE, PhFactor.PH, Ration.PROTEIN)
            .accuracy("published rates spread five- to tenfold: see the lower and upper amounts")
            .errata("the safety factor and the daily peak are not multiplied with each other")
            .uses(BiofilterCapacity.METHOD);

    /** The safety factor unless the caller gives another. */
    static final double USUAL_SAFETY = METHOD.values()[0];

    /**
     * The filter for {@code goal} at the design conditions.
     *
     * @throws Refusal where no amount of media or of water suffices
     */
    public static BiofilterSizing of(
            SizingGoal goal, ReferenceRate reference, FilterWater water, TemperatureMethod temperature) {
        Rate rate = reference.in(water, temperature);
        List<Fault> faults = faults(goal, rate, reference.perVolume());
        if (!faults.isEmpty()) {
            throw new Refusal(faults);
        }
        double design = goal.designTanGPerDay();
        return new BiofilterSizing(
                rate,
                goal.specificSurfaceM2PerM3(),
                OptionalDouble.of(design / rate.estimate()),
                rate.upper().stream().map(high -> design / high).findFirst(),
                rate.lower().stream().map(low -> design / low).findFirst(),
                goal.flow().litresPerHour(design, water.tanMgPerL()));
    }

    /** {@code media}, in the unit of the rate, as a surface, m2; empty for media that are rated by volume. */
    public OptionalDouble areaM2(OptionalDouble media) {
        return rate.perVolume() ? OptionalDouble.empty() : media;
    }

    /** {@code media}, in the unit of the rate, as a bulk volume, m3; empty if the specific surface is not known. */
    public OptionalDouble volumeM3(OptionalDouble media) {
        return media.isEmpty()
                ? media
                : new MediaAmount(media.getAsDouble(), rate.perVolume()).in(true, specificSurfaceM2PerM3);
    }

    private static List<Fault> faults(SizingGoal goal, Rate rate, boolean perVolume) {
        List<Fault> faults = new ArrayList<>(0);
        rate.factors().zeros().forEach(zero -> faults.add(nothingGrows(zero)));
        if (faults.isEmpty() && rate.estimate() == 0) {
            faults.add(new Fault(
                    perVolume ? "reference_rate_g_per_m3_per_day" : "reference_rate_g_per_m2_per_day",
                    FaultCode.UNREACHABLE,
                    "The reference rate is 0: no amount of media suffices."));
        }
        if (goal.flow().removal().estimate() == 0) {
            faults.add(new Fault(
                    "removal_per_pass_percent",
                    FaultCode.UNREACHABLE,
                    "With nothing removed in a pass no flow suffices."));
        }
        if (!goal.flow().bringsOxygen()) {
            faults.add(new Fault(
                    "inflow_dissolved_oxygen_mg_per_l",
                    FaultCode.UNREACHABLE,
                    "Water entering with 2 mg/L of oxygen or less brings none for nitrification: no flow suffices."));
        }
        return faults;
    }

    private static Fault nothingGrows(LimitingFactor factor) {
        String field = switch (factor) {
            case OXYGEN -> "dissolved_oxygen_mg_per_l";
            case ALKALINITY -> "alkalinity_mg_per_l_as_caco3";
            case TEMPERATURE -> "temperature_c";
            case TAN -> "tan_mg_per_l";
            default -> factor.name().toLowerCase(Locale.ROOT);
        };
        return new Fault(
                field,
                FaultCode.UNREACHABLE,
                "At this " + field + " the " + factor.name().toLowerCase(Locale.ROOT)
                        + " factor is 0: no amount of media suffices.");
    }
}
