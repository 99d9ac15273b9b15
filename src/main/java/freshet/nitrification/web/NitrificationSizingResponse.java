package freshet.nitrification.web;

import freshet.nitrification.BiofilterSizing;
import freshet.quantity.Reported;
import java.util.OptionalDouble;

record NitrificationSizingResponse(
        @Reported("Surface of media needed") OptionalDouble mediaAreaM2,

        @Reported("The same at the upper rate: the optimistic end")
        OptionalDouble mediaAreaLowerM2,

        @Reported("The same at the lower rate: the cautious end")
        OptionalDouble mediaAreaUpperM2,

        @Reported("Bulk volume of media needed") OptionalDouble mediaVolumeM3,

        @Reported("The same at the upper rate: the optimistic end")
        OptionalDouble mediaVolumeLowerM3,

        @Reported("The same at the lower rate: the cautious end")
        OptionalDouble mediaVolumeUpperM3,

        @Reported("Water through the filter") double biofilterFlowLPerHour) {

    static NitrificationSizingResponse of(BiofilterSizing sizing) {
        return new NitrificationSizingResponse(
                sizing.areaM2(sizing.amount()),
                sizing.areaM2(sizing.lower()),
                sizing.areaM2(sizing.upper()),
                sizing.volumeM3(sizing.amount()),
                sizing.volumeM3(sizing.lower()),
                sizing.volumeM3(sizing.upper()),
                sizing.flowLPerHour());
    }
}
