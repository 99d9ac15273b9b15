package freshet.carbonate;

import freshet.acidity.DicksonRiley1979;
import freshet.acidity.SeaSalt;
import freshet.method.Citation;
import freshet.method.Method;
import freshet.method.Seen;

/**
 * What a probe calibrated on NBS buffers reads from fresh to sea water: activity of the hydrogen ion over its
 * concentration on the seawater scale. Either branch is published; to take the greater is a construction of this project,
 * which is continuous since the branches cross near salinity 6.
 */
public final class ProbeActivity {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "probe-activity",
                    "Reading of a probe on NBS buffers from fresh to sea water",
                    Citation.withoutDoi(
                            "Davies 1962; Takahashi et al. 1982",
                            "A construction of this project: the activity coefficient of Davies 1962 over the seawater scale's"
                                    + " ratio in dilute water, Takahashi et al. 1982 above salinity 6, whichever is greater"),
                    Seen.SECONDARY)
            .equation("fH = max(gamma_H/([H]SWS/[H]F), fH of takahashi-1982 if S > 6); pH(SWS) = pH(NBS) + log10 fH")
            .accuracy("±0.1 in pH in brackish water, ±0.05 to 0.1 between probes in sea water")
            .uses(Davies1962.METHOD, Takahashi1982.METHOD);

    private ProbeActivity() {}

    /** Activity over concentration at °C and practical salinity; 1 at salinity 0. */
    public static double activityPerHydrogen(double temperatureC, double salinity) {
        double gamma = StrictMath.pow(10, Davies1962.logGamma(1, temperatureC, SeaSalt.ionicStrength(salinity)));
        double dilute = gamma / DicksonRiley1979.seawaterPerFree(temperatureC, salinity);
        return salinity > Takahashi1982.LEAST_SALINITY
                ? Math.max(dilute, Takahashi1982.activityPerHydrogen(temperatureC, salinity))
                : dilute;
    }
}
