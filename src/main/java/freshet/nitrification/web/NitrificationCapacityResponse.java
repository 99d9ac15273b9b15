package freshet.nitrification.web;

import freshet.nitrification.BiofilterCapacity;
import freshet.nitrification.Factors;
import freshet.nitrification.LimitingFactor;
import freshet.nitrification.LoadedBiofilter;
import freshet.nitrification.Rate;
import freshet.nitrification.Spread;
import freshet.quantity.Reported;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;

record NitrificationCapacityResponse(
        @Reported("Whether total ammonia settles under this load; only with a load")
        Optional<Boolean> loadCarried,

        @Reported("Total ammonia that the filter oxidizes at the present total ammonia, as N")
        double capacityTanGPerDay,

        @Reported("The same at the low corner of the published spread, as N")
        OptionalDouble capacityLowerTanGPerDay,

        @Reported("The same at the high corner of the published spread, as N")
        OptionalDouble capacityUpperTanGPerDay,

        @Reported("Total ammonia at which the load is oxidized as it comes, as N")
        OptionalDouble equilibriumTanMgPerL,

        @Reported("Un-ionized ammonia at that total ammonia, as N")
        OptionalDouble equilibriumNh3NMgPerL,

        @Reported("The load, daily mean, as N") OptionalDouble tanLoadGPerDay,

        @Reported("Load over present capacity; above 100 total ammonia is rising, not the filter failing")
        OptionalDouble utilizationPercent,

        @Reported("The same at the daily peak of the load from feed")
        OptionalDouble peakUtilizationPercent,

        @Reported("Present capacity less load, as N") OptionalDouble headroomTanGPerDay,

        @Reported("The most the media oxidize however high total ammonia rises, as N")
        OptionalDouble ultimateTanGPerDay,

        @Reported("Feed the filter can carry at all; at a lower total ammonia it is less")
        OptionalDouble feedCarriedKgPerDay,

        @Reported("What holds the filter back; tan means that the water is clean, which is no fault")
        LimitingFactor limitingFactor,

        @Reported("Total ammonia that the media oxidize, as N")
        double mediaTanGPerDay,

        @Reported("Total ammonia that the water brings and leaves, as N; only with a flow")
        OptionalDouble transportTanGPerDay,

        @Reported("Total ammonia that the oxygen of the water can oxidize, as N; only with a flow and its oxygen")
        OptionalDouble oxygenTransportTanGPerDay,

        @Reported("Rate of the media, as N, per surface") OptionalDouble rateGPerM2PerDay,

        @Reported("Rate of the media, as N, per bulk volume")
        OptionalDouble rateGPerM3PerDay,

        @Reported("Factor of temperature") double temperatureFactor,
        @Reported("Factor of total ammonia") double tanFactor,
        @Reported("Factor of oxygen at the media") double oxygenFactor,
        @Reported("Factor of pH") double phFactor,
        @Reported("Factor of alkalinity") double alkalinityFactor,
        @Reported("Factor of salinity") double salinityFactor,
        @Reported("Factor of organic carbon") double carbonFactor) {

    static NitrificationCapacityResponse of(BiofilterCapacity capacity, Optional<LoadedBiofilter> loaded) {
        Rate rate = capacity.rate();
        Factors factors = rate.factors();
        OptionalDouble estimate = OptionalDouble.of(rate.estimate());
        return new NitrificationCapacityResponse(
                loaded.map(LoadedBiofilter::carried),
                capacity.tanGPerDay(),
                capacity.lowerTanGPerDay(),
                capacity.upperTanGPerDay(),
                perhaps(loaded, LoadedBiofilter::equilibriumTanMgPerL),
                perhaps(loaded, LoadedBiofilter::equilibriumNh3NMgPerL),
                number(loaded.map(filter -> filter.load().tanGPerDay())),
                perhaps(loaded, LoadedBiofilter::utilizationPercent),
                perhaps(loaded, LoadedBiofilter::peakUtilizationPercent),
                number(loaded.map(LoadedBiofilter::headroomTanGPerDay)),
                number(loaded.map(LoadedBiofilter::ultimateTanGPerDay)),
                perhaps(loaded, LoadedBiofilter::feedCarriedKgPerDay),
                capacity.limitingFactor(),
                capacity.mediaTanGPerDay(),
                number(capacity.transport().map(Spread::estimate)),
                capacity.oxygenTransportTanGPerDay(),
                rate.perVolume() ? OptionalDouble.empty() : estimate,
                rate.perVolume() ? estimate : OptionalDouble.empty(),
                factors.temperature(),
                factors.tan(),
                factors.oxygen(),
                factors.ph(),
                factors.alkalinity(),
                factors.salinity(),
                factors.carbon());
    }

    private static OptionalDouble perhaps(
            Optional<LoadedBiofilter> loaded, Function<LoadedBiofilter, OptionalDouble> output) {
        return loaded.map(output).orElse(OptionalDouble.empty());
    }

    private static OptionalDouble number(Optional<Double> value) {
        return value.map(OptionalDouble::of).orElse(OptionalDouble.empty());
    }
}
