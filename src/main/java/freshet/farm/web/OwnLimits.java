package freshet.farm.web;

import freshet.answer.Fault;
import freshet.answer.FaultCode;
import freshet.farm.LimitPair;
import freshet.quantity.Alkalinity;
import freshet.quantity.Concentration;
import freshet.quantity.DissolvedOxygen;
import freshet.quantity.Nitrate;
import freshet.quantity.Nitrite;
import freshet.quantity.Ph;
import freshet.quantity.Temperature;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;

/** Limits of the caller's own, instead of a profile; where only the critical one is given the caution one lies inside it. */
record OwnLimits(
        @Concentration("Own caution limit of un-ionized ammonia as N") @Nullable
        Double nh3NCautionMgPerL,

        @Concentration("Own critical limit of un-ionized ammonia as N") @Nullable
        Double nh3NCriticalMgPerL,

        @Nitrite("Own caution limit of nitrite as N") @Nullable
        Double no2NCautionMgPerL,

        @Nitrite("Own critical limit of nitrite as N") @Nullable
        Double no2NCriticalMgPerL,

        @Nitrate("Own caution limit of nitrate as N") @Nullable
        Double no3NCautionMgPerL,

        @Nitrate("Own critical limit of nitrate as N") @Nullable
        Double no3NCriticalMgPerL,

        @Ph("Own lower caution limit of pH") @Nullable Double phLowerCaution,

        @Ph("Own lower critical limit of pH") @Nullable Double phLowerCritical,

        @Ph("Own upper caution limit of pH") @Nullable Double phUpperCaution,

        @Ph("Own upper critical limit of pH") @Nullable Double phUpperCritical,

        @Temperature("Own lower caution limit of temperature") @Nullable
        Double temperatureLowerCautionC,

        @Temperature("Own lower critical limit of temperature") @Nullable
        Double temperatureLowerCriticalC,

        @Temperature("Own upper caution limit of temperature") @Nullable
        Double temperatureUpperCautionC,

        @Temperature("Own upper critical limit of temperature") @Nullable
        Double temperatureUpperCriticalC,

        @DissolvedOxygen("Own caution limit of dissolved oxygen") @Nullable
        Double dissolvedOxygenCautionMgPerL,

        @DissolvedOxygen("Own critical limit of dissolved oxygen") @Nullable
        Double dissolvedOxygenCriticalMgPerL,

        @Alkalinity("Own caution limit of total alkalinity as CaCO3") @Nullable
        Double alkalinityCautionMgPerLAsCaco3,

        @Alkalinity("Own critical limit of total alkalinity as CaCO3") @Nullable
        Double alkalinityCriticalMgPerLAsCaco3) {

    private static final double INSIDE = 0.8;
    private static final double INSIDE_PH = 0.2;
    private static final double INSIDE_C = 1;

    /** Whether any limit is given. */
    boolean any() {
        return Stream.of(
                        ammonia(),
                        nitrite(),
                        nitrate(),
                        phLower(),
                        phUpper(),
                        temperatureLower(),
                        temperatureUpper(),
                        oxygen(),
                        alkalinity())
                .anyMatch(pair -> !pair.none());
    }

    /** Cautions that do not come before their critical alarm. */
    List<Fault> outOfOrder() {
        List<Fault> faults = new ArrayList<>();
        below("nh3_n_caution_mg_per_l", nh3NCautionMgPerL, nh3NCriticalMgPerL, faults);
        below("no2_n_caution_mg_per_l", no2NCautionMgPerL, no2NCriticalMgPerL, faults);
        below("no3_n_caution_mg_per_l", no3NCautionMgPerL, no3NCriticalMgPerL, faults);
        below("ph_upper_caution", phUpperCaution, phUpperCritical, faults);
        below("temperature_upper_caution_c", temperatureUpperCautionC, temperatureUpperCriticalC, faults);
        above("ph_lower_caution", phLowerCaution, phLowerCritical, faults);
        above("temperature_lower_caution_c", temperatureLowerCautionC, temperatureLowerCriticalC, faults);
        above("dissolved_oxygen_caution_mg_per_l", dissolvedOxygenCautionMgPerL, dissolvedOxygenCriticalMgPerL, faults);
        above(
                "alkalinity_caution_mg_per_l_as_caco3",
                alkalinityCautionMgPerLAsCaco3,
                alkalinityCriticalMgPerLAsCaco3,
                faults);
        return faults;
    }

    private static void below(String name, @Nullable Double caution, @Nullable Double critical, List<Fault> faults) {
        if (caution != null && critical != null && caution >= critical) {
            faults.add(outOfOrder(name, "below"));
        }
    }

    private static void above(String name, @Nullable Double caution, @Nullable Double critical, List<Fault> faults) {
        if (caution != null && critical != null && caution <= critical) {
            faults.add(outOfOrder(name, "above"));
        }
    }

    private static Fault outOfOrder(String name, String side) {
        return new Fault(
                name,
                FaultCode.INCONSISTENT,
                name + " must lie " + side + " " + name.replace("caution", "critical")
                        + ": a caution comes before the critical alarm.");
    }

    LimitPair ammonia() {
        return pair(nh3NCautionMgPerL, nh3NCriticalMgPerL).cautionAtShare(INSIDE);
    }

    LimitPair nitrite() {
        return pair(no2NCautionMgPerL, no2NCriticalMgPerL).cautionAtShare(INSIDE);
    }

    LimitPair nitrate() {
        return pair(no3NCautionMgPerL, no3NCriticalMgPerL).cautionAtShare(INSIDE);
    }

    LimitPair phLower() {
        return pair(phLowerCaution, phLowerCritical).cautionAtDistance(INSIDE_PH);
    }

    LimitPair phUpper() {
        return pair(phUpperCaution, phUpperCritical).cautionAtDistance(-INSIDE_PH);
    }

    LimitPair temperatureLower() {
        return pair(temperatureLowerCautionC, temperatureLowerCriticalC).cautionAtDistance(INSIDE_C);
    }

    LimitPair temperatureUpper() {
        return pair(temperatureUpperCautionC, temperatureUpperCriticalC).cautionAtDistance(-INSIDE_C);
    }

    LimitPair oxygen() {
        return pair(dissolvedOxygenCautionMgPerL, dissolvedOxygenCriticalMgPerL).cautionAtShare(1 / INSIDE);
    }

    LimitPair alkalinity() {
        return pair(alkalinityCautionMgPerLAsCaco3, alkalinityCriticalMgPerLAsCaco3)
                .cautionAtShare(1 / INSIDE);
    }

    private static LimitPair pair(@Nullable Double caution, @Nullable Double critical) {
        return new LimitPair(optional(caution), optional(critical));
    }

    private static OptionalDouble optional(@Nullable Double value) {
        return value == null ? OptionalDouble.empty() : OptionalDouble.of(value);
    }
}
