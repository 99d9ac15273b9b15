package freshet.oxygen.web;

import freshet.quantity.Reported;
import java.util.OptionalDouble;

record OxygenSaturationResponse(
        @Reported("Dissolved oxygen of the water in equilibrium with air saturated with water vapour")
        double saturationMgPerL,

        @Reported("Pressure of the air that was used") double stationPressureHpa,

        @Reported("What was measured, of that at saturation; only where a measured value was given")
        OptionalDouble dissolvedOxygenSaturationPercent) {}
