package freshet.nitrification.web;

import freshet.answer.Answer;
import freshet.answer.Notice;
import freshet.nitrification.LoadMethod;
import freshet.nitrification.NitrogenBalance;
import freshet.nitrification.ProteinCoefficient;
import freshet.nitrification.Ration;
import freshet.nitrification.Spread;
import java.util.ArrayList;
import java.util.List;

/** Puts together the answer on the ammonia that feed gives. */
final class LoadAnswer {

    private LoadAnswer() {}

    static Answer<NitrificationLoadResponse> to(NitrificationLoadRequest request) {
        Ration ration = request.ration();
        Spread tan = request.method() == LoadMethod.PROTEIN_COEFFICIENT
                ? ProteinCoefficient.published().tanGPerDay(ration, Boolean.TRUE.equals(request.solidsRetained()))
                : NitrogenBalance.published().tanGPerDay(ration, request.fate());
        return new Answer<>(
                NitrificationLoadResponse.of(tan, request.meals(), ration),
                request.method().method(),
                ration.validity(),
                notices(request));
    }

    private static List<Notice> notices(NitrificationLoadRequest request) {
        List<Notice> notices = new ArrayList<>(1);
        if (request.feedKgPerDay() > 0) {
            notices.add(
                    new Notice(
                            "published-spread",
                            "tan_g_per_day",
                            "Lower and upper span published figures; they are no confidence interval. Measure TAN over a day."));
        }
        notices.addAll(notUsed(request).notices());
        return notices;
    }

    private static InputNotUsed notUsed(NitrificationLoadRequest request) {
        if (request.method() == LoadMethod.NITROGEN_BALANCE) {
            InputNotUsed notUsed = new InputNotUsed()
                    .because(
                            "nitrogen-balance has waste_mineralized_percent",
                            "solids_retained",
                            request.solidsRetained());
            return request.feedConversionRatio() != null
                    ? notUsed
                    : notUsed.because(
                            "it needs feed_conversion_ratio", "fish_nitrogen_g_per_g", request.fishNitrogenGPerG());
        }
        String reason = "it belongs to method nitrogen-balance";
        return new InputNotUsed()
                .because(reason, "feed_eaten_percent", request.feedEatenPercent())
                .because(reason, "protein_digestibility_percent", request.proteinDigestibilityPercent())
                .because(reason, "nitrogen_retained_percent", request.nitrogenRetainedPercent())
                .because(reason, "feed_conversion_ratio", request.feedConversionRatio())
                .because(reason, "fish_nitrogen_g_per_g", request.fishNitrogenGPerG())
                .because(reason, "ammonia_share_percent", request.ammoniaSharePercent())
                .because(reason, "waste_mineralized_percent", request.wasteMineralizedPercent());
    }
}
