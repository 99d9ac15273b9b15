package freshet.ammonia;

/** The dissociation constants a caller may choose between. */
public enum AmmoniaMethod {
    /** {@link Emerson1975}. */
    EMERSON_1975(new Emerson1975()),
    /** {@link CleggWhitfield1995}. */
    CLEGG_WHITFIELD_1995(new CleggWhitfield1995()),
    /** {@link YaoMillero1995}. */
    YAO_MILLERO_1995(new YaoMillero1995());

    /** Highest practical salinity that is taken for fresh water. */
    public static final double FRESH_SALINITY = 0.5;

    private final AmmoniaDissociation dissociation;

    AmmoniaMethod(AmmoniaDissociation dissociation) {
        this.dissociation = dissociation;
    }

    /** The method for a practical salinity when the caller names none. */
    public static AmmoniaMethod defaultFor(double salinity) {
        return salinity <= FRESH_SALINITY ? EMERSON_1975 : CLEGG_WHITFIELD_1995;
    }

    /** The constant itself. */
    public AmmoniaDissociation dissociation() {
        return dissociation;
    }
}
