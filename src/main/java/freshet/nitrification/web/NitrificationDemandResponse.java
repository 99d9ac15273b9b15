package freshet.nitrification.web;

import freshet.nitrification.NitrificationDemand;
import freshet.quantity.Reported;
import java.util.OptionalDouble;

record NitrificationDemandResponse(
        @Reported("Oxygen consumed by nitrification") double oxygenGPerDay,

        @Reported("Sodium bicarbonate that a running farm doses: excretion of ammonia gives back about half")
        double netSodiumBicarbonateGPerDay,

        @Reported("Alkalinity consumed on the whole way from feed to nitrate, as CaCO3")
        double netAlkalinityGPerDayAsCaco3,

        @Reported("Alkalinity consumed from ammonium to nitrate (gross), as CaCO3")
        double alkalinityGPerDayAsCaco3,

        @Reported("Sodium bicarbonate that replaces the gross alkalinity")
        double sodiumBicarbonateGPerDay,

        @Reported("Carbon dioxide set free from alkalinity") double carbonDioxideGPerDay,

        @Reported("Nitrate made, as N") double no3NGPerDay,
        @Reported("Nitrifying cells grown, dry mass") double biomassGPerDay,

        @Reported("Days until the net consumption brings alkalinity to the minimum, without make-up water or dosing")
        OptionalDouble daysToAlkalinityMinimum) {

    static NitrificationDemandResponse of(NitrificationDemand demand, OptionalDouble days) {
        return new NitrificationDemandResponse(
                demand.oxygenGPerDay(),
                demand.netSodiumBicarbonateGPerDay(),
                demand.netAlkalinityGPerDayAsCaco3(),
                demand.alkalinityGPerDayAsCaco3(),
                demand.sodiumBicarbonateGPerDay(),
                demand.carbonDioxideGPerDay(),
                demand.no3NGPerDay(),
                demand.biomassGPerDay(),
                days);
    }
}
