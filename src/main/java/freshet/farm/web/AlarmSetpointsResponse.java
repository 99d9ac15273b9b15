package freshet.farm.web;

import freshet.quantity.Reported;
import java.util.OptionalDouble;

record AlarmSetpointsResponse(
        @Reported("High alarm of total ammonia as N") OptionalDouble tanHighMgPerL,
        @Reported("High-high alarm of total ammonia as N") OptionalDouble tanHighHighMgPerL,

        @Reported("Deadband of the alarms of total ammonia as N")
        OptionalDouble tanDeadbandMgPerL,

        @Reported("High alarm of nitrite as N") OptionalDouble no2NHighMgPerL,
        @Reported("High-high alarm of nitrite as N") OptionalDouble no2NHighHighMgPerL,
        @Reported("Deadband of the alarms of nitrite as N") OptionalDouble no2NDeadbandMgPerL,
        @Reported("High alarm of nitrate as N") OptionalDouble no3NHighMgPerL,
        @Reported("High-high alarm of nitrate as N") OptionalDouble no3NHighHighMgPerL,
        @Reported("Deadband of the alarms of nitrate as N") OptionalDouble no3NDeadbandMgPerL,
        @Reported("Low-low alarm of pH") OptionalDouble phLowLow,
        @Reported("Low alarm of pH") OptionalDouble phLow,
        @Reported("High alarm of pH") OptionalDouble phHigh,
        @Reported("High-high alarm of pH") OptionalDouble phHighHigh,
        @Reported("Deadband of the alarms of pH") OptionalDouble phDeadband,
        @Reported("Low-low alarm of temperature") OptionalDouble temperatureLowLowC,
        @Reported("Low alarm of temperature") OptionalDouble temperatureLowC,
        @Reported("High alarm of temperature") OptionalDouble temperatureHighC,
        @Reported("High-high alarm of temperature") OptionalDouble temperatureHighHighC,
        @Reported("Deadband of the alarms of temperature") OptionalDouble temperatureDeadbandC,
        @Reported("Low-low alarm of dissolved oxygen") OptionalDouble dissolvedOxygenLowLowMgPerL,
        @Reported("Low alarm of dissolved oxygen") OptionalDouble dissolvedOxygenLowMgPerL,

        @Reported("Deadband of the alarms of dissolved oxygen")
        OptionalDouble dissolvedOxygenDeadbandMgPerL,

        @Reported("Low-low alarm of total alkalinity as CaCO3")
        OptionalDouble alkalinityLowLowMgPerLAsCaco3,

        @Reported("Low alarm of total alkalinity as CaCO3") OptionalDouble alkalinityLowMgPerLAsCaco3,

        @Reported("Deadband of the alarms of total alkalinity as CaCO3")
        OptionalDouble alkalinityDeadbandMgPerLAsCaco3,

        @Reported("Ask again when pH is above this: the dangerous side")
        OptionalDouble refreshWhenPhAbove,

        @Reported("Ask again when pH is below this") OptionalDouble refreshWhenPhBelow,

        @Reported("Ask again when it is warmer: the dangerous side")
        OptionalDouble refreshWhenTemperatureAboveC,

        @Reported("Ask again when it is colder") OptionalDouble refreshWhenTemperatureBelowC) {}
