package freshet.ammonia;

/** Animals whose presence decides which form of a criterion holds. */
public enum SensitiveLife {
    /** Salmon and trout; in the criteria of 2013 those of the genus Oncorhynchus. */
    SALMONIDS,
    /** Fresh-water mussels. */
    MUSSELS,
    /** Early life stages of fish. */
    EARLY_LIFE_STAGES
}
