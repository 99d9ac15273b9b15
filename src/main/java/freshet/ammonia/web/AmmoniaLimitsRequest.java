package freshet.ammonia.web;

import freshet.ammonia.AmmoniaMethod;
import freshet.ammonia.Nh3Guideline;
import freshet.quantity.Choice;
import freshet.quantity.Concentration;
import freshet.quantity.ExactlyOneOf;
import freshet.quantity.Flat;
import freshet.quantity.Sample;
import freshet.quantity.TotalAmmonia;
import org.jspecify.annotations.Nullable;

@ExactlyOneOf({"nh3_n_limit_mg_per_l", "nh3_guideline"})
record AmmoniaLimitsRequest(
        @Concentration("Own limit of un-ionized ammonia as N") @Nullable
        Double nh3NLimitMgPerL,

        @Choice("Published limit of un-ionized ammonia, printed as NH3 and used as N") @Nullable
        Nh3Guideline nh3Guideline,

        @Flat Sample sample,

        @TotalAmmonia("Present total ammonia as N") @Nullable
        Double tanMgPerL,

        @Choice(DissociationChoice.WORDING) @Nullable AmmoniaMethod method) {

    /** The limit as N, mg/L. */
    double limitMgPerL() {
        if (nh3Guideline != null) {
            return nh3Guideline.nh3NMgPerL();
        }
        return nh3NLimitMgPerL == null ? 0 : nh3NLimitMgPerL;
    }
}
