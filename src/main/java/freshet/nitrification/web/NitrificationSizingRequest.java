package freshet.nitrification.web;

import freshet.quantity.DissolvedOxygen;
import freshet.quantity.ExactlyOneOf;
import freshet.quantity.Flat;
import freshet.quantity.Percent;
import freshet.quantity.SafetyFactor;
import org.jspecify.annotations.Nullable;

@ExactlyOneOf({"tan_load_g_per_day", "feed_kg_per_day"})
record NitrificationSizingRequest(
        @Flat ReferenceInputs reference,
        @Flat LoadInputs inflow,
        @Flat WaterInputs conditions,

        @SafetyFactor(
                "Factor by which the mean load is multiplied; by default 1.5; the daily peak of the meals where that is"
                        + " higher")
        @Nullable
        Double safetyFactor,

        @Percent("Total ammonia removed in one pass; by default 50") @Nullable
        Double removalPerPassPercent,

        @DissolvedOxygen("Oxygen of the water entering media that are not aerated") @Nullable
        Double inflowDissolvedOxygenMgPerL) {}
