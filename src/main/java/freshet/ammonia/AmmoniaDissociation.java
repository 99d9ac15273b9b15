package freshet.ammonia;

import freshet.acidity.PhScale;
import freshet.method.Method;
import freshet.method.Validity;
import java.util.OptionalDouble;
import org.hipparchus.analysis.solvers.BracketingNthOrderBrentSolver;

/** The dissociation constant of the ammonium ion, NH4+ = NH3 + H+, as one source gives it. */
public interface AmmoniaDissociation {

    /** Lowest temperature of any answer, °C. */
    double COLDEST_C = -2;
    /** Highest temperature of any answer, °C. */
    double HOTTEST_C = 60;

    /** Natural logarithm of 10. */
    double LN_10 = StrictMath.log(10);

    /** The published method. */
    Method method();

    /**
     * pKa on the scale of the pH it will be used with; NBS stands for the free scale.
     *
     * @param temperatureC °C
     * @param salinity practical salinity
     * @param scale scale of the pH
     */
    double pKa(double temperatureC, double salinity, PhScale scale);

    /** Whether temperature (°C) and practical salinity lie within the range that the source states. */
    Validity validity(double temperatureC, double salinity);

    /** Whether pKa depends on salinity and pH scale; a source for fresh water ignores both. */
    default boolean coversSaltWater() {
        return true;
    }

    /**
     * Un-ionized share of total ammonia, from 0 to 1; molar, so the same for amounts as N.
     *
     * @param ph pH on {@code scale}
     * @param temperatureC °C
     * @param salinity practical salinity
     * @param scale scale of the pH
     */
    default double fraction(double ph, double temperatureC, double salinity, PhScale scale) {
        return fraction(pKa(temperatureC, salinity, scale), ph);
    }

    /** Un-ionized share at a pH and pKa on the same scale. */
    static double fraction(double pKa, double ph) {
        return 1 / (1 + ammoniumPerAmmonia(pKa, ph));
    }

    /** Ammonium for each ammonia, 10^(pKa - pH); by the exponential, which costs a third of the power. */
    static double ammoniumPerAmmonia(double pKa, double ph) {
        return StrictMath.exp(LN_10 * (pKa - ph));
    }

    /** The pH at which the un-ionized share is {@code fraction}, on the scale of {@code pKa}; 0 &lt; fraction &lt; 1. */
    static double phAt(double fraction, double pKa) {
        return pKa - StrictMath.log10(1 / fraction - 1);
    }

    /**
     * The temperature at which pKa has the given value, °C; empty where that lies outside -2 to 60 °C.
     *
     * @param pKa wanted value on {@code scale}
     * @param salinity practical salinity
     * @param scale scale of the pH
     */
    default OptionalDouble temperatureAt(double pKa, double salinity, PhScale scale) {
        if (pKa > pKa(COLDEST_C, salinity, scale) || pKa < pKa(HOTTEST_C, salinity, scale)) {
            return OptionalDouble.empty();
        }
        BracketingNthOrderBrentSolver solver = new BracketingNthOrderBrentSolver(1e-14, 1e-12, 1e-14, 5);
        return OptionalDouble.of(solver.solve(100, t -> pKa(t, salinity, scale) - pKa, COLDEST_C, HOTTEST_C));
    }
}
