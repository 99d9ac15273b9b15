package freshet.nitrification;

import freshet.method.Constant;
import freshet.substance.MolarMass;

/**
 * The oxidation of one mole of ammonium to nitrate.
 *
 * @param oxygen O2 consumed, mol
 * @param alkalinity alkalinity consumed, equivalents
 * @param cells C5H7O2N grown, mol
 * @param nitrate NO3- made, mol
 * @param carbonDioxide CO2 set free, mol
 */
record Reaction(double oxygen, double alkalinity, double cells, double nitrate, double carbonDioxide) {

    /** Fish excrete ammonia, which brings one equivalent of alkalinity per mole before any is consumed. */
    private static final double EXCRETED_ALKALINITY = 1;

    static Reaction of(double[] constants) {
        return new Reaction(constants[0], constants[1], constants[2], constants[3], constants[4]);
    }

    /** The five coefficients as a catalogue shows them. */
    Constant[] constants() {
        return new Constant[] {
            new Constant("o", oxygen, "mol/mol", "oxygen per ammonium"),
            new Constant("a", alkalinity, "eq/mol", "alkalinity per ammonium"),
            new Constant("x", cells, "mol/mol", "cells C5H7O2N per ammonium"),
            new Constant("n", nitrate, "mol/mol", "nitrate per ammonium"),
            new Constant("k", carbonDioxide, "mol/mol", "carbon dioxide per ammonium")
        };
    }

    /** Oxygen consumed, g per g N. */
    double oxygenGPerG() {
        return perGramNitrogen(oxygen, MolarMass.OXYGEN);
    }

    /** Alkalinity consumed, g CaCO3 per g N. */
    double alkalinityGPerG() {
        return perGramNitrogen(alkalinity, MolarMass.CALCIUM_CARBONATE_EQUIVALENT);
    }

    /** Sodium bicarbonate that replaces this alkalinity, g per g N. */
    double bicarbonateGPerG() {
        return perGramNitrogen(alkalinity, MolarMass.SODIUM_BICARBONATE);
    }

    /** Share of the alkalinity consumed that excretion of ammonia did not bring. */
    double netShare() {
        return (alkalinity - EXCRETED_ALKALINITY) / alkalinity;
    }

    /** Carbon dioxide set free, g per g N. */
    double carbonDioxideGPerG() {
        return perGramNitrogen(carbonDioxide, MolarMass.CARBON_DIOXIDE);
    }

    /** Cells grown, g dry mass per g N. */
    double biomassGPerG() {
        return perGramNitrogen(cells, MolarMass.CELLS);
    }

    private static double perGramNitrogen(double moles, double gPerMol) {
        return moles * gPerMol / MolarMass.NITROGEN;
    }
}
