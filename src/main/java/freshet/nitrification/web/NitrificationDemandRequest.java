package freshet.nitrification.web;

import freshet.nitrification.Stoichiometry;
import freshet.quantity.Alkalinity;
import freshet.quantity.Choice;
import freshet.quantity.Default;
import freshet.quantity.ExactlyOneOf;
import freshet.quantity.Feed;
import freshet.quantity.Load;
import freshet.quantity.Percent;
import freshet.quantity.Together;
import freshet.quantity.Volume;
import org.jspecify.annotations.Nullable;

@ExactlyOneOf({"tan_oxidized_g_per_day", "feed_kg_per_day"})
@Together(given = "feed_kg_per_day", needs = "protein_percent")
record NitrificationDemandRequest(
        @Load("Total ammonia oxidized, as N") @Nullable Double tanOxidizedGPerDay,

        @Feed @Nullable Double feedKgPerDay,

        @Percent("Crude protein in the feed, as fed") @Nullable
        Double proteinPercent,

        @Choice("Equation of nitrification: without growth of cells, or one of two with growth") @Default("catabolic")
        Stoichiometry stoichiometry,

        @Volume("Volume of water in the whole system") @Nullable
        Double volumeL,

        @Alkalinity("Total alkalinity now, as CaCO3") @Nullable
        Double alkalinityMgPerLAsCaco3,

        @Alkalinity("Alkalinity that must remain, as CaCO3") @Default("70")
        Double alkalinityMinimumMgPerLAsCaco3) {}
