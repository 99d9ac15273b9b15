package freshet.ammonia.web;

import freshet.ammonia.AmmoniaMethod;
import freshet.quantity.Choice;
import freshet.quantity.Flat;
import freshet.quantity.Sample;
import freshet.quantity.TotalAmmonia;
import jakarta.validation.constraints.NotNull;
import org.jspecify.annotations.Nullable;

record AmmoniaSpeciationRequest(
        @NotNull @TotalAmmonia Double tanMgPerL,
        @Flat Sample sample,
        @Choice(DissociationChoice.WORDING) @Nullable AmmoniaMethod method) {}
