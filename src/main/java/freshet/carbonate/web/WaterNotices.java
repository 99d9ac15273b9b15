package freshet.carbonate.web;

import freshet.acidity.PhScale;
import freshet.ammonia.AmmoniaMethod;
import freshet.answer.Notice;
import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;

/** What the reader must know of a pH and a salinity that the carbonate system was solved with. */
final class WaterNotices {

    private static final double HARD_MG_PER_L = 100;
    private static final double LOW_MG_PER_L = 10;
    private static final double LOW_PH = 6;

    private WaterNotices() {}

    /** {@code ph} is null where it was not given. */
    static List<Notice> of(double salinity, @Nullable PhScale scale, double alkalinityMgPerL, @Nullable Double ph) {
        List<Notice> notices = new ArrayList<>(2);
        if (salinity > AmmoniaMethod.FRESH_SALINITY && scale == null) {
            notices.add(new Notice(
                    "ph-scale-assumed-nbs",
                    "ph_scale",
                    "ph was taken as a reading of a probe on NBS or IUPAC buffers."));
        }
        if (salinity > AmmoniaMethod.FRESH_SALINITY && (scale == null || scale == PhScale.NBS)) {
            notices.add(new Notice(
                    "nbs-in-saline-water",
                    "ph",
                    "In brackish water such a probe is uncertain by 0.1 in pH, CO2 by 26 %; NH3 from it reads high."));
        }
        if (salinity < AmmoniaMethod.FRESH_SALINITY && alkalinityMgPerL > HARD_MG_PER_L) {
            notices.add(
                    new Notice(
                            "ionic-strength-unknown",
                            "salinity",
                            "Hard water at salinity 0 is solved as infinitely dilute: at 200 and 400 mg/L pH may be off by 0.02 and 0.05, CO2 by 7 and 11 %, a calcite index by +0.2."));
        }
        if (ph != null && (ph < LOW_PH || alkalinityMgPerL < LOW_MG_PER_L)) {
            notices.add(
                    new Notice(
                            "uncertain-at-low-alkalinity",
                            "ph",
                            "Below pH 6 or 10 mg/L of alkalinity what follows from pH is uncertain, and mineral acid passes for CO2."));
        }
        return notices;
    }
}
