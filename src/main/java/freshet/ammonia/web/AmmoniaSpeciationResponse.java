package freshet.ammonia.web;

import freshet.ammonia.AmmoniaSpeciation;
import freshet.quantity.Reported;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;

record AmmoniaSpeciationResponse(
        @Reported("Un-ionized ammonia, the toxic form, as N")
        double nh3NMgPerL,

        @Reported("Un-ionized ammonia as NH3") double nh3MgPerL,
        @Reported("Ammonium ion as N") double nh4NMgPerL,
        @Reported("Ammonium ion as NH4") double nh4MgPerL,

        @Reported("Un-ionized share of total ammonia, 0 to 1")
        double nh3Fraction,

        @Reported("pKa of ammonium on the scale of the given pH")
        double pka,

        @Reported("Standard uncertainty of un-ionized ammonia as N; where an uncertainty was given")
        OptionalDouble nh3NStandardUncertaintyMgPerL,

        @Reported("Lower bound of un-ionized ammonia as N, of an interval of 95 %")
        OptionalDouble nh3NLowerMgPerL,

        @Reported("Upper bound of un-ionized ammonia as N, of an interval of 95 %")
        OptionalDouble nh3NUpperMgPerL) {

    /** With the uncertainty of un-ionized ammonia, where it is asked for. */
    static AmmoniaSpeciationResponse of(
            AmmoniaSpeciation speciation, Optional<SpeciationUncertainty.Relative> relative) {
        return new AmmoniaSpeciationResponse(
                speciation.nh3NMgPerL(),
                speciation.nh3MgPerL(),
                speciation.nh4NMgPerL(),
                speciation.nh4MgPerL(),
                speciation.nh3Fraction(),
                speciation.pKa(),
                times(speciation, relative, SpeciationUncertainty.Relative::all),
                times(speciation, relative, known -> known.bounds().lower()),
                times(speciation, relative, known -> known.bounds().upper()));
    }

    private static OptionalDouble times(
            AmmoniaSpeciation speciation,
            Optional<SpeciationUncertainty.Relative> relative,
            ToDoubleFunction<SpeciationUncertainty.Relative> factor) {
        return relative.isEmpty()
                ? OptionalDouble.empty()
                : OptionalDouble.of(speciation.nh3NMgPerL() * factor.applyAsDouble(relative.get()));
    }
}
