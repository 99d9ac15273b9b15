package freshet.dilution.web;

import freshet.quantity.Reported;
import java.util.Optional;
import java.util.OptionalDouble;

record DilutionVolumeResponse(
        @Reported("Source water in all") double waterL,

        @Reported("Source water in all, of the volume; may exceed 100")
        double exchangePercent,

        @Reported("Number of equal exchanges") Optional<Integer> stages,
        @Reported("Water of each exchange") OptionalDouble stageL,
        @Reported("Flow of the source water") OptionalDouble flowLPerHour,
        @Reported("Duration of the exchange") OptionalDouble durationHours,
        @Reported("Concentration afterwards") double concentrationAfterMgPerL,
        @Reported("Water beyond that of one exchange") OptionalDouble extraWaterPercent) {}
