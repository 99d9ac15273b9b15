package freshet.nitrite.web;

import freshet.answer.Answer;
import freshet.answer.Notice;
import freshet.http.media.SixDigits;
import freshet.nitrite.NitriteSpeciation;
import freshet.nitrite.NitrousAcidDissociation;
import freshet.nitrite.NitrousAcidInhibition;
import freshet.quantity.Sample;
import java.util.ArrayList;
import java.util.List;

/** Puts together the answer on nitrous acid. */
final class SpeciationAnswer {

    private SpeciationAnswer() {}

    static Answer<NitriteSpeciationResponse> to(NitriteSpeciationRequest request) {
        Sample sample = request.sample();
        NitrousAcidDissociation dissociation = request.method().dissociation();
        NitriteSpeciation speciation =
                NitriteSpeciation.of(request.no2NMgPerL(), sample.ph(), sample.temperatureC(), dissociation);
        List<Notice> notices = new ArrayList<>(0);
        if (NitrousAcidInhibition.published().reachedBy(speciation.hno2NMgPerL())) {
            notices.add(inhibition(NitrousAcidInhibition.published()));
        }
        if (sample.phScale() != null) {
            notices.add(new Notice(
                    "ph-scale-not-used",
                    "ph_scale",
                    dissociation.method().id() + " is for fresh water, where all pH scales agree."));
        }
        return new Answer<>(
                NitriteSpeciationResponse.of(speciation),
                dissociation.method(),
                dissociation.validity(sample.temperatureC(), sample.salinity()),
                notices);
    }

    private static Notice inhibition(NitrousAcidInhibition published) {
        return new Notice(
                "inhibits-nitrifiers",
                "hno2_n_mg_per_l",
                "HNO2 slows nitrifiers: nitrite oxidation by half at " + range(published.nitriteOxidationMicromolar())
                        + " umol/L, ammonia oxidation at " + SixDigits.text(published.ammoniaOxidationMicromolar())
                        + "; elsewhere " + range(published.thresholdsMgPerLAsHno2()) + " mg/L as HNO2.");
    }

    private static String range(double[] ends) {
        return SixDigits.text(ends[0]) + " to " + SixDigits.text(ends[1]);
    }
}
