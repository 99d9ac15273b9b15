package freshet.nitrification;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Seen;
import java.util.OptionalDouble;

/**
 * The water that passes a filter and what it can bring: {@code transport = Q C eta} of total ammonia, and oxygen down to 2
 * mg/L where no air is blown in.
 *
 * <p>Losordo T.M., Hobbs A.O. (2000) Aquac. Eng. 23:95-102; Losordo T.M., DeLong D.P. (2015). Removal per pass 30-60 %.
 *
 * @param removalPerPass share of the total ammonia removed in one pass; empty for the published 0.50 (0.30 to 0.60)
 * @param inflowOxygenMgPerL oxygen of the water entering, mg/L, where that is known and no air is blown in
 */
public record FilterFlow(OptionalDouble removalPerPass, OptionalDouble inflowOxygenMgPerL) {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "removal-per-pass",
                    "Total ammonia and oxygen that the water brings to a filter",
                    Citation.withoutDoi(
                            "Losordo & Hobbs 2000, Aquac. Eng. 23:95-102",
                            "Losordo T.M., Hobbs A.O. (2000) Using computer spreadsheets for water flow and biofilter"
                                    + " sizing in recirculating aquaculture production systems. Aquac. Eng. 23:95-102;"
                                    + " Losordo T.M., DeLong D.P. (2015) Flow rate estimation for recirculating systems"),
                    Seen.SECONDARY)
            .equation(
                    "transport = Q C eta; oxygen transport = Q max(0, O_in - O_out)/r, r oxygen per N without growth",
                    new Constant("eta", 0.50, "1"),
                    new Constant("eta_low", 0.30, "1"),
                    new Constant("eta_high", 0.60, "1"),
                    new Constant("O_out", 2, "mg/L", "this project's judgement: the stated minimum at the media"))
            .accuracy("removal per pass is not free: it cannot exceed what the media oxidize")
            .uses(Stoichiometry.CATABOLIC.method());

    private static final Spread PUBLISHED_REMOVAL = Spread.of(METHOD.values(), 0);
    private static final double LEAST_OUTFLOW_OXYGEN = METHOD.values()[3];
    private static final double LITRES_PER_M3 = 1000;
    private static final double HOURS_PER_DAY = 24;

    /** Share of the total ammonia removed in one pass. */
    Spread removal() {
        return removalPerPass.isPresent() ? Spread.known(removalPerPass.getAsDouble()) : PUBLISHED_REMOVAL;
    }

    /** Total ammonia as N, g/day, that {@code litresPerHour} of water at {@code tanMgPerL} lets a filter remove. */
    Spread tanGPerDay(double litresPerHour, double tanMgPerL) {
        return removal().times(m3PerDay(litresPerHour) * tanMgPerL);
    }

    /** Total ammonia as N, g/day, that the oxygen of {@code litresPerHour} of water can oxidize. */
    OptionalDouble oxygenTanGPerDay(double litresPerHour) {
        return inflowOxygenMgPerL.stream()
                .map(oxygen -> m3PerDay(litresPerHour) * Math.max(0, oxygen - LEAST_OUTFLOW_OXYGEN) / oxygenPerTan())
                .findFirst();
    }

    /** Flow, L/h, that brings {@code tanGPerDay}, and the oxygen for it, with water at {@code tanMgPerL}. */
    double litresPerHour(double tanGPerDay, double tanMgPerL) {
        double forTan = LITRES_PER_M3
                * tanGPerDay
                / (HOURS_PER_DAY * tanMgPerL * removal().estimate());
        return inflowOxygenMgPerL.stream()
                .map(oxygen ->
                        LITRES_PER_M3 * tanGPerDay * oxygenPerTan() / (HOURS_PER_DAY * (oxygen - LEAST_OUTFLOW_OXYGEN)))
                .map(forOxygen -> Math.max(forOxygen, forTan))
                .findFirst()
                .orElse(forTan);
    }

    /** Whether the water brings any oxygen for nitrification, or need not. */
    boolean bringsOxygen() {
        return inflowOxygenMgPerL.isEmpty() || inflowOxygenMgPerL.getAsDouble() > LEAST_OUTFLOW_OXYGEN;
    }

    static double m3PerDay(double litresPerHour) {
        return HOURS_PER_DAY * litresPerHour / LITRES_PER_M3;
    }

    private static double oxygenPerTan() {
        return Stoichiometry.CATABOLIC.reaction().oxygenGPerG();
    }
}
