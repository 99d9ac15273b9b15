package freshet.carbonate.web;

import freshet.acidity.PhScale;
import freshet.quantity.Alkalinity;
import freshet.quantity.Choice;
import freshet.quantity.Concentration;
import freshet.quantity.Default;
import freshet.quantity.ExactlyTwoOf;
import freshet.quantity.InorganicCarbon;
import freshet.quantity.Mineral;
import freshet.quantity.Ph;
import freshet.quantity.Salinity;
import freshet.quantity.Temperature;
import freshet.quantity.TotalAmmonia;
import jakarta.validation.constraints.NotNull;
import org.jspecify.annotations.Nullable;

@ExactlyTwoOf({"ph", "alkalinity_mg_per_l_as_caco3", "co2_mg_per_l", "inorganic_carbon_mmol_per_l"})
record CarbonateSpeciationRequest(
        @Ph @Nullable Double ph,
        @Alkalinity @Nullable Double alkalinityMgPerLAsCaco3,

        @Concentration("Dissolved carbon dioxide") @Nullable Double co2MgPerL,

        @InorganicCarbon @Nullable Double inorganicCarbonMmolPerL,

        @NotNull @Temperature Double temperatureC,
        @Default("0") @Salinity Double salinity,

        @Choice("Scale of the pH: nbs for a probe calibrated on ordinary buffers (the default), or free or total")
        @Nullable
        PhScale phScale,

        @TotalAmmonia("Total ammonia as N, a part of the alkalinity") @Nullable
        Double tanMgPerL,

        @Mineral("Dissolved calcium") @Nullable Double calciumMgPerL) {

    PhScale scale() {
        return phScale == null ? PhScale.NBS : phScale;
    }
}
