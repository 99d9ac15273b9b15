package freshet.ammonia.web;

import freshet.acidity.PhScale;
import freshet.ammonia.AmmoniaMethod;
import freshet.ammonia.Nh3Guideline;
import freshet.quantity.Choice;
import freshet.quantity.Concentration;
import freshet.quantity.Default;
import freshet.quantity.ExactlyOneOf;
import freshet.quantity.Ph;
import freshet.quantity.PhStep;
import freshet.quantity.Salinity;
import freshet.quantity.Temperature;
import freshet.quantity.TemperatureChange;
import org.jspecify.annotations.Nullable;

@ExactlyOneOf({"nh3_n_limit_mg_per_l", "nh3_guideline"})
record AmmoniaLimitTableRequest(
        @Concentration("Own limit of un-ionized ammonia as N") @Nullable
        Double nh3NLimitMgPerL,

        @Choice("Published limit of un-ionized ammonia, printed as NH3 and used as N") @Nullable
        Nh3Guideline nh3Guideline,

        @Default("0") @Salinity Double salinity,

        @Choice("Scale of the pH: nbs for a probe calibrated on ordinary buffers (the default), or free or total")
        @Nullable
        PhScale phScale,

        @Choice(DissociationChoice.WORDING) @Nullable AmmoniaMethod method,

        @Default("6.5") @Ph("Lowest pH of the table") Double phMin,
        @Default("9") @Ph("Highest pH of the table") Double phMax,
        @Default("0.1") @PhStep Double phStep,

        @Default("0") @Temperature("Lowest temperature of the table")
        Double temperatureMinC,

        @Default("36") @Temperature("Highest temperature of the table")
        Double temperatureMaxC,

        @Default("2") @TemperatureChange("Step of temperature")
        Double temperatureStepC) {

    /** The limit as N, mg/L. */
    double limitMgPerL() {
        if (nh3Guideline != null) {
            return nh3Guideline.nh3NMgPerL();
        }
        return nh3NLimitMgPerL == null ? 0 : nh3NLimitMgPerL;
    }
}
