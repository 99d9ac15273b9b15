package freshet.nitrification;

/**
 * The water of a biofilter.
 *
 * @param ph pH (NBS)
 * @param temperatureC temperature, °C
 * @param salinity practical salinity
 * @param tanMgPerL total ammonia as N of the water entering the filter, mg/L
 * @param dissolvedOxygenMgPerL oxygen at the media, mg/L
 * @param alkalinityMgPerLAsCaco3 total alkalinity, mg/L as CaCO3
 * @param carbonToNitrogen biodegradable organic carbon per total ammonia nitrogen, g/g
 */
public record FilterWater(
        double ph,
        double temperatureC,
        double salinity,
        double tanMgPerL,
        double dissolvedOxygenMgPerL,
        double alkalinityMgPerLAsCaco3,
        double carbonToNitrogen) {

    /** Whether oxygen is below the minimum at the media. */
    public boolean oxygenCritical() {
        return OxygenLimit.published().critical(dissolvedOxygenMgPerL);
    }

    /** Whether a film grown at this pH may do more than one that was not. */
    public boolean favoursAcclimatedFilm() {
        return ph < PhFactor.ACCLIMATED_BELOW;
    }
}
