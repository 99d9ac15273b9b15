package freshet.acidity;

/** The scale on which a pH was measured or is reported. */
public enum PhScale {
    /** A probe calibrated on NBS or IUPAC buffers: reads activity; treated as the free scale. */
    NBS,
    /** Free hydrogen ion, mol/kg of solution. */
    FREE,
    /** Free hydrogen ion and bisulfate, mol/kg of solution. */
    TOTAL
}
