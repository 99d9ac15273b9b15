package freshet.nitrification.web;

import freshet.nitrification.LoadMethod;
import freshet.nitrification.Meals;
import freshet.nitrification.NitrogenFate;
import freshet.nitrification.Ration;
import freshet.quantity.AtMostOneOf;
import freshet.quantity.Choice;
import freshet.quantity.Default;
import freshet.quantity.Feed;
import freshet.quantity.FeedConversion;
import freshet.quantity.FishNitrogen;
import freshet.quantity.Flag;
import freshet.quantity.Percent;
import jakarta.validation.constraints.NotNull;
import org.jspecify.annotations.Nullable;

@AtMostOneOf({"nitrogen_retained_percent", "feed_conversion_ratio"})
record NitrificationLoadRequest(
        @NotNull @Feed Double feedKgPerDay,

        @NotNull @Percent("Crude protein in the feed, as fed")
        Double proteinPercent,

        @Choice("How ammonia follows from feed") @Default("protein-coefficient")
        LoadMethod method,

        @Flag("Whether solids stay in the water and decay there; by default false; only with protein-coefficient")
        @Nullable
        Boolean solidsRetained,

        @Percent("Share of the feed that is eaten; by default 98; only with nitrogen-balance") @Nullable
        Double feedEatenPercent,

        @Percent("Digested share of the protein eaten; by default 88; only with nitrogen-balance") @Nullable
        Double proteinDigestibilityPercent,

        @Percent("Nitrogen kept in growth, of that eaten; by default 30; only with nitrogen-balance") @Nullable
        Double nitrogenRetainedPercent,

        @FeedConversion("Feed per gain in weight, in place of the share retained; only with nitrogen-balance") @Nullable
        Double feedConversionRatio,

        @FishNitrogen("Nitrogen in fish, wet weight; by default 0.0275; only with feed_conversion_ratio") @Nullable
        Double fishNitrogenGPerG,

        @Percent("Ammonia in the dissolved nitrogen given off; by default 85; only with nitrogen-balance") @Nullable
        Double ammoniaSharePercent,

        @Percent("Share of faeces and waste feed that decays in the water; by default 0; only with nitrogen-balance")
        @Nullable
        Double wasteMineralizedPercent,

        @Choice("How feed is spread over the day: over 16 hours or more, two to four meals, one meal")
        @Default("several")
        Meals meals) {

    Ration ration() {
        return new Ration(feedKgPerDay, proteinPercent);
    }

    NitrogenFate fate() {
        return new NitrogenFate(
                Optionals.share(feedEatenPercent),
                Optionals.share(proteinDigestibilityPercent),
                Optionals.share(nitrogenRetainedPercent),
                Optionals.of(feedConversionRatio),
                Optionals.of(fishNitrogenGPerG),
                Optionals.share(ammoniaSharePercent),
                Optionals.share(wasteMineralizedPercent));
    }
}
