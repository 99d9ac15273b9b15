package freshet.carbonate;

import freshet.acidity.PhScale;
import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Seen;
import java.util.OptionalDouble;

/**
 * A chemical in one water, closed to the air; doses in mol of chemical for each kg of water. The volume and the salt of
 * the dose are neglected.
 */
public final class AlkalinityDose {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "alkalinity-dose",
                    "Dose of a base for a target alkalinity or pH",
                    Citation.withDoi(
                            "Freshet, alkalinity dose; Munhoven 2013",
                            "A composite: stoichiometry of the chemical, and the equilibrium after Munhoven G. (2013) Geosci."
                                    + " Model Dev. 6:1367-1388",
                            "10.5194/gmd-6-1367-2013"),
                    Seen.SECONDARY)
            .equation(
                    "x = (target - Alk)/a, or closed at a target pH x = (Alk(H, DIC) - Alk)/(a - d e(H)), e = (K1 H +"
                            + " 2 K1 K2)/(H^2 + K1 H + K1 K2); a eq and d mol of carbon for each mol; a step raises closed pH"
                            + " by the limit and alkalinity by the most for its kind, at least; time between steps so that pH"
                            + " rises no faster than r a day",
                    new Constant("r", 0.3, "[pH]/d", "common practice"),
                    new Constant("most of bicarbonates and limestone", 50, "mg/L", "as CaCO3, in a step; judgement"),
                    new Constant("most of hydroxides and carbonates", 20, "mg/L", "as CaCO3, in a step; judgement"))
            .accuracy(
                    "as carbonate-system; neglecting the salt of the dose costs up to 0.008 in pH for 50 mg/L as CaCO3")
            .uses(CarbonateSystem.METHOD);

    private static final double PH_A_DAY = METHOD.values()[0];
    private static final double HOURS_A_DAY = 24;

    private final CarbonateWater water;
    private final DosingChemical chemical;
    private final CarbonateSolver solver;

    /** {@code chemical} in {@code water}, with pH on {@code scale}. */
    public AlkalinityDose(CarbonateWater water, DosingChemical chemical, PhScale scale) {
        this.water = water;
        this.chemical = chemical;
        solver = CarbonateSolver.of(water.temperatureC(), water.salinity(), scale, water.tan());
    }

    /** The dose for an alkalinity, eq/kg; less than 0 if the water has more. */
    public double toAlkalinity(double alkalinity) {
        return (alkalinity - water.alkalinity()) / chemical.equivalents();
    }

    /** The dose for a pH, closed; empty if no dose reaches it. */
    public OptionalDouble toPh(double ph) {
        double hydrogen = solver.hydrogen(ph);
        double perMol = chemical.equivalents() - chemical.carbon() * solver.equivalents(hydrogen);
        double dose = (solver.alkalinity(hydrogen, water.inorganicCarbon()) - water.alkalinity()) / perMol;
        return perMol > 0 && dose >= 0 ? OptionalDouble.of(dose) : OptionalDouble.empty();
    }

    /** Alkalinity with a dose, eq/kg. */
    public double alkalinity(double dose) {
        return water.alkalinity() + chemical.equivalents() * dose;
    }

    /** The equilibrium with a dose, closed to the air. */
    public CarbonateState closed(double dose) {
        return solver.ofAlkalinityAndCarbon(alkalinity(dose), water.inorganicCarbon() + chemical.carbon() * dose);
    }

    /** The equilibrium with a dose when carbon dioxide has settled to {@code co2}, mol/kg. */
    public CarbonateState settled(double dose, double co2) {
        return solver.ofAlkalinityAndCo2(alkalinity(dose), co2);
    }

    /** Mass of the pure chemical for a dose in {@code volumeL} of the water, g. */
    public double grams(double dose, double volumeL) {
        return dose * volumeL * water.kgPerL() * chemical.molarMass();
    }

    /** Hours between two steps of {@code phRise} each. */
    public static double hoursBetweenSteps(double phRise) {
        return HOURS_A_DAY * phRise / PH_A_DAY;
    }
}
