package freshet.ammonia;

/** Published criteria of total ammonia. */
public enum TanGuideline {
    /** {@link UsEpa2013}. */
    USEPA_2013(new UsEpa2013()),
    /** {@link UsEpa1999}. */
    USEPA_1999(new UsEpa1999()),
    /** {@link UsEpa1989Saltwater}. */
    USEPA_1989_SALTWATER(new UsEpa1989Saltwater());

    private final AmmoniaCriterion criterion;

    TanGuideline(AmmoniaCriterion criterion) {
        this.criterion = criterion;
    }

    /** The criterion itself. */
    public AmmoniaCriterion criterion() {
        return criterion;
    }
}
