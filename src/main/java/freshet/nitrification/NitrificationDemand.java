package freshet.nitrification;

import java.util.OptionalDouble;

/**
 * What the oxidation of ammonia to nitrate consumes and makes, g/day.
 *
 * <p>Alkalinity is gross from ammonium to nitrate. Fish excrete ammonia, which adds one equivalent per mole of nitrogen, so
 * that the whole way from feed to nitrate consumes the net figure only.
 *
 * @param oxygenGPerDay oxygen consumed
 * @param alkalinityGPerDayAsCaco3 alkalinity consumed, gross, as CaCO3
 * @param sodiumBicarbonateGPerDay sodium bicarbonate that replaces the gross alkalinity
 * @param netShare share of the gross alkalinity that excretion did not bring
 * @param carbonDioxideGPerDay carbon dioxide set free
 * @param no3NGPerDay nitrate made, as N
 * @param biomassGPerDay cells grown, dry mass
 */
public record NitrificationDemand(
        double oxygenGPerDay,
        double alkalinityGPerDayAsCaco3,
        double sodiumBicarbonateGPerDay,
        double netShare,
        double carbonDioxideGPerDay,
        double no3NGPerDay,
        double biomassGPerDay) {

    /** The demand of {@code tanGPerDay} of total ammonia as N, g/day. */
    public static NitrificationDemand of(double tanGPerDay, Stoichiometry stoichiometry) {
        return of(tanGPerDay, stoichiometry.reaction());
    }

    static NitrificationDemand of(double tanGPerDay, Reaction reaction) {
        return new NitrificationDemand(
                tanGPerDay * reaction.oxygenGPerG(),
                tanGPerDay * reaction.alkalinityGPerG(),
                tanGPerDay * reaction.bicarbonateGPerG(),
                reaction.netShare(),
                tanGPerDay * reaction.carbonDioxideGPerG(),
                tanGPerDay * reaction.nitrate(),
                tanGPerDay * reaction.biomassGPerG());
    }

    /** Alkalinity consumed from feed to nitrate, g/day as CaCO3. */
    public double netAlkalinityGPerDayAsCaco3() {
        return alkalinityGPerDayAsCaco3 * netShare;
    }

    /** Sodium bicarbonate that replaces the net alkalinity, g/day. */
    public double netSodiumBicarbonateGPerDay() {
        return sodiumBicarbonateGPerDay * netShare;
    }

    /** Days until the net consumption has used up {@code stock}; empty if nothing is consumed and there is a stock. */
    public OptionalDouble daysUntilExhausted(AlkalinityStock stock) {
        if (stock.exhausted()) {
            return OptionalDouble.of(0);
        }
        double net = netAlkalinityGPerDayAsCaco3();
        return net > 0 ? OptionalDouble.of(stock.availableGAsCaco3() / net) : OptionalDouble.empty();
    }
}
