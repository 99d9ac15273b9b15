package freshet.ammonia.web;

import freshet.ammonia.AmmoniaMethod;
import freshet.quantity.Choice;
import freshet.quantity.Concentration;
import freshet.quantity.Flat;
import freshet.quantity.Sample;
import freshet.quantity.TotalAmmonia;
import freshet.quantity.UncertaintyOfPh;
import freshet.quantity.UncertaintyOfTemperature;
import jakarta.validation.constraints.NotNull;
import org.jspecify.annotations.Nullable;

record AmmoniaSpeciationRequest(
        @NotNull @TotalAmmonia Double tanMgPerL,
        @Flat Sample sample,
        @Choice(DissociationChoice.WORDING) @Nullable AmmoniaMethod method,

        @Concentration("Standard uncertainty of total ammonia") @Nullable
        Double tanStandardUncertaintyMgPerL,

        @UncertaintyOfPh @Nullable Double phStandardUncertainty,
        @UncertaintyOfTemperature @Nullable Double temperatureStandardUncertaintyC) {

    /** Whether an uncertainty is asked for. */
    boolean namesUncertainty() {
        return tanStandardUncertaintyMgPerL != null
                || phStandardUncertainty != null
                || temperatureStandardUncertaintyC != null;
    }
}
