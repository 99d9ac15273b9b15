package freshet.nitrate.web;

import freshet.nitrate.NitrateLimit;
import freshet.quantity.Reported;
import java.util.Optional;
import java.util.OptionalDouble;

record NitrateAccumulationResponse(
        @Reported("What becomes of the limit") Optional<NitrateLimit.Outcome> limitOutcome,
        @Reported("When the limit is passed, from now") OptionalDouble daysToLimit,

        @Reported("The whole exchange that would hold nitrate at the limit")
        OptionalDouble exchangeRequiredLPerDay,

        @Reported("Nitrate at the horizon, as N") double no3NAtHorizonMgPerL,
        @Reported("Nitrate in the long run, as N") OptionalDouble plateauNo3NMgPerL,

        @Reported("Change of the stock of nitrate now, as N")
        double netNo3NGPerDay) {}
