package freshet.oxygen;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Range;
import freshet.method.Seen;
import freshet.method.Validity;

/**
 * Mean pressure of the air at an altitude, hPa.
 *
 * <p>U.S. Standard Atmosphere 1976 (NOAA, NASA, USAF, Washington DC), the same as ISO 2533 there. Weather moves the real
 * pressure by about 3 %; a measured one is better.
 */
public final class StandardAtmosphere1976 {

    private static final Range ALTITUDE = new Range("altitude_m", -430, 6000, "m");

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "standard-atmosphere-1976",
                    "Mean pressure of the air at an altitude",
                    Citation.withoutDoi(
                            "US Standard Atmosphere 1976",
                            "NOAA, NASA, USAF (1976) U.S. Standard Atmosphere. NOAA-S/T 76-1562, Washington DC"),
                    Seen.MEMORY)
            .equation(
                    "P = p (1 - a h)^b; hPa, h in m",
                    new Constant("p", 1013.25, "hPa"),
                    new Constant("a", 2.25577e-5, "m-1"),
                    new Constant("b", 5.25588, "1"))
            .within(ALTITUDE)
            .accuracy("within 0.4 % of other published forms below 2000 m; weather moves pressure by 3 %");

    private static final double[] CONSTANTS = METHOD.values();

    private StandardAtmosphere1976() {}

    /** Pressure at an altitude in m, hPa. */
    public static double hPa(double altitudeM) {
        return hPa(CONSTANTS, altitudeM);
    }

    /** Whether the altitude lies within the range of this equation. */
    public static Validity validity(double altitudeM) {
        return Validity.of(ALTITUDE, altitudeM);
    }

    static double hPa(double[] c, double altitudeM) {
        return c[0] * StrictMath.pow(1 - c[1] * altitudeM, c[2]);
    }
}
