package freshet.nitrification;

/** What holds a filter back; of equal factors the first named here counts. */
public enum LimitingFactor {
    /** Too little water passes. */
    FLOW,
    /** Too little oxygen comes with the water. */
    OXYGEN_SUPPLY,
    /** Oxygen at the media. */
    OXYGEN,
    /** Alkalinity. */
    ALKALINITY,
    /** pH. */
    PH,
    /** Temperature. */
    TEMPERATURE,
    /** Organic carbon. */
    CARBON,
    /** Salinity. */
    SALINITY,
    /** The water is clean: the filter would do more if total ammonia rose. */
    TAN,
    /** The amount of media. */
    MEDIA
}
