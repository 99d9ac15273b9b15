package freshet.carbonate;

import freshet.acidity.PhScale;
import freshet.answer.FaultCode;
import freshet.answer.Refusal;
import org.hipparchus.analysis.UnivariateFunction;
import org.hipparchus.analysis.solvers.BracketingNthOrderBrentSolver;

/**
 * The equilibrium of one water from any two of pH, alkalinity, carbon dioxide and inorganic carbon.
 *
 * <p>Alkalinity falls strictly as the hydrogen ion rises, whatever is held, so there is one root, and it lies between the
 * bounds of Munhoven G. (2013) Mathematics of the total alkalinity-pH equation. Geosci. Model Dev. 6:1367-1388,
 * doi:10.5194/gmd-6-1367-2013.
 */
public final class CarbonateSolver {

    private static final int MOST_EVALUATIONS = 60;
    private static final double PH_ACCURACY = 1e-12;
    /** eq/kg; in the least buffered water 5e-10 in pH. */
    private static final double ALKALINITY_ACCURACY = 1e-16;

    /** mol/kg; three times what water near 0 °C holds under pure carbon dioxide of 1 atm. */
    private static final double MOST_CO2 = 0.25;

    private static final double FOURTH = 4;
    private static final double HIGHEST_PH = 14;

    private final AcidBase water;
    private final PhScale scale;
    private final double tan;

    CarbonateSolver(AcidBase water, PhScale scale, double tan) {
        this.water = water;
        this.scale = scale;
        this.tan = tan;
    }

    /**
     * A solver for one water.
     *
     * @param temperatureC °C
     * @param salinity practical salinity
     * @param scale scale of every pH that goes in or comes out
     * @param tan total ammonia, mol/kg
     */
    public static CarbonateSolver of(double temperatureC, double salinity, PhScale scale, double tan) {
        return new CarbonateSolver(AcidBase.of(temperatureC, salinity), scale, tan);
    }

    /**
     * From pH and alkalinity, eq/kg.
     *
     * @throws Refusal if so much alkalinity is not possible at that pH, or so little
     */
    public CarbonateState ofPhAndAlkalinity(double ph, double alkalinity) {
        double hydrogen = water.hydrogen(ph, scale);
        double carbonate = alkalinity - water.minor(hydrogen, tan);
        if (!(carbonate > 0)) {
            throw inconsistent(
                    "alkalinity_mg_per_l_as_caco3",
                    "At this pH water, salt and ammonia alone have as much alkalinity as was given or more:"
                            + " no carbonate is left.");
        }
        CarbonateState state = state(ph, hydrogen, carbonate / water.equivalents(hydrogen));
        if (state.co2() > MOST_CO2) {
            throw inconsistent(
                    "ph",
                    "So low a pH with this alkalinity would take more carbon dioxide than water holds under any air:"
                            + " a dead probe, or mineral acid.");
        }
        return state;
    }

    /** From pH and carbon dioxide, mol/kg. */
    public CarbonateState ofPhAndCo2(double ph, double co2) {
        double hydrogen = water.hydrogen(ph, scale);
        return state(ph, hydrogen, carbon(co2, hydrogen));
    }

    /** From pH and inorganic carbon, mol/kg. */
    public CarbonateState ofPhAndCarbon(double ph, double inorganicCarbon) {
        return state(ph, water.hydrogen(ph, scale), inorganicCarbon);
    }

    /**
     * From alkalinity, eq/kg, and carbon dioxide, mol/kg.
     *
     * @throws Refusal if pH would lie outside 0 to 14
     */
    public CarbonateState ofAlkalinityAndCo2(double alkalinity, double co2) {
        double lowest = lowestHydrogen(alkalinity);
        UnivariateFunction excess = pH -> {
            double hydrogen = StrictMath.pow(10, -pH);
            return carbon(co2, hydrogen) * water.equivalents(hydrogen) + water.minor(hydrogen, tan) - alkalinity;
        };
        double highestPh = -StrictMath.log10(lowest);
        double lowestPh = highestPh - 1;
        while (excess.value(lowestPh) > 0) {
            lowestPh -= FOURTH;
        }
        double hydrogen = StrictMath.pow(10, -root(excess, lowestPh, highestPh));
        return checked(hydrogen, carbon(co2, hydrogen), "co2_mg_per_l");
    }

    /**
     * From alkalinity, eq/kg, and inorganic carbon, mol/kg.
     *
     * @throws Refusal if pH would lie outside 0 to 14
     */
    public CarbonateState ofAlkalinityAndCarbon(double alkalinity, double inorganicCarbon) {
        double lowest = lowestHydrogen(alkalinity);
        double most = 2 * inorganicCarbon + water.boron() + tan;
        double highest = quadratic(alkalinity - most, true);
        UnivariateFunction excess = pH -> {
            double hydrogen = StrictMath.pow(10, -pH);
            return inorganicCarbon * water.equivalents(hydrogen) + water.minor(hydrogen, tan) - alkalinity;
        };
        double hydrogen = StrictMath.pow(10, -root(excess, -StrictMath.log10(highest), -StrictMath.log10(lowest)));
        return checked(hydrogen, inorganicCarbon, "inorganic_carbon_mmol_per_l");
    }

    /**
     * From carbon dioxide and inorganic carbon, mol/kg.
     *
     * @throws Refusal if there is not more inorganic carbon than carbon dioxide
     */
    public CarbonateState ofCo2AndCarbon(double co2, double inorganicCarbon) {
        double ionized = inorganicCarbon - co2;
        if (!(ionized > 0) || !(co2 > 0)) {
            throw inconsistent(
                    "co2_mg_per_l",
                    "Carbon dioxide is a part of the inorganic carbon: it must be more than 0 and less than the whole.");
        }
        // ionized H^2 = co2 (K1 H + K1 K2)
        double half = co2 * water.k1() / 2;
        double hydrogen = (half + StrictMath.sqrt(half * half + ionized * co2 * water.k1() * water.k2())) / ionized;
        return checked(hydrogen, inorganicCarbon, "co2_mg_per_l");
    }

    /** Alkalinity, eq/kg, at a hydrogen ion on the seawater scale and inorganic carbon, mol/kg. */
    double alkalinity(double hydrogen, double inorganicCarbon) {
        return inorganicCarbon * water.equivalents(hydrogen) + water.minor(hydrogen, tan);
    }

    /** Hydrogen ion on the seawater scale, mol/kg, at a pH. */
    double hydrogen(double ph) {
        return water.hydrogen(ph, scale);
    }

    /** Carbonate alkalinity over inorganic carbon, eq/mol. */
    double equivalents(double hydrogen) {
        return water.equivalents(hydrogen);
    }

    private double carbon(double co2, double hydrogen) {
        return co2 * (1 + water.k1() / hydrogen * (1 + water.k2() / hydrogen));
    }

    private CarbonateState checked(double hydrogen, double inorganicCarbon, String field) {
        double ph = water.ph(hydrogen, scale);
        if (!(ph >= 0 && ph <= HIGHEST_PH)) {
            throw inconsistent(field, "No water of pH 0 to 14 has these values together.");
        }
        return state(ph, hydrogen, inorganicCarbon);
    }

    private CarbonateState state(double ph, double hydrogen, double inorganicCarbon) {
        double k1 = water.k1();
        double k2 = water.k2();
        double parts = hydrogen * hydrogen + k1 * hydrogen + k1 * k2;
        return new CarbonateState(
                ph,
                alkalinity(hydrogen, inorganicCarbon),
                inorganicCarbon,
                inorganicCarbon * (hydrogen * hydrogen / parts),
                inorganicCarbon * (k1 * hydrogen / parts),
                inorganicCarbon * (k1 * k2 / parts));
    }

    /** Below every root: all that can take up alkalinity at high hydrogen has done so. */
    private double lowestHydrogen(double alkalinity) {
        return quadratic(alkalinity + water.sulfate() + water.fluoride(), false);
    }

    /** The hydrogen ion at which Kw/H - H/s is {@code surplus}; widened by a little for the rounding. */
    private double quadratic(double surplus, boolean upwards) {
        double perFree = water.seawaterPerFree();
        double root = StrictMath.sqrt(surplus * surplus + FOURTH * water.kw() / perFree);
        double hydrogen = surplus >= 0 ? 2 * water.kw() / (surplus + root) : perFree * (root - surplus) / 2;
        return upwards ? hydrogen * (1 + 1e-9) : hydrogen * (1 - 1e-9);
    }

    private static double root(UnivariateFunction excess, double lowestPh, double highestPh) {
        return new BracketingNthOrderBrentSolver(PH_ACCURACY, PH_ACCURACY, ALKALINITY_ACCURACY, 5)
                .solve(MOST_EVALUATIONS, excess, lowestPh, highestPh);
    }

    private static Refusal inconsistent(String field, String detail) {
        return new Refusal(field, FaultCode.INCONSISTENT, detail);
    }
}
