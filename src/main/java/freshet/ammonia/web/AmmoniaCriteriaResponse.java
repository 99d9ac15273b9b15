package freshet.ammonia.web;

import freshet.quantity.Reported;
import java.util.OptionalDouble;

record AmmoniaCriteriaResponse(
        @Reported("Total ammonia as N that the average over the acute period should not exceed")
        double acuteTanMgPerL,

        @Reported("Total ammonia as N that the average over the chronic period should not exceed")
        double chronicTanMgPerL,

        @Reported("Total ammonia as N that no average over four days should exceed, where the criterion has one")
        OptionalDouble chronicFourDayTanMgPerL,

        @Reported("Averaging period of the acute criterion") double acuteAveragingHours,

        @Reported("Averaging period of the chronic criterion")
        double chronicAveragingDays,

        @Reported("Given total ammonia over the acute criterion; above 1 exceeds it")
        OptionalDouble acuteQuotient,

        @Reported("Given total ammonia over the chronic criterion; above 1 exceeds it")
        OptionalDouble chronicQuotient) {}
