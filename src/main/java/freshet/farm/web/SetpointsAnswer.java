package freshet.farm.web;

import freshet.ammonia.AmmoniaMethod;
import freshet.ammonia.Water;
import freshet.answer.Answer;
import freshet.answer.Notice;
import freshet.farm.AlarmProfile;
import freshet.farm.AlarmVariable;
import freshet.farm.GuardBand;
import freshet.farm.LimitPair;
import freshet.quantity.Sample;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** Puts together the answer on alarm set-points. */
final class SetpointsAnswer {

    /** How far a caution limit lies inside a critical one that neither profile nor caller has paired with it. */
    private static final double CAUTION_SHARE = 0.8;

    private static final double CAUTION_INSIDE_PH = 0.2;
    /** Salinity from which chloride, more than 2500 mg/L of it, binds no limit of nitrite. */
    private static final double MUCH_CHLORIDE_SALINITY = 5;

    private final AlarmSetpointsRequest request;
    private final SensorUncertainties sensors;
    private final ChosenLimits limits;
    private final GuardBand guard;
    private final List<Notice> notices = new ArrayList<>();
    private final GuardedBands bands;

    private SetpointsAnswer(AlarmSetpointsRequest request) {
        this.request = request;
        sensors = request.uncertainties();
        limits = new ChosenLimits(request);
        bands = new GuardedBands(request.variables(), notices);
        Sample sample = request.sample();
        guard = new GuardBand(new Water(sample.ph(), sample.temperatureC(), sample.salinity(), sample.scale()));
    }

    static Answer<AlarmSetpointsResponse> to(AlarmSetpointsRequest request) {
        return new SetpointsAnswer(request).answer();
    }

    private Answer<AlarmSetpointsResponse> answer() {
        Band tan = tan();
        Band nitrite = nitrite();
        Band nitrate = bands.concentration(
                AlarmVariable.NO3_N, limits.nitrate(), sensors.no3NRelativeStandardUncertaintyPercent() / 100);
        Band ph = ph();
        Band temperature = bands.twoSided(
                AlarmVariable.TEMPERATURE,
                limits.temperatureLower(),
                limits.temperatureUpper(),
                sensors.temperatureStandardUncertaintyC(),
                GuardBand.LEAST_TEMPERATURE_C);
        Band oxygen = bands.low(
                AlarmVariable.DISSOLVED_OXYGEN,
                limits.oxygen(),
                sensors.dissolvedOxygenStandardUncertaintyMgPerL(),
                GuardBand.LEAST_OXYGEN,
                0);
        Band alkalinity = bands.low(
                AlarmVariable.ALKALINITY,
                limits.alkalinity(),
                0,
                0,
                sensors.alkalinityRelativeStandardUncertaintyPercent() / 100);
        RefreshValues refresh =
                bands.watched(AlarmVariable.TAN) && !limits.ammonia().none()
                        ? RefreshValues.of(guard, request.refreshPercent() / 100, notices)
                        : RefreshValues.NOTHING;
        conditional();
        AlarmSetpointsResponse response = new AlarmSetpointsResponse(
                tan.high(),
                tan.highHigh(),
                tan.deadband(),
                nitrite.high(),
                nitrite.highHigh(),
                nitrite.deadband(),
                nitrate.high(),
                nitrate.highHigh(),
                nitrate.deadband(),
                ph.lowLow(),
                ph.low(),
                ph.high(),
                ph.highHigh(),
                ph.deadband(),
                temperature.lowLow(),
                temperature.low(),
                temperature.high(),
                temperature.highHigh(),
                temperature.deadband(),
                oxygen.lowLow(),
                oxygen.low(),
                oxygen.deadband(),
                alkalinity.lowLow(),
                alkalinity.low(),
                alkalinity.deadband(),
                refresh.phAbove(),
                refresh.phBelow(),
                refresh.temperatureAboveC(),
                refresh.temperatureBelowC());
        return new Answer<>(
                response,
                GuardBand.METHOD,
                guard.dissociation()
                        .validity(
                                request.sample().temperatureC(),
                                request.sample().salinity()),
                notices);
    }

    private Band tan() {
        double u = guard.relativeUncertainty(
                sensors.tanRelativeStandardUncertaintyPercent() / 100,
                sensors.phStandardUncertainty(),
                sensors.temperatureStandardUncertaintyC());
        LimitPair guarded = limits.ammonia().times(StrictMath.exp(-GuardBand.Z * u) / guard.fraction());
        return bands.high(AlarmVariable.TAN, guarded, sensors.tanRelativeStandardUncertaintyPercent() / 100);
    }

    private Band nitrite() {
        double r = sensors.no2NRelativeStandardUncertaintyPercent() / 100;
        Double chloride = request.chlorideMgPerL();
        AlarmProfile profile = request.profile();
        LimitPair pair = limits.nitrite();
        if (chloride != null && profile != null) {
            double bound = chloride / profile.chlorideRatio();
            if (bound < pair.critical().orElse(0)) {
                double c = sensors.chlorideRelativeStandardUncertaintyPercent() / 100;
                return bands.concentration(
                        AlarmVariable.NO2_N,
                        LimitPair.of(Math.min(pair.caution().orElse(bound), CAUTION_SHARE * bound), bound),
                        StrictMath.sqrt(r * r + c * c));
            }
        } else if (profile != null
                && bands.watched(AlarmVariable.NO2_N)
                && request.sample().salinity() < MUCH_CHLORIDE_SALINITY) {
            notices.add(
                    new Notice(
                            "chloride-not-given",
                            "chloride_mg_per_l",
                            "In water poor in chloride nitrite kills far below the profile's limit: measure chloride, and give it."));
        } else if (chloride != null && profile == null) {
            notices.add(new Notice(
                    "input-not-used",
                    "chloride_mg_per_l",
                    "With limits of your own there is no ratio to use chloride with."));
        }
        return bands.concentration(AlarmVariable.NO2_N, pair, r);
    }

    private Band ph() {
        LimitPair lower = limits.phLower();
        LimitPair upper = limits.phUpper();
        double guardBand = GuardBand.Z * sensors.phStandardUncertainty();
        Double tan = request.tanMgPerL();
        OptionalDouble critical = limits.ammonia().critical();
        if (tan != null && critical.isPresent() && bands.watched(AlarmVariable.PH)) {
            double share = critical.getAsDouble() / tan;
            double bound = share > 0 && share < 1 ? guard.phAt(share) : Double.POSITIVE_INFINITY;
            if (bound < upper.critical().orElse(Double.POSITIVE_INFINITY)) {
                upper = LimitPair.of(Math.min(upper.caution().orElse(bound), bound - CAUTION_INSIDE_PH), bound);
                notices.add(new Notice(
                        "ph-bound-by-ammonia",
                        "ph_high_high",
                        "At this pH the present total ammonia meets its critical limit: pH is the live alarm."));
                if (bound < request.sample().ph()) {
                    notices.add(
                            0,
                            new Notice(
                                    "ammonia-above-critical",
                                    "tan_mg_per_l",
                                    "The total ammonia given is above its critical limit at the pH given, now: act, do not wait for alarms."));
                }
                if (bound - CAUTION_INSIDE_PH - guardBand
                        <= lower.caution().orElse(Double.NEGATIVE_INFINITY) + guardBand) {
                    // The high alarm is the one that saves the fish; no pH is left between it and the low one.
                    lower = LimitPair.NONE;
                }
            }
        }
        return bands.twoSided(AlarmVariable.PH, lower, upper, sensors.phStandardUncertainty(), GuardBand.LEAST_PH);
    }

    private void conditional() {
        if (bands.watched(AlarmVariable.TAN)) {
            notices.add(new Notice(
                    "limit-conditional",
                    "tan_high_mg_per_l",
                    "For this pH and temperature: ask again at the refresh values, at half of each if both drift."));
        }
        Sample sample = request.sample();
        if (sample.salinity() > AmmoniaMethod.FRESH_SALINITY && sample.phScale() == null) {
            notices.add(new Notice(
                    "ph-scale-assumed-nbs",
                    "ph_scale",
                    "ph was taken as a reading of a probe on NBS or IUPAC buffers."));
        }
    }
}
