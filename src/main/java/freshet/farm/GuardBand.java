package freshet.farm;

import freshet.ammonia.AmmoniaDissociation;
import freshet.ammonia.AmmoniaMethod;
import freshet.ammonia.AmmoniaUncertainty;
import freshet.ammonia.Water;
import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Seen;
import java.util.OptionalDouble;

/**
 * How far inside its limit an alarm is set, so that the limit is kept with 95 % although the sensors are uncertain.
 *
 * <p>First order after JCGM 100:2008, one-sided; for concentrations in the logarithm.
 */
public final class GuardBand {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "alarm-setpoints",
                    "Alarm set-points with guard bands, deadbands and refresh values",
                    Citation.withoutDoi(
                            "JCGM 100:2008; ANSI/ISA-18.2",
                            "A composite: guard bands by the first-order propagation of JCGM 100:2008 (Guide to the expression"
                                    + " of uncertainty in measurement); terms of ANSI/ISA-18.2 (Management of alarm systems)"),
                    Seen.MEMORY)
            .equation(
                    "TAN: set = L/f exp(-z u), u^2 = r^2 + k^2 (u(pH)^2 + u(pKa)^2 + (dpKa/dT u(T))^2), k = ln10 (1 - f);"
                            + " NO2-N, NO3-N: set = L exp(-z r); others: L - z u, L + z u; deadband max(2 u, floor);"
                            + " refresh where the limit of TAN has changed by p: f/(1 - p) above, f/(1 + p) below",
                    new Constant("z", 1.645, "1", "95 %, one-sided"),
                    new Constant("least deadband of concentrations", 0.05, "1", "of the set-point; judgement"),
                    new Constant("least deadband of pH", 0.05, "[pH]", "judgement"),
                    new Constant("least deadband of temperature", 0.3, "Cel", "judgement"),
                    new Constant("least deadband of oxygen", 0.2, "mg/L", "judgement"))
            .accuracy(
                    "covers the sensors only: neither stratification, nor drift since calibration, nor the time between"
                            + " samples")
            .uses(
                    AmmoniaUncertainty.METHOD,
                    AmmoniaMethod.EMERSON_1975.dissociation().method(),
                    AmmoniaMethod.CLEGG_WHITFIELD_1995.dissociation().method(),
                    AlarmProfile.COLD_WATER.method(),
                    AlarmProfile.WARM_WATER.method(),
                    AlarmProfile.MARINE.method());

    /** 95 %, one-sided. */
    public static final double Z = METHOD.values()[0];
    /** Least deadband of a concentration, of the set-point. */
    public static final double LEAST_SHARE = METHOD.values()[1];
    /** Least deadband of pH. */
    public static final double LEAST_PH = METHOD.values()[2];
    /** Least deadband of temperature, °C. */
    public static final double LEAST_TEMPERATURE_C = METHOD.values()[3];
    /** Least deadband of oxygen, mg/L. */
    public static final double LEAST_OXYGEN = METHOD.values()[4];

    private final Water water;
    private final AmmoniaDissociation dissociation;
    private final double pKa;

    /** For one water. */
    public GuardBand(Water water) {
        this.water = water;
        dissociation = AmmoniaMethod.defaultFor(water.salinity()).dissociation();
        pKa = pKa(water.temperatureC());
    }

    private double pKa(double temperatureC) {
        return dissociation.pKa(temperatureC, water.salinity(), water.scale());
    }

    /** The dissociation constant. */
    public AmmoniaDissociation dissociation() {
        return dissociation;
    }

    /** Un-ionized share of total ammonia. */
    public double fraction() {
        return AmmoniaDissociation.fraction(pKa, water.ph());
    }

    /**
     * Relative standard uncertainty of the limit of total ammonia against a measured one.
     *
     * @param tan relative standard uncertainty of total ammonia
     * @param ph standard uncertainty of pH
     * @param temperatureC standard uncertainty of temperature, °C
     */
    public double relativeUncertainty(double tan, double ph, double temperatureC) {
        return AmmoniaUncertainty.relative(water, dissociation, new AmmoniaUncertainty.Sensors(tan, ph, temperatureC));
    }

    /** The pH at which the un-ionized share would be {@code fraction}, 0 &lt; fraction &lt; 1; on the water's scale. */
    public double phAt(double fraction) {
        return AmmoniaDissociation.phAt(fraction, pKa);
    }

    /** The temperature at which it would be, °C; empty where that is outside -2 to 60 °C. */
    public OptionalDouble temperatureAt(double fraction) {
        double wanted = water.ph() + StrictMath.log10(1 / fraction - 1);
        return dissociation.temperatureAt(wanted, water.salinity(), water.scale());
    }
}
