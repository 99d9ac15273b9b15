package freshet.nitrification;

/**
 * The alkalinity that a body of water holds above a minimum.
 *
 * @param volumeL volume of water, L
 * @param alkalinityMgPerLAsCaco3 alkalinity now, mg/L as CaCO3
 * @param minimumMgPerLAsCaco3 the alkalinity that must remain, mg/L as CaCO3
 */
public record AlkalinityStock(double volumeL, double alkalinityMgPerLAsCaco3, double minimumMgPerLAsCaco3) {

    /** Whether nothing is left to consume. */
    public boolean exhausted() {
        return alkalinityMgPerLAsCaco3 <= minimumMgPerLAsCaco3;
    }

    /** What may be consumed, g as CaCO3; 0 when it is exhausted. */
    public double availableGAsCaco3() {
        return Math.max(0, volumeL * (alkalinityMgPerLAsCaco3 - minimumMgPerLAsCaco3) / 1000);
    }
}
