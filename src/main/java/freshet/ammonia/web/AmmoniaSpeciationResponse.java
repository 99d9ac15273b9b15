package freshet.ammonia.web;

import freshet.ammonia.AmmoniaSpeciation;
import freshet.quantity.Reported;

record AmmoniaSpeciationResponse(
        @Reported("Un-ionized ammonia, the toxic form, as N")
        double nh3NMgPerL,

        @Reported("Un-ionized ammonia as NH3") double nh3MgPerL,
        @Reported("Ammonium ion as N") double nh4NMgPerL,
        @Reported("Ammonium ion as NH4") double nh4MgPerL,

        @Reported("Un-ionized share of total ammonia, 0 to 1")
        double nh3Fraction,

        @Reported("pKa of ammonium on the scale of the given pH")
        double pka) {

    static AmmoniaSpeciationResponse of(AmmoniaSpeciation speciation) {
        return new AmmoniaSpeciationResponse(
                speciation.nh3NMgPerL(),
                speciation.nh3MgPerL(),
                speciation.nh4NMgPerL(),
                speciation.nh4MgPerL(),
                speciation.nh3Fraction(),
                speciation.pKa());
    }
}
