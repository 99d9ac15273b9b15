package freshet.nitrite;

import freshet.substance.MolarMass;

/** Salts that bring chloride. */
public enum ChlorideSalt {
    /** NaCl. */
    SODIUM_CHLORIDE(1, MolarMass.SODIUM_CHLORIDE, MolarMass.SODIUM_CHLORIDE),
    /** CaCl2 2 H2O. */
    CALCIUM_CHLORIDE_DIHYDRATE(2, MolarMass.CALCIUM_CHLORIDE_DIHYDRATE, MolarMass.CALCIUM_CHLORIDE),
    /** KCl. */
    POTASSIUM_CHLORIDE(1, MolarMass.POTASSIUM_CHLORIDE, MolarMass.POTASSIUM_CHLORIDE);

    private final double chlorideGPerMol;
    private final double asSoldGPerMol;
    private final double anhydrousGPerMol;

    ChlorideSalt(int chlorides, double asSoldGPerMol, double anhydrousGPerMol) {
        chlorideGPerMol = chlorides * MolarMass.CHLORIDE;
        this.asSoldGPerMol = asSoldGPerMol;
        this.anhydrousGPerMol = anhydrousGPerMol;
    }

    /** Mass of chloride in the salt as it is sold, with its water of crystallization. */
    public double chlorideShare() {
        return chlorideGPerMol / asSoldGPerMol;
    }

    /** Mass of all its ions per mass of chloride; water of crystallization is no dissolved salt. */
    public double ionsPerChloride() {
        return anhydrousGPerMol / chlorideGPerMol;
    }
}
