package freshet.carbonate.web;

import freshet.carbonate.DosingChemical;
import freshet.quantity.Alkalinity;
import freshet.quantity.Choice;
import freshet.quantity.Concentration;
import freshet.quantity.Default;
import freshet.quantity.ExactlyOneOf;
import freshet.quantity.Flat;
import freshet.quantity.Mineral;
import freshet.quantity.Ph;
import freshet.quantity.PhChange;
import freshet.quantity.Purity;
import freshet.quantity.Sample;
import freshet.quantity.SolutionStrength;
import freshet.quantity.TotalAmmonia;
import freshet.quantity.Volume;
import jakarta.validation.constraints.NotNull;
import org.jspecify.annotations.Nullable;

@ExactlyOneOf({"target_alkalinity_mg_per_l_as_caco3", "target_ph"})
record CarbonateDoseRequest(
        @NotNull @Volume Double volumeL,
        @Flat Sample sample,
        @NotNull @Alkalinity Double alkalinityMgPerLAsCaco3,

        @Alkalinity("Wanted total alkalinity as CaCO3") @Nullable
        Double targetAlkalinityMgPerLAsCaco3,

        @Ph("Wanted pH, before carbon dioxide settles again") @Nullable
        Double targetPh,

        @NotNull @Choice("What is dosed; the bicarbonates are the mild choice")
        DosingChemical chemical,

        @Default("100") @Purity Double purityPercent,

        @TotalAmmonia("Total ammonia as N, for the NH3 that the rise of pH makes of it") @Nullable
        Double tanMgPerL,

        @Mineral("Dissolved calcium, for the saturation with calcite") @Nullable
        Double calciumMgPerL,

        @SolutionStrength @Nullable Double solutionGPerL,

        @Default("0.2") @PhChange("Greatest rise of pH in one step")
        Double phRiseLimit,

        @Concentration("Dissolved carbon dioxide to which the water settles; by default what it has now") @Nullable
        Double settledCo2MgPerL) {}
