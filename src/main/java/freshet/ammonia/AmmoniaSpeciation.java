package freshet.ammonia;

import freshet.substance.Basis;

/**
 * Total ammonia split into ammonia and ammonium.
 *
 * @param nh3NMgPerL un-ionized ammonia as N, mg/L
 * @param nh4NMgPerL ammonium as N, mg/L
 * @param nh3Fraction un-ionized share of the total, 0 to 1
 * @param pKa on the scale of the water's pH
 */
public record AmmoniaSpeciation(double nh3NMgPerL, double nh4NMgPerL, double nh3Fraction, double pKa) {

    /** Splits {@code tanMgPerL} of total ammonia as N. */
    public static AmmoniaSpeciation of(double tanMgPerL, Water water, AmmoniaDissociation dissociation) {
        double pKa = dissociation.pKa(water.temperatureC(), water.salinity(), water.scale());
        double ratio = AmmoniaDissociation.ammoniumPerAmmonia(pKa, water.ph());
        double fraction = 1 / (1 + ratio);
        return new AmmoniaSpeciation(tanMgPerL * fraction, tanMgPerL * (fraction * ratio), fraction, pKa);
    }

    /** Un-ionized ammonia as N, mg/L, by the default method for the salinity. */
    public static double nh3NMgPerL(double tanMgPerL, Water water) {
        AmmoniaDissociation dissociation =
                AmmoniaMethod.defaultFor(water.salinity()).dissociation();
        return of(tanMgPerL, water, dissociation).nh3NMgPerL();
    }

    /** Un-ionized ammonia as NH3, mg/L. */
    public double nh3MgPerL() {
        return Basis.nitrogenToAmmonia(nh3NMgPerL);
    }

    /** Ammonium as NH4, mg/L. */
    public double nh4MgPerL() {
        return Basis.nitrogenToAmmonium(nh4NMgPerL);
    }
}
