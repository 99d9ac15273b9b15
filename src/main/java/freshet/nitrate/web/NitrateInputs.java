package freshet.nitrate.web;

import freshet.answer.Notice;
import freshet.http.media.SixDigits;
import freshet.method.Validity;
import freshet.nitrate.MixedTank;
import freshet.nitrate.NitrateFromFeed;
import freshet.nitrate.NitrateSources;
import freshet.nitrification.Ration;
import freshet.quantity.Area;
import freshet.quantity.ArealRate;
import freshet.quantity.Default;
import freshet.quantity.ExactlyOneOf;
import freshet.quantity.Feed;
import freshet.quantity.FlowPerDay;
import freshet.quantity.Horizon;
import freshet.quantity.Load;
import freshet.quantity.Nitrate;
import freshet.quantity.Percent;
import freshet.quantity.Together;
import freshet.quantity.Volume;
import jakarta.validation.constraints.NotNull;
import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;

@ExactlyOneOf({"no3_n_production_g_per_day", "feed_kg_per_day"})
@Together(given = "feed_kg_per_day", needs = "protein_percent")
record NitrateInputs(
        @NotNull @Volume Double volumeL,
        @NotNull @Nitrate("Nitrate of the tank now, as N") Double no3NMgPerL,

        @Load("Nitrate made by nitrification, as N") @Nullable
        Double no3NProductionGPerDay,

        @Feed @Nullable Double feedKgPerDay,

        @Percent("Crude protein of the feed as fed; needed with the feed") @Nullable
        Double proteinPercent,

        @Default("0") @FlowPerDay("Water discharged and replaced")
        Double exchangeLPerDay,

        @Default("0") @FlowPerDay("Evaporation that is topped up; removes no nitrate")
        Double evaporationLPerDay,

        @Default("0") @Nitrate("Nitrate of the water that replaces and tops up, as N")
        Double sourceNo3NMgPerL,

        @Default("0") @Area("Area of plants that take up nitrate")
        Double plantAreaM2,

        @Default("0.3") @ArealRate("Nitrate nitrogen the plants take up: leafy 0.1 to 0.6, fruiting 0.3 to 0.8")
        Double plantNo3NUptakeGPerM2PerDay,

        @Default("0") @Percent("Share of the production that is denitrified")
        Double denitrifiedPercent,

        @Default("30") @Horizon Double horizonDays,
        @Nitrate("Limit of nitrate, as N") @Nullable Double no3NLimitMgPerL) {

    MixedTank tank() {
        return new MixedTank(
                volumeL,
                no3NMgPerL,
                new NitrateSources(
                        productionGPerDay(),
                        denitrifiedPercent / 100,
                        plantAreaM2 * plantNo3NUptakeGPerM2PerDay,
                        exchangeLPerDay,
                        evaporationLPerDay,
                        sourceNo3NMgPerL));
    }

    List<Notice> notices(MixedTank tank) {
        List<Notice> notices = new ArrayList<>();
        tank.daysToNothing()
                .ifPresent(days -> notices.add(new Notice(
                        "sinks-exceed-sources",
                        "plateau_no3_n_mg_per_l",
                        "The sinks take more than the sources bring: nitrate is gone after " + SixDigits.text(days)
                                + " days and stays 0.")));
        if (tank.plateauMgPerL().isEmpty()) {
            notices.add(new Notice(
                    "no-plateau",
                    "plateau_no3_n_mg_per_l",
                    "Without exchange nitrate rises as long as it is produced."));
        }
        if (feedKgPerDay == null && proteinPercent != null) {
            notices.add(new Notice("input-not-used", "protein_percent", "It belongs to feed_kg_per_day."));
        }
        return notices;
    }

    /** Whether the feed, if there is one, lies within the range of the method that turns it into nitrate. */
    Validity validity() {
        return feedKgPerDay == null || proteinPercent == null
                ? Validity.WITHIN
                : new Ration(feedKgPerDay, proteinPercent).validity();
    }

    private double productionGPerDay() {
        if (no3NProductionGPerDay != null) {
            return no3NProductionGPerDay;
        }
        return feedKgPerDay == null || proteinPercent == null
                ? 0
                : NitrateFromFeed.gPerDay(feedKgPerDay, proteinPercent);
    }
}
