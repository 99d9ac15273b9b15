package freshet.nitrite.web;

import freshet.quantity.Reported;
import java.util.OptionalDouble;

record NitriteProtectionResponse(
        @Reported("Whether the present chloride suffices at the wanted ratio")
        boolean protected_,

        @Reported("Present chloride per nitrite as N, by mass; left out without nitrite")
        OptionalDouble presentMassRatio,

        @Reported("Chloride that this nitrite calls for") double chlorideRequiredMgPerL,
        @Reported("Chloride that is missing") double chlorideDeficitMgPerL,

        @Reported("Greatest nitrite as N for which the present chloride suffices")
        double no2NLimitMgPerL,

        @Reported("Product that brings the missing chloride")
        OptionalDouble doseG,

        @Reported("Rise of dissolved salt by the dose: the ions of the salt, without its water of crystallization")
        OptionalDouble dissolvedSaltRiseMgPerL) {}
