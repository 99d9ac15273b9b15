package freshet.nitrite;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Seen;
import freshet.substance.MolarMass;

/**
 * From which concentration nitrous acid slows the nitrifiers of a biofilter.
 *
 * <p>Park S., Bae W. (2009) Process Biochem. 44:631-640: constants of non-competitive inhibition. Erratum: copies of the
 * abstract print mmol/L where the micro sign was lost; micromolar is the only sensible reading. Anthonisen et al. (1976)
 * J. Water Pollut. Control Fed. 48:835-852: 0.22 to 2.8 mg/L HNO2, from memory.
 */
public final class NitrousAcidInhibition {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "nitrous-acid-inhibition",
                    "Nitrous acid that inhibits nitrifiers",
                    Citation.withoutDoi(
                            "Park & Bae 2009, Process Biochem. 44:631-640",
                            "Park S., Bae W. (2009) Modeling kinetics of ammonium oxidation and nitrite oxidation under"
                                    + " simultaneous inhibition by free ammonia and free nitrous acid. Process Biochem."
                                    + " 44:631-640; Anthonisen et al. (1976) J. Water Pollut. Control Fed. 48(5):835-852"),
                    Seen.SECONDARY)
            .equation(
                    "notice at HNO2-N of 14.007 k1/1000 mg/L or more: half of nitrite oxidation is inhibited at k1 to k2, of"
                            + " ammonia oxidation at k3; the thresholds of Anthonisen et al. are t1 to t2",
                    new Constant("k1", 1.7, "umol/L", "Park and Bae, most sensitive sludge"),
                    new Constant("k2", 6.8, "umol/L", "Park and Bae, least sensitive sludge"),
                    new Constant("k3", 12, "umol/L", "Park and Bae"),
                    new Constant("t1", 0.22, "mg/L", "Anthonisen et al., as HNO2, from memory"),
                    new Constant("t2", 2.8, "mg/L", "Anthonisen et al., as HNO2, from memory"))
            .accuracy("films adapt; the speciation constants of Park and Bae were not seen")
            .errata("copies of the abstract of Park and Bae print mmol/L where the micro sign was lost");

    private static final NitrousAcidInhibition PUBLISHED = new NitrousAcidInhibition(METHOD.values());
    private static final double MICROMOLES_PER_MILLIMOLE = 1000;

    private final double[] c;

    NitrousAcidInhibition(double[] constants) {
        c = constants;
    }

    /** With the published constants. */
    public static NitrousAcidInhibition published() {
        return PUBLISHED;
    }

    /** Whether nitrous acid as N, mg/L, reaches the lowest published concentration. */
    public boolean reachedBy(double hno2NMgPerL) {
        return hno2NMgPerL >= c[0] * MolarMass.NITROGEN / MICROMOLES_PER_MILLIMOLE;
    }

    /** Half inhibition of nitrite oxidation, µmol/L, the most sensitive sludge first. */
    public double[] nitriteOxidationMicromolar() {
        return new double[] {c[0], c[1]};
    }

    /** Half inhibition of ammonia oxidation, µmol/L. */
    public double ammoniaOxidationMicromolar() {
        return c[2];
    }

    /** The thresholds of inhibition, mg/L as HNO2, from where it begins to where it is certain. */
    public double[] thresholdsMgPerLAsHno2() {
        return new double[] {c[3], c[4]};
    }
}
