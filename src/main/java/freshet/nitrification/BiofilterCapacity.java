package freshet.nitrification;

import freshet.ammonia.AmmoniaMethod;
import freshet.method.Citation;
import freshet.method.Method;
import freshet.method.Seen;
import freshet.method.Validity;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.DoubleStream;
import java.util.stream.Stream;

/**
 * What a biofilter oxidizes in its present water: the least of what its media, the ammonia and the oxygen brought by the
 * water allow; g TAN as N per day.
 *
 * @param filter the filter
 * @param rate what a unit of its media does
 * @param mediaTanGPerDay what all its media do
 * @param transport what the water brings; empty where the flow is not known
 * @param oxygenTransportTanGPerDay what the oxygen of the water allows; empty where air brings it or it is not known
 */
public record BiofilterCapacity(
        Biofilter filter,
        Rate rate,
        double mediaTanGPerDay,
        Optional<Spread> transport,
        OptionalDouble oxygenTransportTanGPerDay) {

    /** The methods it is composed of. */
    public static final List<Method> PARTS = Stream.of(
                    Arrays.stream(TemperatureMethod.values()).map(TemperatureMethod::method),
                    Stream.of(
                            Media.METHOD,
                            MeasuredRate.METHOD,
                            HalfOrder.METHOD,
                            OxygenLimit.METHOD,
                            TemperatureCredit.METHOD,
                            PhFactor.METHOD,
                            AlkalinityFactor.METHOD,
                            SalinityFactor.METHOD,
                            CarbonFactor.METHOD,
                            FilterFlow.METHOD,
                            SubstrateFloor.METHOD,
                            ProteinCoefficient.METHOD,
                            Meals.METHOD),
                    Stream.of(AmmoniaMethod.EMERSON_1975, AmmoniaMethod.CLEGG_WHITFIELD_1995)
                            .map(choice -> choice.dissociation().method()))
            .flatMap(methods -> methods)
            .toList();

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "biofilter-capacity",
                    "Total ammonia that a biofilter oxidizes in its present water",
                    Citation.withoutDoi(
                            "Freshet, biofilter capacity (composite)",
                            "This project's construction from the published parts it uses"),
                    Seen.SECONDARY)
            .equation("rate = reference rate x temperature x TAN x oxygen x pH x alkalinity x salinity x carbon;"
                    + " capacity = min(rate x media, Q C eta, oxygen transport); equilibrium TAN ="
                    + " max(S* (load/plateau capacity)^2, load/(Q eta), S_min)")
            .within(TemperatureCredit.TEMPERATURE, PhFactor.PH, Ration.PROTEIN)
            .accuracy("published rates spread five- to tenfold; lower and upper are corners of that spread, no"
                    + " confidence interval")
            .errata("multiplying every penalty on a rate measured in the field counts twice: give its own conditions")
            .uses(PARTS.toArray(Method[]::new));

    /** The capacity of {@code filter} in {@code water}. */
    public static BiofilterCapacity of(Biofilter filter, FilterWater water, TemperatureMethod temperature) {
        Rate rate = filter.reference().in(water, temperature);
        Optional<Spread> transport = filter.flowLPerHour().isPresent()
                ? Optional.of(filter.flow().tanGPerDay(filter.flowLPerHour().getAsDouble(), water.tanMgPerL()))
                : Optional.empty();
        OptionalDouble oxygen = filter.flowLPerHour().isPresent()
                ? filter.flow().oxygenTanGPerDay(filter.flowLPerHour().getAsDouble())
                : OptionalDouble.empty();
        return new BiofilterCapacity(filter, rate, rate.estimate() * filter.amount(), transport, oxygen);
    }

    /** The capacity, g TAN as N per day. */
    public double tanGPerDay() {
        return least(mediaTanGPerDay, transport.map(Spread::estimate));
    }

    /** The capacity at the low corner; empty where the rate has no published spread. */
    public OptionalDouble lowerTanGPerDay() {
        return rate.lower().stream()
                .map(low -> least(low * filter.amount(), transport.map(Spread::lower)))
                .findFirst();
    }

    /** The capacity at the high corner; empty where the rate has no published spread. */
    public OptionalDouble upperTanGPerDay() {
        return rate.upper().stream()
                .map(high -> least(high * filter.amount(), transport.map(Spread::upper)))
                .findFirst();
    }

    /** What holds the filter back. */
    public LimitingFactor limitingFactor() {
        double brought = transport.map(Spread::estimate).orElse(Double.POSITIVE_INFINITY);
        if (oxygenTransportTanGPerDay.orElse(Double.POSITIVE_INFINITY) < Math.min(mediaTanGPerDay, brought)) {
            return LimitingFactor.OXYGEN_SUPPLY;
        }
        return brought < mediaTanGPerDay ? LimitingFactor.FLOW : rate.factors().smallest();
    }

    private double least(double media, Optional<Double> brought) {
        return DoubleStream.of(
                        media,
                        brought.orElse(Double.POSITIVE_INFINITY),
                        oxygenTransportTanGPerDay.orElse(Double.POSITIVE_INFINITY))
                .min()
                .orElseThrow();
    }

    /** Whether {@code water} lies within the stated ranges. */
    public static Validity validity(FilterWater water) {
        return Validity.of(TemperatureCredit.TEMPERATURE, water.temperatureC()).and(PhFactor.PH, water.ph());
    }
}
