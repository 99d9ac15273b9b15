package freshet.farm.web;

import freshet.answer.Fault;
import freshet.answer.FaultCode;
import freshet.answer.Refusal;
import freshet.farm.AlarmProfile;
import freshet.farm.AlarmVariable;
import freshet.farm.LimitPair;
import java.util.List;
import java.util.Locale;
import org.jspecify.annotations.Nullable;

/** The limits of a request: those of a profile, or the caller's own. */
record ChosenLimits(
        LimitPair ammonia,
        LimitPair nitrite,
        LimitPair nitrate,
        LimitPair phLower,
        LimitPair phUpper,
        LimitPair temperatureLower,
        LimitPair temperatureUpper,
        LimitPair oxygen,
        LimitPair alkalinity) {

    private static final List<String> NAMES = List.of("profile", "nh3_n_critical_mg_per_l", "nh3_n_caution_mg_per_l");

    ChosenLimits(AlarmSetpointsRequest request) {
        this(request.profile(), request.own(), request.variables());
    }

    private ChosenLimits(@Nullable AlarmProfile profile, OwnLimits own, List<AlarmVariable> variables) {
        this(
                profile == null ? own.ammonia() : profile.ammonia(),
                profile == null ? own.nitrite() : profile.nitrite(),
                profile == null ? own.nitrate() : profile.nitrate(),
                profile == null ? own.phLower() : profile.phLower(),
                profile == null ? own.phUpper() : profile.phUpper(),
                profile == null ? own.temperatureLower() : profile.temperatureLower(),
                profile == null ? own.temperatureUpper() : profile.temperatureUpper(),
                profile == null ? own.oxygen() : profile.oxygen(),
                profile == null ? own.alkalinity() : profile.alkalinity());
        if (profile != null && own.any()) {
            throw new Refusal(new Fault(
                            "profile",
                            FaultCode.CONFLICT,
                            "Give either a profile or limits of your own; together it would be unclear which holds.")
                    .allowing(NAMES));
        }
        if (profile == null && !own.any()) {
            throw new Refusal(new Fault(
                            "profile",
                            FaultCode.ONE_REQUIRED,
                            "Give a profile, or limits of your own such as nh3_n_critical_mg_per_l.")
                    .allowing(NAMES));
        }
        List<Fault> faults = own.outOfOrder();
        if (variables.size() < AlarmVariable.values().length) {
            variables.stream().filter(this::without).forEach(variable -> faults.add(missing(variable)));
        }
        if (!faults.isEmpty()) {
            throw new Refusal(faults);
        }
    }

    /** The variable as inputs and outputs spell it. */
    static String name(AlarmVariable variable) {
        return variable.name().toLowerCase(Locale.ROOT);
    }

    private boolean without(AlarmVariable variable) {
        return switch (variable) {
            case TAN -> ammonia.none();
            case NO2_N -> nitrite.none();
            case NO3_N -> nitrate.none();
            case PH -> phLower.none() && phUpper.none();
            case TEMPERATURE -> temperatureLower.none() && temperatureUpper.none();
            case DISSOLVED_OXYGEN -> oxygen.none();
            case ALKALINITY -> alkalinity.none();
        };
    }

    private static Fault missing(AlarmVariable variable) {
        String field = switch (variable) {
            case TAN -> "nh3_n_critical_mg_per_l";
            case NO2_N -> "no2_n_critical_mg_per_l";
            case NO3_N -> "no3_n_critical_mg_per_l";
            case PH -> "ph_upper_critical";
            case TEMPERATURE -> "temperature_upper_critical_c";
            case DISSOLVED_OXYGEN -> "dissolved_oxygen_critical_mg_per_l";
            case ALKALINITY -> "alkalinity_critical_mg_per_l_as_caco3";
        };
        return new Fault(
                field,
                FaultCode.MISSING,
                field + " is missing: variables asks for " + name(variable) + ", and there is no limit for it.");
    }
}
