package freshet.carbonate;

import java.util.OptionalDouble;

/** How near a water is to saturation with calcite; calcium is taken as given, not from salinity. */
public final class CalciteSaturation {

    private CalciteSaturation() {}

    /**
     * Logarithm of the saturation, after {@link Mucci1983}; empty without calcium or carbonate.
     *
     * @param calcium total calcium, mol/kg
     * @param carbonate carbonate ion, mol/kg
     * @param temperatureC °C
     * @param salinity practical salinity
     */
    public static OptionalDouble index(double calcium, double carbonate, double temperatureC, double salinity) {
        double product = calcium * carbonate;
        return product > 0
                ? OptionalDouble.of(StrictMath.log10(product) - Mucci1983.logCalcite(temperatureC, salinity))
                : OptionalDouble.empty();
    }
}
