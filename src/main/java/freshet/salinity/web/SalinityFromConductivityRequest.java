package freshet.salinity.web;

import freshet.quantity.Conductivity;
import freshet.quantity.ExactlyOneOf;
import freshet.quantity.Temperature;
import jakarta.validation.constraints.NotNull;
import org.jspecify.annotations.Nullable;

@ExactlyOneOf({"conductivity_ms_per_cm", "conductivity_25c_ms_per_cm"})
record SalinityFromConductivityRequest(
        @Conductivity("Conductivity at the temperature of the water, not compensated") @Nullable
        Double conductivityMsPerCm,

        @Conductivity("Conductivity that the meter has compensated to 25 °C") @Nullable
        Double conductivity_25cMsPerCm,

        @NotNull @Temperature Double temperatureC) {}
