package freshet.carbonate;

import freshet.substance.MolarMass;

/**
 * Amounts in a litre of one water and in a kilogram of it.
 *
 * @param kgPerL density, kg/L
 */
public record Litre(double kgPerL) {

    private static final double PER_KILO = 1000;
    private static final double PER_MEGA = 1e6;

    /** A litre of water at °C and practical salinity. */
    public static Litre of(double temperatureC, double salinity) {
        return new Litre(CarbonateWater.kgPerL(temperatureC, salinity));
    }

    /** Alkalinity in eq/kg, from mg/L as CaCO3. */
    public double alkalinity(double mgPerLAsCaco3) {
        return mgPerLAsCaco3 / MolarMass.CALCIUM_CARBONATE_EQUIVALENT / PER_KILO / kgPerL;
    }

    /** Alkalinity in mg/L as CaCO3, from eq/kg. */
    public double alkalinityMgPerL(double eqPerKg) {
        return eqPerKg * PER_KILO * kgPerL * MolarMass.CALCIUM_CARBONATE_EQUIVALENT;
    }

    /** mol/kg, from mmol/L. */
    public double ofMillimoles(double mmolPerL) {
        return mmolPerL / PER_KILO / kgPerL;
    }

    /** mmol/L, from mol/kg. */
    public double millimoles(double molPerKg) {
        return molPerKg * PER_KILO * kgPerL;
    }

    /** mol/kg, from mg/L of a substance of this molar mass, g/mol. */
    public double ofMilligrams(double mgPerL, double molarMass) {
        return mgPerL / PER_MEGA / molarMass * PER_KILO / kgPerL;
    }

    /** mg/L of a substance of this molar mass, g/mol, from mol/kg. */
    public double milligrams(double molPerKg, double molarMass) {
        return molPerKg * molarMass * PER_KILO * kgPerL;
    }
}
