package freshet.farm.web;

import freshet.answer.Notice;
import freshet.farm.AlarmVariable;
import freshet.farm.GuardBand;
import freshet.farm.LimitPair;
import java.util.List;
import java.util.OptionalDouble;

/**
 * Moves limits inward by what the sensors do not know, and leaves out alarms that then cross.
 *
 * @param variables what is watched; others have no alarms
 * @param notices takes which alarms were left out
 */
record GuardedBands(List<AlarmVariable> variables, List<Notice> notices) {

    private static final OptionalDouble NONE = OptionalDouble.empty();

    boolean watched(AlarmVariable variable) {
        return variables.contains(variable);
    }

    Band concentration(AlarmVariable variable, LimitPair pair, double r) {
        return high(variable, pair.times(StrictMath.exp(-GuardBand.Z * r)), r);
    }

    Band high(AlarmVariable variable, LimitPair guarded, double r) {
        if (!watched(variable) || guarded.none()) {
            return Band.NOTHING;
        }
        double high = guarded.caution().orElse(guarded.critical().orElse(0));
        if (!(high > 0)
                || guarded.critical().isPresent()
                        && guarded.critical().getAsDouble() <= high
                        && guarded.caution().isPresent()) {
            return crossed(variable);
        }
        double deadband = Math.max(2 * r * high, GuardBand.LEAST_SHARE * high);
        return new Band(NONE, NONE, guarded.caution(), guarded.critical(), OptionalDouble.of(deadband));
    }

    Band low(AlarmVariable variable, LimitPair pair, double u, double floor, double r) {
        if (!watched(variable) || pair.none()) {
            return Band.NOTHING;
        }
        LimitPair guarded = pair.plus(GuardBand.Z * u).times(1 + GuardBand.Z * r);
        double low = guarded.caution().orElse(guarded.critical().orElse(0));
        if (!(low > 0)
                || guarded.critical().isPresent()
                        && guarded.critical().getAsDouble() >= low
                        && guarded.caution().isPresent()) {
            return crossed(variable);
        }
        double deadband = r > 0
                ? Math.max(2 * r * low, GuardBand.LEAST_SHARE * low)
                : Math.max(2 * u, floor > 0 ? floor : GuardBand.LEAST_SHARE * low);
        return new Band(guarded.critical(), guarded.caution(), NONE, NONE, OptionalDouble.of(deadband));
    }

    Band twoSided(AlarmVariable variable, LimitPair lower, LimitPair upper, double u, double floor) {
        if (!watched(variable) || lower.none() && upper.none()) {
            return Band.NOTHING;
        }
        LimitPair low = lower.plus(GuardBand.Z * u);
        LimitPair high = upper.plus(-GuardBand.Z * u);
        Band band = new Band(low.critical(), low.caution(), high.caution(), high.critical(), NONE);
        return band.inOrder() ? band.withDeadband(Math.max(2 * u, floor)) : crossed(variable);
    }

    private Band crossed(AlarmVariable variable) {
        notices.add(new Notice(
                "uncertainty-too-large",
                ChosenLimits.name(variable),
                "The sensor is too uncertain for these limits: after guarding the alarms cross or vanish. Calibrate."));
        return Band.NOTHING;
    }
}
