package freshet.nitrification.web;

import freshet.nitrification.Meals;
import freshet.nitrification.Ration;
import freshet.nitrification.TanLoad;
import freshet.quantity.Choice;
import freshet.quantity.Feed;
import freshet.quantity.Load;
import freshet.quantity.Percent;
import freshet.quantity.Together;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/** The load of the filter: total ammonia, or the feed it comes from. */
@Together(given = "feed_kg_per_day", needs = "protein_percent")
record LoadInputs(
        @Load("Total ammonia that the filter must oxidize, as N, daily mean") @Nullable
        Double tanLoadGPerDay,

        @Feed @Nullable Double feedKgPerDay,

        @Percent("Crude protein in the feed, as fed") @Nullable
        Double proteinPercent,

        @Choice("How feed is spread over the day; by default several; only with feed_kg_per_day") @Nullable
        Meals meals) {

    /** The load; empty if none was given. */
    Optional<TanLoad> load() {
        Double tan = tanLoadGPerDay;
        Double feed = feedKgPerDay;
        Double protein = proteinPercent;
        if (feed != null && protein != null) {
            return Optional.of(TanLoad.of(new Ration(feed, protein), meals == null ? Meals.SEVERAL : meals));
        }
        return tan == null ? Optional.empty() : Optional.of(TanLoad.given(tan));
    }

    /** Whether protein was given and nothing that it could belong to. */
    boolean proteinAlone() {
        return proteinPercent != null && tanLoadGPerDay == null && feedKgPerDay == null;
    }

    /** Notes what belongs to feed that was not given. */
    void noteUnused(InputNotUsed notUsed) {
        if (feedKgPerDay == null) {
            notUsed.because("it belongs to feed_kg_per_day, which was not given", "protein_percent", proteinPercent)
                    .because("it belongs to feed_kg_per_day, which was not given", "meals", meals);
        }
    }
}
