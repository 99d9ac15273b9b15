package freshet.ammonia.web;

import freshet.acidity.PhScale;
import freshet.ammonia.AmmoniaMethod;
import freshet.answer.Notice;
import freshet.method.Method;
import freshet.quantity.Sample;
import java.util.ArrayList;
import java.util.List;

/** What the reader must know about the scale of the pH that a method was used with. */
final class PhScaleNotices {

    private PhScaleNotices() {}

    static List<Notice> of(Sample sample, Method method, boolean forSaltWater) {
        List<Notice> notices = new ArrayList<>(2);
        if (!forSaltWater) {
            if (sample.phScale() != null) {
                notices.add(new Notice(
                        "ph-scale-not-used",
                        "ph_scale",
                        method.id() + " is for fresh water, where all pH scales agree."));
            }
        } else if (sample.salinity() > AmmoniaMethod.FRESH_SALINITY) {
            inSalineWater(sample, notices);
        }
        return notices;
    }

    private static void inSalineWater(Sample sample, List<Notice> notices) {
        if (sample.phScale() == null) {
            notices.add(new Notice(
                    "ph-scale-assumed-nbs",
                    "ph_scale",
                    "ph was taken as a reading of a probe on NBS or IUPAC buffers."));
        }
        if (sample.scale() == PhScale.NBS) {
            notices.add(
                    new Notice(
                            "nbs-in-saline-water",
                            "ph",
                            "NH3 from an NBS pH in saline water reads high: up to 30 % at salinity 2 to 20, about 10 % in sea water."));
        }
    }
}
