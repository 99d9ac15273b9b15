package freshet.substance;

/** Conversions between a nitrogen concentration as N and as the species; the unit stays the same. */
public final class Basis {

    private Basis() {}

    /** Ammonia as NH3 from ammonia as N. */
    public static double nitrogenToAmmonia(double asNitrogen) {
        return asNitrogen * MolarMass.AMMONIA / MolarMass.NITROGEN;
    }

    /** Ammonia as N from ammonia as NH3. */
    public static double ammoniaToNitrogen(double asAmmonia) {
        return asAmmonia * MolarMass.NITROGEN / MolarMass.AMMONIA;
    }

    /** Ammonium as NH4 from ammonium as N. */
    public static double nitrogenToAmmonium(double asNitrogen) {
        return asNitrogen * MolarMass.AMMONIUM / MolarMass.NITROGEN;
    }
}
