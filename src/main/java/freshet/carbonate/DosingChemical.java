package freshet.carbonate;

/** A chemical that raises alkalinity. Molar masses: IUPAC 2021 abridged atomic masses. */
public enum DosingChemical {
    /** NaHCO3, the mild choice. */
    SODIUM_BICARBONATE(Kind.BICARBONATE, 1, 1, 84.006),
    /** KHCO3, for aquaponics: potassium feeds plants. */
    POTASSIUM_BICARBONATE(Kind.BICARBONATE, 1, 1, 100.114),
    /** CaCO3: dissolves slowly, and only in water that is not saturated with it. */
    CALCIUM_CARBONATE(Kind.LIMESTONE, 2, 1, 100.086),
    /** Ca(OH)2, caustic. */
    CALCIUM_HYDROXIDE(Kind.CAUSTIC, 2, 0, 74.092),
    /** KOH, caustic. */
    POTASSIUM_HYDROXIDE(Kind.CAUSTIC, 1, 0, 56.105),
    /** NaOH, caustic. */
    SODIUM_HYDROXIDE(Kind.CAUSTIC, 1, 0, 39.997),
    /** Na2CO3, caustic. */
    SODIUM_CARBONATE(Kind.CAUSTIC, 2, 1, 105.988),
    /** K2CO3, caustic. */
    POTASSIUM_CARBONATE(Kind.CAUSTIC, 2, 1, 138.204);

    private enum Kind {
        BICARBONATE(50),
        LIMESTONE(50),
        CAUSTIC(20);

        private final double mostStepMgPerLAsCaco3;

        Kind(double mostStepMgPerLAsCaco3) {
            this.mostStepMgPerLAsCaco3 = mostStepMgPerLAsCaco3;
        }
    }

    private final Kind kind;
    private final int equivalents;
    private final int carbon;
    private final double molarMass;

    DosingChemical(Kind kind, int equivalents, int carbon, double molarMass) {
        this.kind = kind;
        this.equivalents = equivalents;
        this.carbon = carbon;
        this.molarMass = molarMass;
    }

    /** Alkalinity, eq/mol. */
    public int equivalents() {
        return equivalents;
    }

    /** Inorganic carbon, mol/mol. */
    public int carbon() {
        return carbon;
    }

    /** Molar mass, g/mol. */
    public double molarMass() {
        return molarMass;
    }

    /** Whether it burns people and fish. */
    public boolean caustic() {
        return kind == Kind.CAUSTIC;
    }

    /** Whether it is limestone, which dissolves slowly. */
    public boolean limestone() {
        return kind == Kind.LIMESTONE;
    }

    /** Whether it brings calcium, one mol each mol. */
    public boolean calcium() {
        return this == CALCIUM_CARBONATE || this == CALCIUM_HYDROXIDE;
    }

    /** The most alkalinity that is added in one step, mg/L as CaCO3. */
    public double mostStepMgPerLAsCaco3() {
        return kind.mostStepMgPerLAsCaco3;
    }
}
