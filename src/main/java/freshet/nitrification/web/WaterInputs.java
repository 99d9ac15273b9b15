package freshet.nitrification.web;

import freshet.nitrification.FilterWater;
import freshet.nitrification.TemperatureMethod;
import freshet.quantity.Alkalinity;
import freshet.quantity.Choice;
import freshet.quantity.Default;
import freshet.quantity.DissolvedOxygen;
import freshet.quantity.MassRatio;
import freshet.quantity.Ph;
import freshet.quantity.Salinity;
import freshet.quantity.Temperature;
import freshet.quantity.TotalAmmonia;
import jakarta.validation.constraints.NotNull;

/** The water of the filter. */
record WaterInputs(
        @NotNull @Ph("pH of the water (NBS)") Double ph,

        @NotNull @Temperature Double temperatureC,

        @Default("0") @Salinity Double salinity,

        @NotNull @TotalAmmonia("Total ammonia as N of the water entering the filter")
        Double tanMgPerL,

        @NotNull @DissolvedOxygen("Oxygen at the media: of the water leaving media that are not aerated")
        Double dissolvedOxygenMgPerL,

        @NotNull @Alkalinity Double alkalinityMgPerLAsCaco3,

        @MassRatio("Biodegradable organic carbon per total ammonia nitrogen, g/g; not with a measured rate")
        @Default("0")
        Double carbonToNitrogen,

        @Choice("How the rate follows temperature") @Default("guarded-arrhenius")
        TemperatureMethod temperatureMethod) {

    FilterWater water() {
        return new FilterWater(
                ph,
                temperatureC,
                salinity,
                tanMgPerL,
                dissolvedOxygenMgPerL,
                alkalinityMgPerLAsCaco3,
                carbonToNitrogen);
    }
}
