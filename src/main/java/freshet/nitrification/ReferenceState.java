package freshet.nitrification;

import java.util.OptionalDouble;

/**
 * The water in which a rate was measured; what is empty stands for the state at which nothing holds a filter back, which
 * never credits too much.
 *
 * @param temperatureC temperature, °C
 * @param tanMgPerL total ammonia as N, mg/L
 * @param dissolvedOxygenMgPerL oxygen at the media, mg/L
 * @param ph pH (NBS)
 * @param alkalinityMgPerLAsCaco3 total alkalinity, mg/L as CaCO3
 * @param salinity practical salinity
 */
public record ReferenceState(
        double temperatureC,
        OptionalDouble tanMgPerL,
        OptionalDouble dissolvedOxygenMgPerL,
        OptionalDouble ph,
        OptionalDouble alkalinityMgPerLAsCaco3,
        OptionalDouble salinity) {

    /** Factor of total ammonia in that water. */
    double tanFactor() {
        return tanMgPerL.isPresent() ? HalfOrder.published().share(tanMgPerL.getAsDouble()) : 1;
    }

    /** Factor of oxygen in that water. */
    double oxygenFactor() {
        if (dissolvedOxygenMgPerL.isEmpty()) {
            return 1;
        }
        double tan = tanMgPerL.orElse(HalfOrder.published().plateauMgPerL());
        return new SubstrateKinetics(tan, dissolvedOxygenMgPerL.getAsDouble()).oxygenFactor();
    }

    /** Factor of pH in that water. */
    double phFactor() {
        return ph.isPresent() ? PhFactor.published().at(ph.getAsDouble()) : 1;
    }

    /** Factor of alkalinity in that water. */
    double alkalinityFactor() {
        return alkalinityMgPerLAsCaco3.isPresent()
                ? AlkalinityFactor.published().at(alkalinityMgPerLAsCaco3.getAsDouble())
                : 1;
    }

    /** Factor of salinity in that water. */
    double salinityFactor() {
        return salinity.isPresent()
                ? SalinityFactor.published().at(salinity.getAsDouble()).estimate()
                : 1;
    }
}
