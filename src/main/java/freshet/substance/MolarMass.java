package freshet.substance;

import freshet.method.Constant;
import java.util.List;

/**
 * Molar masses in g/mol, from the abridged standard atomic weights (IUPAC-CIAAW 2021; Prohaska et al. 2022, Pure Appl.
 * Chem. 94:573-600): H 1.008, C 12.011, N 14.007, O 15.999, Na 22.990, Cl 35.45, K 39.098, Ca 40.078. The mass of electrons
 * is neglected.
 */
public final class MolarMass {

    /** Nitrogen, N. */
    public static final double NITROGEN = 14.007;
    /** Ammonia, NH3. */
    public static final double AMMONIA = 17.031;
    /** Ammonium ion, NH4+. */
    public static final double AMMONIUM = 18.039;
    /** Nitrite ion, NO2-. */
    public static final double NITRITE = 46.005;
    /** Nitrous acid, HNO2. */
    public static final double NITROUS_ACID = 47.013;
    /** Nitrate ion, NO3-. */
    public static final double NITRATE = 62.004;
    /** Oxygen, O2. */
    public static final double OXYGEN = 31.998;
    /** Carbon dioxide, CO2. */
    public static final double CARBON_DIOXIDE = 44.009;
    /** Bicarbonate ion, HCO3-. */
    public static final double BICARBONATE = 61.016;
    /** Carbonate ion, CO3--. */
    public static final double CARBONATE = 60.008;
    /** Calcium, Ca. */
    public static final double CALCIUM = 40.078;
    /** Calcium carbonate per equivalent of alkalinity, CaCO3/2; g per equivalent. */
    public static final double CALCIUM_CARBONATE_EQUIVALENT = 50.043;
    /** Sodium bicarbonate, NaHCO3. */
    public static final double SODIUM_BICARBONATE = 84.006;
    /** Chloride, Cl-. */
    public static final double CHLORIDE = 35.45;
    /** Sodium chloride, NaCl. */
    public static final double SODIUM_CHLORIDE = 58.44;
    /** Potassium chloride, KCl. */
    public static final double POTASSIUM_CHLORIDE = 74.548;
    /** Calcium chloride without water, CaCl2. */
    public static final double CALCIUM_CHLORIDE = 110.978;
    /** Calcium chloride dihydrate, CaCl2 2 H2O. */
    public static final double CALCIUM_CHLORIDE_DIHYDRATE = 147.008;
    /** Cells of nitrifiers as C5H7O2N. */
    public static final double CELLS = 113.116;

    /** Where they come from. */
    public static final String CITATION =
            "Abridged standard atomic weights, IUPAC-CIAAW 2021; Prohaska et al. 2022, Pure"
                    + " Appl. Chem. 94:573-600 (values from memory)";

    /** All of them. */
    public static final List<Constant> ALL = List.of(
            new Constant("N", NITROGEN, "g/mol", "nitrogen"),
            new Constant("NH3", AMMONIA, "g/mol", "ammonia"),
            new Constant("NH4", AMMONIUM, "g/mol", "ammonium ion"),
            new Constant("NO2", NITRITE, "g/mol", "nitrite ion"),
            new Constant("HNO2", NITROUS_ACID, "g/mol", "nitrous acid"),
            new Constant("NO3", NITRATE, "g/mol", "nitrate ion"),
            new Constant("O2", OXYGEN, "g/mol", "oxygen"),
            new Constant("CO2", CARBON_DIOXIDE, "g/mol", "carbon dioxide"),
            new Constant("HCO3", BICARBONATE, "g/mol", "bicarbonate ion"),
            new Constant("CO3", CARBONATE, "g/mol", "carbonate ion"),
            new Constant("Ca", CALCIUM, "g/mol", "calcium"),
            new Constant("CaCO3/2", CALCIUM_CARBONATE_EQUIVALENT, "g/eq", "calcium carbonate per equivalent"),
            new Constant("NaHCO3", SODIUM_BICARBONATE, "g/mol", "sodium bicarbonate"),
            new Constant("Cl", CHLORIDE, "g/mol", "chloride"),
            new Constant("NaCl", SODIUM_CHLORIDE, "g/mol", "sodium chloride"),
            new Constant("KCl", POTASSIUM_CHLORIDE, "g/mol", "potassium chloride"),
            new Constant("CaCl2", CALCIUM_CHLORIDE, "g/mol", "calcium chloride without water"),
            new Constant("CaCl2.2H2O", CALCIUM_CHLORIDE_DIHYDRATE, "g/mol", "calcium chloride dihydrate"),
            new Constant("C5H7O2N", CELLS, "g/mol", "cells of nitrifiers"));

    private MolarMass() {}
}
