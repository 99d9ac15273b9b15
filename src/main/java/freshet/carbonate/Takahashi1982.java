package freshet.carbonate;

import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Range;
import freshet.method.Seen;
import freshet.substance.Temperature;

/**
 * Apparent activity coefficient of the hydrogen ion in sea water, for a probe calibrated on NBS buffers: activity over
 * concentration on the seawater scale.
 *
 * <p>Takahashi T., Williams R.T., Bos D.L. (1982) Carbonate chemistry. GEOSECS Pacific Expedition vol. 3, after Culberson
 * and Pytkowicz 1973. It has no fresh-water limit and is not for salinity below about 6; probes differ by 0.05 to 0.1.
 */
public final class Takahashi1982 {

    /** Salinity above which it may be used. */
    public static final double LEAST_SALINITY = 6;

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "takahashi-1982",
                    "Reading of a probe on NBS buffers in sea water",
                    Citation.withoutDoi(
                            "Takahashi et al. 1982",
                            "Takahashi T., Williams R.T., Bos D.L. (1982) Carbonate chemistry. In: GEOSECS Pacific Expedition,"
                                    + " vol. 3, Hydrographic data 1973-1974, 77-83"),
                    Seen.SECONDARY)
            .equation(
                    "fH = a - b T + (c - d T) S^2; activity of H+ over [H+] on the seawater scale, T in K",
                    new Constant("a", 1.2948, "1"),
                    new Constant("b", 0.002036, "K-1"),
                    new Constant("c", 0.0004607, "1"),
                    new Constant("d", 1.475e-6, "K-1"))
            .within(new Range("salinity", 6, 45, "1"))
            .accuracy(
                    "old and uncertain: the liquid junctions of probes alone differ by 0.05 to 0.1 in pH; 7.853336 on the"
                            + " seawater scale for 8.0 at salinity 35, 25 °C is reproduced")
            .errata("without a fresh-water limit: at salinity 0 it would be wrong by 0.16 in pH");

    private static final double[] CONSTANTS = METHOD.values();

    private Takahashi1982() {}

    /** Activity over concentration at °C and practical salinity. */
    public static double activityPerHydrogen(double temperatureC, double salinity) {
        return activityPerHydrogen(CONSTANTS, temperatureC, salinity);
    }

    static double activityPerHydrogen(double[] c, double temperatureC, double salinity) {
        double t = Temperature.kelvin(temperatureC);
        return c[0] - c[1] * t + (c[2] - c[3] * t) * salinity * salinity;
    }
}
