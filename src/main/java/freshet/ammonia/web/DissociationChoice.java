package freshet.ammonia.web;

import freshet.ammonia.AmmoniaDissociation;
import freshet.ammonia.AmmoniaMethod;
import freshet.ammonia.Water;
import freshet.answer.Notice;
import freshet.method.Validity;
import freshet.quantity.Sample;
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
        return water(sample);
    }

    static Water water(Sample sample) {
        return new Water(sample.ph(), sample.temperatureC(), sample.salinity(), sample.scale());
    }

    Validity validity() {
        return dissociation.validity(sample.temperatureC(), sample.salinity());
    }

    List<Notice> notices() {
        return PhScaleNotices.of(sample, dissociation.method(), dissociation.coversSaltWater());
    }
}
