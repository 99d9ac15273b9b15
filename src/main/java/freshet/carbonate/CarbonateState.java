package freshet.carbonate;

/**
 * Carbonate equilibrium of one water; mol/kg and eq/kg.
 *
 * @param ph pH on the scale that was asked for
 * @param alkalinity eq/kg
 * @param inorganicCarbon mol/kg
 * @param co2 dissolved carbon dioxide with carbonic acid, mol/kg
 * @param hco3 bicarbonate, mol/kg
 * @param co3 carbonate, mol/kg
 */
public record CarbonateState(
        double ph, double alkalinity, double inorganicCarbon, double co2, double hco3, double co3) {}
