package freshet.dilution;

import freshet.acidity.PhScale;
import freshet.carbonate.CarbonateState;
import freshet.carbonate.CarbonateSystem;
import freshet.carbonate.CarbonateWater;
import freshet.method.Citation;
import freshet.method.Method;
import freshet.method.Seen;
import freshet.substance.MolarMass;

/**
 * Tank water and source water mixed: at once, closed to the air, and hours later, when air and respiration have brought
 * carbon dioxide back to {@code settledCo2MgPerL}.
 *
 * @param tank the water of the tank
 * @param source the water that is added
 * @param settledCo2MgPerL dissolved carbon dioxide to which the mixture settles, mg/L
 * @param scale scale of every pH
 */
public record Blend(BlendedWater tank, BlendedWater source, double settledCo2MgPerL, PhScale scale) {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "blend-three-states",
                    "Mixing of tank and source water, at once and after carbon dioxide has settled",
                    Citation.withDoi(
                            "Freshet, blend; Munhoven 2013",
                            "A composite: salinity, alkalinity, inorganic carbon, ammonia and heat are conserved by mass; the"
                                    + " equilibrium is solved after Munhoven G. (2013) Geosci. Model Dev. 6:1367-1388",
                            "10.5194/gmd-6-1367-2013"),
                    Seen.SECONDARY)
            .equation(
                    "before: the tank; mixed: conserved quantities by mass, pH solved, closed to the air; settled: the same"
                            + " with CO2 brought back to that of the tank before, or to the value given; NH3-N as ammonia/speciation"
                            + " gives it; whether the exchange harms is judged by the worse of the last two")
            .accuracy(
                    "as carbonate-system; agrees with a geochemical model on mixtures of fresh waters within 0.01 in pH")
            .uses(CarbonateSystem.METHOD);

    /**
     * The mixture.
     *
     * @param water the mixed water, closed to the air
     * @param settled its equilibrium after carbon dioxide has settled
     */
    public record Mixture(BlendedWater water, CarbonateState settled) {}

    /** The mixture with {@code share} of its mass, 0 to 1, from the source. */
    public Mixture mixture(double share) {
        CarbonateWater water = tank.water().mixedWith(source.water(), share);
        BlendedWater mixed = new BlendedWater(water, water.state(scale));
        double co2 = mixed.litre().ofMilligrams(settledCo2MgPerL, MolarMass.CARBON_DIOXIDE);
        return new Mixture(mixed, water.settled(co2, scale));
    }

    /** The share of the mass when {@code tankL} and {@code sourceL} litres are mixed. */
    public double massShare(double tankL, double sourceL) {
        double sourceKg = sourceL * source.water().kgPerL();
        return sourceKg / (sourceKg + tankL * tank.water().kgPerL());
    }

    /** Un-ionized ammonia as N in the tank before, mg/L. */
    public double nh3NBeforeMgPerL() {
        return tank.nh3NMgPerL(tank.state().ph(), scale);
    }

    /** Un-ionized ammonia as N of a mixture, mg/L, in the worse of its two states. */
    public double worseNh3NMgPerL(Mixture mixture) {
        return Math.max(
                mixture.water().nh3NMgPerL(mixture.water().state().ph(), scale),
                mixture.water().nh3NMgPerL(mixture.settled().ph(), scale));
    }

    /** The change of pH from the tank to a mixture, in that of its two states that is farther off. */
    public double phChange(Mixture mixture) {
        double atOnce = mixture.water().state().ph() - tank.state().ph();
        double later = mixture.settled().ph() - tank.state().ph();
        return Math.abs(later) > Math.abs(atOnce) ? later : atOnce;
    }

    /** The change of temperature from the tank to a mixture, °C. */
    public double temperatureChangeC(Mixture mixture) {
        return mixture.water().water().temperatureC() - tank.water().temperatureC();
    }
}
