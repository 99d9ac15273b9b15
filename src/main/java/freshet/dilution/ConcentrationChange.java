package freshet.dilution;

import freshet.answer.Fault;
import freshet.answer.FaultCode;
import freshet.answer.Refusal;
import java.util.OptionalDouble;

/**
 * A wanted change of the concentration of a mixed tank by source water, all three on one basis.
 *
 * @param volumeL volume, L
 * @param nowMgPerL concentration now, mg/L
 * @param targetMgPerL wanted concentration, mg/L
 * @param sourceMgPerL concentration of the source water, mg/L
 */
public record ConcentrationChange(double volumeL, double nowMgPerL, double targetMgPerL, double sourceMgPerL) {

    private static final double MOST_STAGES = 1e6;
    private static final double ROUNDING = 1e-12;

    /** Whether the concentration is at the target or beyond it already, seen from the source. */
    public boolean alreadyMet() {
        return nowMgPerL == targetMgPerL || (nowMgPerL != sourceMgPerL && remainder() >= 1);
    }

    /**
     * What remains of the difference to the source, from 0 to 1.
     *
     * @throws Refusal if the target lies beyond the source
     */
    double reachableRemainder() {
        if (nowMgPerL == sourceMgPerL || remainder() < 0) {
            throw unreachable("The target lies beyond the source water, which no exchange can pass.");
        }
        return remainder();
    }

    /**
     * Water for one exchange, L.
     *
     * @throws Refusal if the target lies beyond the source
     */
    public double singleL() {
        return volumeL * (1 - reachableRemainder());
    }

    /**
     * Number of equal exchanges, none larger than {@code mostPercent} of the volume.
     *
     * @throws Refusal if the target cannot be reached in a million of them
     */
    public int stages(double mostPercent) {
        double g = reachableRemainder();
        if (mostPercent >= 100) {
            return 1;
        }
        requireNotAtSource(g, "Stages smaller than the whole volume only approach the source water.");
        double raw = StrictMath.log(g) / StrictMath.log1p(-mostPercent / 100);
        if (!(raw <= MOST_STAGES)) {
            throw new Refusal(
                    "max_stage_percent",
                    FaultCode.BELOW_MINIMUM,
                    "Stages this small would have to be more than a million: allow larger ones.");
        }
        return (int) Math.max(1, Math.ceil(raw - ROUNDING));
    }

    /** Water of each of {@code stages} equal exchanges, L. */
    public double stageL(int stages) {
        double g = reachableRemainder();
        return g == 0 ? volumeL : -volumeL * StrictMath.expm1(StrictMath.log(g) / stages);
    }

    /**
     * Water for a continuous exchange, L.
     *
     * @throws Refusal if the target is the source water itself, which is only approached
     */
    public double continuousL() {
        double g = reachableRemainder();
        requireNotAtSource(g, "A continuous exchange only approaches the source water.");
        return -volumeL * StrictMath.log(g);
    }

    private void requireNotAtSource(double g, String reason) {
        if (g == 0) {
            throw unreachable(reason);
        }
    }

    private double remainder() {
        return (targetMgPerL - sourceMgPerL) / (nowMgPerL - sourceMgPerL);
    }

    private Refusal unreachable(String reason) {
        OptionalDouble source = OptionalDouble.of(sourceMgPerL);
        boolean richer = sourceMgPerL > nowMgPerL;
        return new Refusal(new Fault("target_mg_per_l", FaultCode.UNREACHABLE, reason)
                .bounds(richer ? OptionalDouble.empty() : source, richer ? source : OptionalDouble.empty(), "mg/L"));
    }
}
