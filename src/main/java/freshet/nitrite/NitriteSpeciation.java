package freshet.nitrite;

/**
 * Total nitrite split into nitrous acid and the nitrite ion.
 *
 * @param hno2NMgPerL nitrous acid as N, mg/L
 * @param ionNMgPerL nitrite ion as N, mg/L
 * @param hno2Fraction nitrous acid's share of the total, 0 to 1
 * @param pKa of nitrous acid
 */
public record NitriteSpeciation(double hno2NMgPerL, double ionNMgPerL, double hno2Fraction, double pKa) {

    /**
     * Splits {@code no2NMgPerL} of total nitrite as N.
     *
     * @param no2NMgPerL total nitrite as N, mg/L
     * @param ph pH of the water
     * @param temperatureC °C
     * @param dissociation the constant
     */
    public static NitriteSpeciation of(
            double no2NMgPerL, double ph, double temperatureC, NitrousAcidDissociation dissociation) {
        double pKa = dissociation.pKa(temperatureC);
        double acid = NitrousAcidDissociation.fraction(pKa, ph);
        double ion = NitrousAcidDissociation.fraction(ph, pKa);
        return new NitriteSpeciation(no2NMgPerL * acid, no2NMgPerL * ion, acid, pKa);
    }
}
