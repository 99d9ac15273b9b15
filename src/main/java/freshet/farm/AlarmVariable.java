package freshet.farm;

/** What a controller watches. */
public enum AlarmVariable {
    /** Total ammonia as N. */
    TAN,
    /** Nitrite as N. */
    NO2_N,
    /** Nitrate as N. */
    NO3_N,
    /** pH. */
    PH,
    /** Temperature. */
    TEMPERATURE,
    /** Dissolved oxygen. */
    DISSOLVED_OXYGEN,
    /** Total alkalinity. */
    ALKALINITY
}
