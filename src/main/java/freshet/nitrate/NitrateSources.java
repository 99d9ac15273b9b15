package freshet.nitrate;

/**
 * What brings nitrate into a tank and what takes it out.
 *
 * @param productionGPerDay nitrate nitrogen made by nitrification, g/day
 * @param denitrifiedShare share of the production that is denitrified, 0 to 1
 * @param uptakeGPerDay nitrate nitrogen taken up by plants while there is any, g/day
 * @param exchangeLPerDay water discharged and replaced, L/day
 * @param evaporationLPerDay evaporation that is topped up, L/day; removes no nitrate
 * @param sourceMgPerL nitrate of the water that replaces and tops up, as N, mg/L
 */
public record NitrateSources(
        double productionGPerDay,
        double denitrifiedShare,
        double uptakeGPerDay,
        double exchangeLPerDay,
        double evaporationLPerDay,
        double sourceMgPerL) {

    /** What stays of the production, with what the topping-up brings, g/day. */
    public double keptGPerDay() {
        return productionGPerDay * (1 - denitrifiedShare) + evaporationLPerDay * sourceMgPerL / 1000;
    }

    /** What stays less what plants take, g/day; negative when the plants could take more. */
    public double surplusGPerDay() {
        return keptGPerDay() - uptakeGPerDay;
    }
}
