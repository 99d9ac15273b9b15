package freshet.ammonia.web;

import freshet.ammonia.AmmoniaCriterion;
import freshet.ammonia.SensitiveLife;
import freshet.ammonia.Water;
import freshet.answer.Answer;
import freshet.answer.Notice;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import java.util.Set;

/** Puts together the answer on criteria of total ammonia. */
final class CriteriaAnswer {

    private final AmmoniaCriteriaRequest request;
    private final AmmoniaCriterion criterion;
    private final Set<SensitiveLife> present;
    private final List<Notice> notices = new ArrayList<>();

    private CriteriaAnswer(AmmoniaCriteriaRequest request) {
        this.request = request;
        criterion = request.guideline().criterion();
        present = request.present();
    }

    static Answer<AmmoniaCriteriaResponse> to(AmmoniaCriteriaRequest request) {
        return new CriteriaAnswer(request).answer();
    }

    private Answer<AmmoniaCriteriaResponse> answer() {
        Water water = DissociationChoice.water(request.sample());
        double acute = criterion.acuteTanMgPerL(water, present);
        double chronic = criterion.chronicTanMgPerL(water, present);
        OptionalDouble fourDay = criterion.chronicFourDayTanMgPerL(water, present);
        AmmoniaCriteriaResponse response = new AmmoniaCriteriaResponse(
                acute,
                chronic,
                fourDay,
                criterion.acuteAveragingHours(),
                criterion.chronicAveragingDays(),
                quotient(acute),
                quotient(chronic));
        noteThePurpose();
        noteWhatWasNotUsed();
        noteTheConditions(acute, chronic);
        if (chronic > acute) {
            notices.add(new Notice(
                    "chronic-above-acute",
                    "chronic_tan_mg_per_l",
                    "The published forms for these animals cross here: the acute criterion is the stricter one."));
        }
        if (fourDay.isEmpty()) {
            notices.add(new Notice(
                    "no-four-day-criterion",
                    "chronic_four_day_tan_mg_per_l",
                    criterion.method().id() + " has none: its chronic criterion is an average of four days."));
        }
        return new Answer<>(response, criterion.method(), criterion.validity(water), notices);
    }

    private OptionalDouble quotient(double criterionMgPerL) {
        Double tan = request.tanMgPerL();
        return tan == null ? OptionalDouble.empty() : OptionalDouble.of(tan / criterionMgPerL);
    }

    private void noteThePurpose() {
        notices.add(new Notice(
                "receiving-water-guideline",
                "guideline",
                criterion.method().id() + " is for receiving waters: not advice for a culture tank and not a permit."));
    }

    private void noteWhatWasNotUsed() {
        Set<SensitiveLife> heeded = criterion.heeded(present);
        for (SensitiveLife life : SensitiveLife.values()) {
            if (request.said(life) != null && !heeded.contains(life)) {
                notUsed(life.name().toLowerCase(Locale.ROOT) + "_present");
            }
        }
        if (!criterion.forSaltWater() && request.sample().salinity() > 0) {
            notUsed("salinity");
        }
    }

    private void notUsed(String field) {
        notices.add(new Notice(
                "input-not-used",
                field,
                field + " was not used: no number of " + criterion.method().id() + " depends on it here."));
    }

    private void noteTheConditions(double acute, double chronic) {
        notices.addAll(PhScaleNotices.of(request.sample(), criterion.method(), criterion.forSaltWater()));
        notices.add(new Notice(
                "limit-conditional",
                "acute_tan_mg_per_l",
                "Holds for this pH and temperature only. Regulations compare to two figures: acute "
                        + TwoFigures.text(acute) + ", chronic " + TwoFigures.text(chronic) + " mg/L."));
    }
}
