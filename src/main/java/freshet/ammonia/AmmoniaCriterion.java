package freshet.ammonia;

import freshet.method.Method;
import freshet.method.Validity;
import java.util.OptionalDouble;
import java.util.Set;

/**
 * A published criterion of total ammonia for the protection of animals in receiving waters. It is neither advice for a
 * culture tank nor a permit. Each concentration is an average that may be exceeded once in three years.
 */
public interface AmmoniaCriterion {

    /** The published method. */
    Method method();

    /**
     * Total ammonia as N, mg/L, that the average over {@link #acuteAveragingHours} should not exceed.
     *
     * @param water the water
     * @param present the sensitive animals in it
     */
    double acuteTanMgPerL(Water water, Set<SensitiveLife> present);

    /**
     * Total ammonia as N, mg/L, that the average over {@link #chronicAveragingDays} should not exceed.
     *
     * @param water the water
     * @param present the sensitive animals in it
     */
    double chronicTanMgPerL(Water water, Set<SensitiveLife> present);

    /** Total ammonia as N, mg/L, that no average over four days should exceed; empty where the criterion has none. */
    OptionalDouble chronicFourDayTanMgPerL(Water water, Set<SensitiveLife> present);

    /** Averaging period of the acute criterion, hours. */
    double acuteAveragingHours();

    /** Averaging period of the chronic criterion, days. */
    double chronicAveragingDays();

    /** The animals on whose presence this criterion depends, given that {@code present} are there. */
    Set<SensitiveLife> heeded(Set<SensitiveLife> present);

    /** Whether the criterion is for salt water, and so depends on salinity and pH scale. */
    boolean forSaltWater();

    /** Whether pH, temperature and salinity lie where the criterion is applied. */
    default Validity validity(Water water) {
        return Validity.of(ReceivingWater.PH, water.ph())
                .and(ReceivingWater.TEMPERATURE, water.temperatureC())
                .and(forSaltWater() ? ReceivingWater.SALT : ReceivingWater.FRESH, water.salinity());
    }
}
