package freshet.nitrification;

/**
 * The factors of total ammonia and oxygen at one place; their product is {@code h(O) g(min(C, O/3.4))}, so oxygen never
 * counts twice.
 *
 * @param tanMgPerL total ammonia as N, mg/L
 * @param oxygenMgPerL oxygen at the media, mg/L
 */
record SubstrateKinetics(double tanMgPerL, double oxygenMgPerL) {

    private static final HalfOrder ORDER = HalfOrder.published();
    private static final OxygenLimit OXYGEN = OxygenLimit.published();

    /** Rate over plateau rate as if oxygen did not matter. */
    double tanFactor() {
        return ORDER.share(tanMgPerL);
    }

    /** What oxygen leaves of it. */
    double oxygenFactor() {
        double tanFactor = tanFactor();
        return tanFactor == 0 ? cut() : cut() * ORDER.share(effectiveTanMgPerL()) / tanFactor;
    }

    /** What is left at low oxygen whatever the ammonia. */
    double cut() {
        return OXYGEN.cut(oxygenMgPerL);
    }

    boolean oxygenLimited() {
        return OXYGEN.limits(tanMgPerL, oxygenMgPerL);
    }

    /** The most that the order of the reaction gives at this oxygen, whatever the ammonia. */
    double highestOrder() {
        return ORDER.share(OXYGEN.usableTanMgPerL(oxygenMgPerL));
    }

    private double effectiveTanMgPerL() {
        return Math.min(tanMgPerL, OXYGEN.usableTanMgPerL(oxygenMgPerL));
    }
}
