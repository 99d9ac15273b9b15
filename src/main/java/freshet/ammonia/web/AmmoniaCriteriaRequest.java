package freshet.ammonia.web;

import freshet.ammonia.SensitiveLife;
import freshet.ammonia.TanGuideline;
import freshet.quantity.Choice;
import freshet.quantity.Flag;
import freshet.quantity.Flat;
import freshet.quantity.Sample;
import freshet.quantity.TotalAmmonia;
import jakarta.validation.constraints.NotNull;
import java.util.EnumSet;
import java.util.Set;
import org.jspecify.annotations.Nullable;

record AmmoniaCriteriaRequest(
        @NotNull @Choice("Published criterion of total ammonia in receiving waters")
        TanGuideline guideline,

        @Flat Sample sample,

        @Flag("Whether salmon or trout are present; by default true; only with usepa-2013 and usepa-1999") @Nullable
        Boolean salmonidsPresent,

        @Flag("Whether fresh-water mussels are present; by default true; only with usepa-2013") @Nullable
        Boolean musselsPresent,

        @Flag(
                "Whether early life stages of fish are present; by default true; only with usepa-1999, and with usepa-2013"
                        + " where mussels are absent")
        @Nullable
        Boolean earlyLifeStagesPresent,

        @TotalAmmonia("Total ammonia as N to compare, over the averaging period") @Nullable
        Double tanMgPerL) {

    /** The animals that are present: all that the caller did not deny. */
    Set<SensitiveLife> present() {
        Set<SensitiveLife> present = EnumSet.allOf(SensitiveLife.class);
        present.removeIf(life -> Boolean.FALSE.equals(said(life)));
        return present;
    }

    /** What the caller said of an animal; null where nothing. */
    @Nullable
    Boolean said(SensitiveLife life) {
        return switch (life) {
            case SALMONIDS -> salmonidsPresent;
            case MUSSELS -> musselsPresent;
            case EARLY_LIFE_STAGES -> earlyLifeStagesPresent;
        };
    }
}
