package freshet.nitrite.web;

import freshet.nitrite.NitriteMethod;
import freshet.quantity.Choice;
import freshet.quantity.Default;
import freshet.quantity.Flat;
import freshet.quantity.Nitrite;
import freshet.quantity.Sample;
import jakarta.validation.constraints.NotNull;

record NitriteSpeciationRequest(
        @NotNull @Nitrite("Total nitrite (NO2 + HNO2) as N") Double no2NMgPerL,

        @Flat Sample sample,

        @Default("anthonisen-1976")
        @Choice(
                "Source of the dissociation constant: the one that thresholds of inhibition rest on, or a later measurement")
        NitriteMethod method) {}
