package freshet.nitrification;

import freshet.method.Validity;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The total ammonia that a filter must oxidize.
 *
 * @param tanGPerDay daily mean as N, g/day
 * @param peakFactor rate at the daily peak over the mean; empty where the load did not come from feed
 * @param ration the feed it came from; empty where the load was given as such
 */
public record TanLoad(double tanGPerDay, OptionalDouble peakFactor, Optional<Ration> ration) {

    /** A load given as such, g/day as N. */
    public static TanLoad given(double tanGPerDay) {
        return new TanLoad(tanGPerDay, OptionalDouble.empty(), Optional.empty());
    }

    /** The load from feed by {@link ProteinCoefficient}, solids removed. */
    public static TanLoad of(Ration ration, Meals meals) {
        return new TanLoad(
                ProteinCoefficient.tanGPerDay(ration), OptionalDouble.of(meals.peakFactor()), Optional.of(ration));
    }

    /** Whether the feed lies within the range of the method that gave the load. */
    public Validity validity() {
        return ration.map(Ration::validity).orElse(Validity.WITHIN);
    }
}
