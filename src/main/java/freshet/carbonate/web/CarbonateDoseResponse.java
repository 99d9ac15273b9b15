package freshet.carbonate.web;

import freshet.quantity.Reported;
import java.util.OptionalDouble;

record CarbonateDoseResponse(
        @Reported("Number of steps in which the dose is to be given")
        int steps,

        @Reported("The most that may be given in one step") double maxStepG,

        @Reported("Time between two steps; let carbon dioxide recover and measure")
        double hoursBetweenSteps,

        @Reported("The whole dose, of the purity given") double doseG,
        @Reported("The whole dose as stock solution") OptionalDouble doseL,
        @Reported("pH before") double phBefore,

        @Reported("pH if the whole dose were given at once, closed to the air")
        OptionalDouble ph,

        @Reported("pH after the whole dose when carbon dioxide has settled")
        double phSettled,

        @Reported("Total alkalinity as CaCO3 after the whole dose")
        double alkalinityAfterMgPerLAsCaco3,

        @Reported("Un-ionized ammonia as N before") OptionalDouble nh3NBeforeMgPerL,

        @Reported(
                "Un-ionized ammonia as N if the whole dose were given at once, at that moment or settled, the greater")
        OptionalDouble nh3NMgPerL,

        @Reported("Un-ionized ammonia as N when carbon dioxide has settled")
        OptionalDouble nh3NSettledMgPerL) {}
