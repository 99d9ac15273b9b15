package freshet.ammonia.web;

import freshet.quantity.Reported;
import java.util.Optional;
import java.util.OptionalDouble;

record AmmoniaLimitsResponse(
        @Reported("Whether the present total ammonia exceeds the limit")
        Optional<Boolean> exceeded,

        @Reported("Total ammonia as N at which un-ionized ammonia meets the limit, at this pH and temperature")
        double tanLimitMgPerL,

        @Reported("The limit of un-ionized ammonia as N") double nh3NLimitMgPerL,
        @Reported("The guideline as printed, as NH3") OptionalDouble guidelineNh3MgPerL,
        @Reported("Present un-ionized ammonia as N") OptionalDouble nh3NMgPerL,

        @Reported("How much total ammonia as N may still be added; negative when exceeded")
        OptionalDouble tanHeadroomMgPerL,

        @Reported("pH at which the present total ammonia meets the limit, on the given scale")
        OptionalDouble phLimit,

        @Reported("Temperature at which the present total ammonia meets the limit")
        OptionalDouble temperatureLimitC) {}
