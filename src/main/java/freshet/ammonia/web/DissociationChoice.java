package freshet.ammonia.web;

import freshet.acidity.PhScale;
import freshet.ammonia.AmmoniaDissociation;
import freshet.ammonia.AmmoniaMethod;
import freshet.ammonia.Water;
import freshet.answer.Notice;
import freshet.method.Validity;
import freshet.quantity.Sample;
import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * The dissociation constant for one sample: the method the caller chose, or the default for the salinity, and what the
 * reader must know about the pH it was used with.
 */
record DissociationChoice(AmmoniaDissociation dissociation, Sample sample) {

    static final String WORDING = "Source of the dissociation constant; by default emerson-1975 up to salinity 0.5 and"
            + " clegg-whitfield-1995 above";

    static DissociationChoice of(Sample sample, @Nullable AmmoniaMethod method) {
        AmmoniaMethod chosen = method == null ? AmmoniaMethod.defaultFor(sample.salinity()) : method;
        return new DissociationChoice(chosen.dissociation(), sample);
    }

    Water water() {
        return new Water(sample.ph(), sample.temperatureC(), sample.salinity(), sample.scale());
    }

    Validity validity() {
        return dissociation.validity(sample.temperatureC(), sample.salinity());
    }

    List<Notice> notices() {
        List<Notice> notices = new ArrayList<>(2);
        if (!dissociation.coversSaltWater()) {
            if (sample.phScale() != null) {
                notices.add(new Notice(
                        "ph-scale-not-used",
                        "ph_scale",
                        dissociation.method().id() + " is for fresh water, where all pH scales agree."));
            }
        } else if (sample.salinity() > AmmoniaMethod.FRESH_SALINITY) {
            scaleNotices(notices);
        }
        return notices;
    }

    private void scaleNotices(List<Notice> notices) {
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
