package freshet.nitrate;

import java.util.OptionalDouble;

/**
 * Whether and when a tank meets a limit of nitrate, as N.
 *
 * @param tank the tank
 * @param limitMgPerL the limit, mg/L
 */
public record NitrateLimit(MixedTank tank, double limitMgPerL) {

    /** How the path of nitrate, which only rises or only falls, lies to the limit. */
    public enum Outcome {
        /** Below now, and the limit will be passed. */
        REACHED,
        /** Below now, and the limit is never passed; at most approached. */
        NEVER,
        /** Above now, and it stays so. */
        ALREADY_ABOVE,
        /** At the limit now. */
        AT_LIMIT,
        /** Above now, and it will fall below. */
        FALLS_BELOW
    }

    /** What becomes of the limit. */
    public Outcome outcome() {
        double now = tank.nowMgPerL();
        if (now == limitMgPerL) {
            return Outcome.AT_LIMIT;
        }
        OptionalDouble plateau = tank.plateauMgPerL();
        if (now < limitMgPerL) {
            return plateau.isEmpty() || plateau.getAsDouble() > limitMgPerL ? Outcome.REACHED : Outcome.NEVER;
        }
        return plateau.isPresent() && plateau.getAsDouble() < limitMgPerL ? Outcome.FALLS_BELOW : Outcome.ALREADY_ABOVE;
    }

    /** When the limit is passed, days; empty if it never is. */
    public OptionalDouble days() {
        return switch (outcome()) {
            case REACHED, FALLS_BELOW -> OptionalDouble.of(tank.daysTo(limitMgPerL));
            case AT_LIMIT -> OptionalDouble.of(0);
            case NEVER, ALREADY_ABOVE -> OptionalDouble.empty();
        };
    }

    /**
     * The whole exchange, L/day, that makes the plateau equal the limit; empty if the source water is not below the
     * limit.
     */
    public OptionalDouble exchangeLPerDay() {
        double surplus = tank.sources().surplusGPerDay();
        if (surplus <= 0) {
            return OptionalDouble.of(0);
        }
        double margin = limitMgPerL - tank.sources().sourceMgPerL();
        return margin > 0 ? OptionalDouble.of(1000 * surplus / margin) : OptionalDouble.empty();
    }
}
