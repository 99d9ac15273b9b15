package freshet.carbonate.web;

import freshet.quantity.Reported;
import java.util.OptionalDouble;

record CarbonateSpeciationResponse(
        @Reported("pH on the scale of the request") double ph,

        @Reported("Dissolved carbon dioxide, with carbonic acid")
        double co2MgPerL,

        @Reported("Total alkalinity as CaCO3") double alkalinityMgPerLAsCaco3,

        @Reported("Dissolved inorganic carbon") double inorganicCarbonMmolPerL,
        @Reported("Bicarbonate") double hco3MgPerL,
        @Reported("Carbonate") double co3MgPerL,

        @Reported("Logarithm of the saturation with calcite: above 0 it can precipitate, below 0 dissolve")
        OptionalDouble calciteSaturationIndex) {}
