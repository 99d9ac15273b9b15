package freshet.dilution.web;

import freshet.dilution.ConcentrationChange;
import freshet.dilution.DilutionMode;
import freshet.quantity.Choice;
import freshet.quantity.Concentration;
import freshet.quantity.Default;
import freshet.quantity.Duration;
import freshet.quantity.FlowPerHour;
import freshet.quantity.Percent;
import freshet.quantity.Volume;
import jakarta.validation.constraints.NotNull;
import org.jspecify.annotations.Nullable;

record DilutionVolumeRequest(
        @NotNull @Volume Double volumeL,

        @NotNull @Concentration("Concentration now; one basis for all three")
        Double concentrationMgPerL,

        @NotNull @Concentration("Wanted concentration") Double targetMgPerL,

        @Default("0") @Concentration("Concentration of the source water")
        Double sourceMgPerL,

        @Default("single") @Choice("How the water is exchanged")
        DilutionMode mode,

        @Percent("Largest share of the volume in one stage; needed with mode=staged") @Nullable
        Double maxStagePercent,

        @FlowPerHour("Flow of the source water; with mode=continuous either this or the duration") @Nullable
        Double flowLPerHour,

        @Duration("Duration of the exchange; with mode=continuous either this or the flow") @Nullable
        Double durationHours) {

    ConcentrationChange change() {
        return new ConcentrationChange(volumeL, concentrationMgPerL, targetMgPerL, sourceMgPerL);
    }
}
