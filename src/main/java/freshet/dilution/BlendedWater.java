package freshet.dilution;

import freshet.acidity.PhScale;
import freshet.ammonia.AmmoniaSpeciation;
import freshet.ammonia.Water;
import freshet.carbonate.CarbonateSolver;
import freshet.carbonate.CarbonateState;
import freshet.carbonate.CarbonateWater;
import freshet.carbonate.Litre;
import freshet.substance.MolarMass;

/**
 * One of the waters that are mixed, or their mixture.
 *
 * @param water what is conserved
 * @param state its equilibrium, closed to the air
 */
public record BlendedWater(CarbonateWater water, CarbonateState state) {

    /** A water by what is measured of it; {@code tanMgPerL} is as N, {@code alkalinityMgPerL} as CaCO3. */
    public static BlendedWater measured(Water sample, double alkalinityMgPerL, double tanMgPerL) {
        Litre litre = Litre.of(sample.temperatureC(), sample.salinity());
        double tan = litre.ofMilligrams(tanMgPerL, MolarMass.NITROGEN);
        CarbonateState state = CarbonateSolver.of(sample.temperatureC(), sample.salinity(), sample.scale(), tan)
                .ofPhAndAlkalinity(sample.ph(), litre.alkalinity(alkalinityMgPerL));
        CarbonateWater water = new CarbonateWater(
                sample.temperatureC(), sample.salinity(), state.alkalinity(), state.inorganicCarbon(), tan);
        return new BlendedWater(water, state);
    }

    /** A litre of it. */
    public Litre litre() {
        return new Litre(water.kgPerL());
    }

    /** Total ammonia as N, mg/L. */
    public double tanMgPerL() {
        return litre().milligrams(water.tan(), MolarMass.NITROGEN);
    }

    /** Un-ionized ammonia as N, mg/L, at a pH on {@code scale}, as {@code ammonia/speciation} gives it. */
    public double nh3NMgPerL(double ph, PhScale scale) {
        return AmmoniaSpeciation.nh3NMgPerL(tanMgPerL(), new Water(ph, water.temperatureC(), water.salinity(), scale));
    }

    /** Dissolved carbon dioxide, mg/L. */
    public double co2MgPerL() {
        return litre().milligrams(state.co2(), MolarMass.CARBON_DIOXIDE);
    }
}
