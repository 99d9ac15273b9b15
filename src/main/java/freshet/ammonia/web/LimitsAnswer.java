package freshet.ammonia.web;

import freshet.ammonia.AmmoniaLimits;
import freshet.ammonia.AmmoniaMethod;
import freshet.ammonia.AmmoniaSpeciation;
import freshet.ammonia.Nh3Guideline;
import freshet.answer.Answer;
import freshet.answer.Notice;
import freshet.http.media.SixDigits;
import freshet.method.Validity;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** Puts together the answer on ammonia limits. */
final class LimitsAnswer {

    private final AmmoniaLimitsRequest request;
    private final DissociationChoice choice;
    private final AmmoniaLimits limits;
    private final List<Notice> notices;

    private LimitsAnswer(AmmoniaLimitsRequest request) {
        this.request = request;
        choice = DissociationChoice.of(request.sample(), request.method());
        limits = new AmmoniaLimits(request.limitMgPerL(), choice.water(), choice.dissociation());
        notices = new ArrayList<>(choice.notices());
    }

    static Answer<AmmoniaLimitsResponse> to(AmmoniaLimitsRequest request) {
        return new LimitsAnswer(request).answer();
    }

    private Answer<AmmoniaLimitsResponse> answer() {
        Nh3Guideline guideline = request.nh3Guideline();
        Validity validity = choice.validity();
        if (guideline != null) {
            validity = validity.and(
                    guideline.validity(request.sample().ph(), request.sample().temperatureC()));
            notices.add(new Notice(
                    "receiving-water-guideline",
                    "nh3_guideline",
                    guideline.method().id()
                            + " is for receiving waters: not advice for a culture tank and not a permit."));
            if (guideline.forSaltWater() != request.sample().salinity() > AmmoniaMethod.FRESH_SALINITY) {
                notices.add(new Notice(
                        "guideline-for-other-water",
                        "nh3_guideline",
                        guideline.method().id() + " is for " + (guideline.forSaltWater() ? "salt" : "fresh")
                                + " water, and salinity is "
                                + SixDigits.text(request.sample().salinity()) + "."));
            }
        }
        notices.add(new Notice(
                "limit-conditional",
                "tan_limit_mg_per_l",
                "Holds for this pH and temperature only; what fish bear depends on species, age and acclimation."));
        Double tan = request.tanMgPerL();
        AmmoniaLimitsResponse response = tan == null ? withoutTan() : withTan(tan);
        return new Answer<>(response, choice.dissociation().method(), validity, notices);
    }

    private AmmoniaLimitsResponse withoutTan() {
        return new AmmoniaLimitsResponse(
                Optional.empty(),
                limits.tanLimitMgPerL(),
                limits.nh3NLimitMgPerL(),
                printed(),
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                OptionalDouble.empty());
    }

    private AmmoniaLimitsResponse withTan(double tanMgPerL) {
        double tanLimit = limits.tanLimitMgPerL();
        AmmoniaSpeciation present = AmmoniaSpeciation.of(tanMgPerL, choice.water(), choice.dissociation());
        return new AmmoniaLimitsResponse(
                Optional.of(tanMgPerL > tanLimit),
                tanLimit,
                limits.nh3NLimitMgPerL(),
                printed(),
                OptionalDouble.of(present.nh3NMgPerL()),
                OptionalDouble.of(tanLimit - tanMgPerL),
                noticed("ph_limit", "ph-limit-not-reached", "pH 0 to 14", limits.phLimit(tanMgPerL)),
                noticed(
                        "temperature_limit_c",
                        "temperature-limit-not-reached",
                        "-2 to 60 °C",
                        limits.temperatureLimitC(tanMgPerL)));
    }

    private OptionalDouble printed() {
        Nh3Guideline guideline = request.nh3Guideline();
        return guideline == null ? OptionalDouble.empty() : OptionalDouble.of(guideline.nh3MgPerL());
    }

    private OptionalDouble noticed(String field, String code, String range, OptionalDouble limit) {
        Double tan = request.tanMgPerL();
        boolean exceeded = tan != null && tan > limits.tanLimitMgPerL();
        if (limit.isEmpty()) {
            notices.add(new Notice(
                    code,
                    field,
                    "Within " + range + " NH3-N is everywhere " + (exceeded ? "above " : "below ")
                            + SixDigits.text(limits.nh3NLimitMgPerL()) + " mg/L: there is no value where they meet."));
        }
        return limit;
    }
}
