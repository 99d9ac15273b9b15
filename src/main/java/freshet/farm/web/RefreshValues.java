package freshet.farm.web;

import freshet.answer.Notice;
import freshet.farm.GuardBand;
import java.util.List;
import java.util.OptionalDouble;

/** Where the limit of total ammonia has changed so far that it must be asked for again. */
record RefreshValues(
        OptionalDouble phAbove,
        OptionalDouble phBelow,
        OptionalDouble temperatureAboveC,
        OptionalDouble temperatureBelowC) {

    static final RefreshValues NOTHING = new RefreshValues(
            OptionalDouble.empty(), OptionalDouble.empty(), OptionalDouble.empty(), OptionalDouble.empty());

    private static final double HIGHEST_PH = 14;

    static RefreshValues of(GuardBand guard, double change, List<Notice> notices) {
        double above = guard.fraction() / (1 - change);
        double below = guard.fraction() / (1 + change);
        RefreshValues values = new RefreshValues(
                ph(guard, above),
                ph(guard, below),
                above < 1 ? guard.temperatureAt(above) : OptionalDouble.empty(),
                guard.temperatureAt(below));
        if (values.phAbove.isEmpty()
                || values.phBelow.isEmpty()
                || values.temperatureAboveC.isEmpty()
                || values.temperatureBelowC.isEmpty()) {
            notices.add(
                    new Notice(
                            "refresh-not-reached",
                            "refresh_percent",
                            "Within pH 0 to 14 and -2 to 60 °C the limit does not change by so much where a value is left out."));
        }
        return values;
    }

    private static OptionalDouble ph(GuardBand guard, double fraction) {
        double ph = fraction > 0 && fraction < 1 ? guard.phAt(fraction) : -1;
        return ph >= 0 && ph <= HIGHEST_PH ? OptionalDouble.of(ph) : OptionalDouble.empty();
    }
}
