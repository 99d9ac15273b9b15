package freshet.carbonate;

import freshet.acidity.PhScale;
import freshet.salinity.MilleroPoisson1981;

/**
 * What is conserved when waters mix, closed to the air.
 *
 * @param temperatureC °C
 * @param salinity practical salinity
 * @param alkalinity eq/kg
 * @param inorganicCarbon mol/kg
 * @param tan total ammonia, mol/kg
 */
public record CarbonateWater(
        double temperatureC, double salinity, double alkalinity, double inorganicCarbon, double tan) {

    /** Density, kg/L. */
    public double kgPerL() {
        return kgPerL(temperatureC, salinity);
    }

    /** Density at °C and practical salinity, kg/L. */
    static double kgPerL(double temperatureC, double salinity) {
        return MilleroPoisson1981.kgPerM3(temperatureC, salinity) / 1000;
    }

    /** This with {@code share} of its mass (0 to 1) replaced by the other water. */
    public CarbonateWater mixedWith(CarbonateWater other, double share) {
        return new CarbonateWater(
                mixed(temperatureC, other.temperatureC, share),
                mixed(salinity, other.salinity, share),
                mixed(alkalinity, other.alkalinity, share),
                mixed(inorganicCarbon, other.inorganicCarbon, share),
                mixed(tan, other.tan, share));
    }

    private static double mixed(double own, double other, double share) {
        return own + share * (other - own);
    }

    /** The equilibrium of this water, with pH on {@code scale}. */
    public CarbonateState state(PhScale scale) {
        CarbonateSolver solver = new CarbonateSolver(AcidBase.of(temperatureC, salinity), scale, tan);
        return solver.ofAlkalinityAndCarbon(alkalinity, inorganicCarbon);
    }

    /** The equilibrium after air and respiration have brought carbon dioxide to {@code co2}, mol/kg. */
    public CarbonateState settled(double co2, PhScale scale) {
        CarbonateSolver solver = new CarbonateSolver(AcidBase.of(temperatureC, salinity), scale, tan);
        return solver.ofAlkalinityAndCo2(alkalinity, co2);
    }
}
