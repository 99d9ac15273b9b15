package freshet.dilution.web;

import freshet.dilution.SafeExchange;
import freshet.quantity.Reported;
import java.util.Optional;
import java.util.OptionalDouble;

record DilutionBlendResponse(
        @Reported(
                "Largest share of source water in the full tank that keeps within the limits of NH3, pH and temperature, which"
                        + " alone are judged; 0 with chlorine in the source")
        double largestSafeExchangePercent,

        @Reported("What a larger one would overstep; left out where chlorine forbids any")
        Optional<SafeExchange.Limit> limitedBy,

        @Reported("Un-ionized ammonia as N in the tank before")
        OptionalDouble nh3NBeforeMgPerL,

        @Reported("Un-ionized ammonia as N in the mixture, closed to the air")
        OptionalDouble nh3NMgPerL,

        @Reported("Un-ionized ammonia as N in the mixture when carbon dioxide has settled")
        OptionalDouble nh3NSettledMgPerL,

        @Reported("pH of the tank before") double phBefore,
        @Reported("pH of the mixture, closed to the air") double ph,

        @Reported("pH of the mixture when carbon dioxide has settled")
        double phSettled,

        @Reported("Change of pH from before, mixed or settled, whichever is greater")
        double phChange,

        @Reported("Change of temperature from before") double temperatureChangeC,
        @Reported("Volume of the mixture") double volumeL,

        @Reported("Source water in the mixture") double exchangePercent,
        @Reported("Temperature of the mixture") double temperatureC,
        @Reported("Practical salinity of the mixture") double salinity,

        @Reported("Total alkalinity of the mixture as CaCO3")
        double alkalinityMgPerLAsCaco3,

        @Reported("Dissolved inorganic carbon of the mixture")
        double inorganicCarbonMmolPerL,

        @Reported("Dissolved carbon dioxide of the mixture") double co2MgPerL,
        @Reported("Total ammonia of the mixture as N") OptionalDouble tanMgPerL,
        @Reported("Nitrite of the mixture as N") OptionalDouble no2NMgPerL,
        @Reported("Nitrate of the mixture as N") OptionalDouble no3NMgPerL,
        @Reported("Calcium of the mixture") OptionalDouble calciumMgPerL,

        @Reported("Free chlorine of the mixture as Cl2, as if nothing consumed it")
        OptionalDouble chlorineMgPerLAsCl2,

        @Reported("Chloramine of the mixture as Cl2, as if nothing consumed it")
        OptionalDouble chloramineMgPerLAsCl2,

        @Reported("Sodium thiosulfate pentahydrate for the chlorine of the source water, before it is mixed")
        OptionalDouble thiosulfatePentahydrateG) {}
