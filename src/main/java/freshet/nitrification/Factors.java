package freshet.nitrification;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;

/**
 * By how much each condition changes the reference rate; numbers without dimension, 0 and up.
 *
 * @param temperature temperature
 * @param tan total ammonia
 * @param oxygen oxygen at the media
 * @param ph pH
 * @param alkalinity alkalinity
 * @param salinity salinity
 * @param carbon organic carbon
 */
public record Factors(
        double temperature, double tan, double oxygen, double ph, double alkalinity, double salinity, double carbon) {

    private static final double GOOD_ENOUGH = 0.95;

    /** All seven multiplied. */
    double product() {
        return tan * oxygen * withoutSubstrate();
    }

    /** The product without total ammonia and oxygen. */
    double withoutSubstrate() {
        return temperature * ph * alkalinity * salinity * carbon;
    }

    Factors with(double otherSalinity, double otherCarbon) {
        return new Factors(temperature, tan, oxygen, ph, alkalinity, otherSalinity, otherCarbon);
    }

    Factors withTemperature(double other) {
        return new Factors(other, tan, oxygen, ph, alkalinity, salinity, carbon);
    }

    /** The smallest factor, or the media if none is below 0.95. */
    LimitingFactor smallest() {
        LimitingFactor smallest = LimitingFactor.MEDIA;
        double least = GOOD_ENOUGH;
        for (Map.Entry<LimitingFactor, Double> factor : all().entrySet()) {
            if (factor.getValue() < least) {
                smallest = factor.getKey();
                least = factor.getValue();
            }
        }
        return smallest;
    }

    /** The factors that are 0. */
    List<LimitingFactor> zeros() {
        return all().entrySet().stream()
                .filter(factor -> factor.getValue() == 0)
                .map(Map.Entry::getKey)
                .toList();
    }

    private Map<LimitingFactor, Double> all() {
        Map<LimitingFactor, Double> all = new EnumMap<>(LimitingFactor.class);
        all.put(LimitingFactor.OXYGEN, oxygen);
        all.put(LimitingFactor.ALKALINITY, alkalinity);
        all.put(LimitingFactor.PH, ph);
        all.put(LimitingFactor.TEMPERATURE, temperature);
        all.put(LimitingFactor.CARBON, carbon);
        all.put(LimitingFactor.SALINITY, salinity);
        all.put(LimitingFactor.TAN, tan);
        return all;
    }
}
