package freshet.oxygen.web;

import freshet.quantity.Altitude;
import freshet.quantity.AtMostOneOf;
import freshet.quantity.Default;
import freshet.quantity.DissolvedOxygen;
import freshet.quantity.Salinity;
import freshet.quantity.StationPressure;
import freshet.quantity.Temperature;
import jakarta.validation.constraints.NotNull;
import org.jspecify.annotations.Nullable;

@AtMostOneOf({"station_pressure_hpa", "altitude_m"})
record OxygenSaturationRequest(
        @NotNull @Temperature Double temperatureC,
        @Default("0") @Salinity Double salinity,
        @StationPressure @Nullable Double stationPressureHpa,

        @Altitude("Altitude, from which the mean pressure is taken") @Nullable
        Double altitudeM,

        @DissolvedOxygen("Dissolved oxygen that was measured") @Nullable
        Double dissolvedOxygenMgPerL) {}
