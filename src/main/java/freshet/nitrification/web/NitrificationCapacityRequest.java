package freshet.nitrification.web;

import freshet.quantity.Area;
import freshet.quantity.AtMostOneOf;
import freshet.quantity.DissolvedOxygen;
import freshet.quantity.ExactlyOneOf;
import freshet.quantity.Flat;
import freshet.quantity.FlowPerHour;
import freshet.quantity.MediaVolume;
import freshet.quantity.Percent;
import org.jspecify.annotations.Nullable;

@ExactlyOneOf({"media_area_m2", "media_volume_m3"})
@AtMostOneOf({"tan_load_g_per_day", "feed_kg_per_day"})
record NitrificationCapacityRequest(
        @Flat ReferenceInputs reference,

        @Area("Surface of the media; not for floating-bead and fluidized-sand") @Nullable
        Double mediaAreaM2,

        @MediaVolume @Nullable Double mediaVolumeM3,
        @Flat WaterInputs conditions,
        @Flat LoadInputs inflow,

        @FlowPerHour("Water through the filter") @Nullable Double biofilterFlowLPerHour,

        @Percent("Total ammonia removed in one pass; by default 50; only with biofilter_flow_l_per_hour") @Nullable
        Double removalPerPassPercent,

        @DissolvedOxygen("Oxygen of the water entering media that are not aerated; only with biofilter_flow_l_per_hour")
        @Nullable
        Double inflowDissolvedOxygenMgPerL) {}
