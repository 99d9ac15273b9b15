package freshet.nitrification;

import java.util.OptionalDouble;

/**
 * The published rate of a kind of media.
 *
 * @param media the kind of media
 */
public record PublishedRate(Media media) implements ReferenceRate {

    private static final double REFERENCE_TEMPERATURE_C = 20;

    @Override
    public boolean perVolume() {
        return media.perVolume();
    }

    @Override
    public boolean aerated() {
        return media.aerated();
    }

    @Override
    public Rate in(FilterWater water, TemperatureMethod temperature) {
        Spread reference = media.rate();
        Spread salinity = SalinityFactor.published().at(water.salinity());
        Spread carbon = CarbonFactor.published().at(water.carbonToNitrogen());
        SubstrateKinetics kinetics = new SubstrateKinetics(water.tanMgPerL(), water.dissolvedOxygenMgPerL());
        Factors factors = new Factors(
                temperatureFactor(water, temperature.response(), REFERENCE_TEMPERATURE_C),
                kinetics.tanFactor(),
                kinetics.oxygenFactor(),
                PhFactor.published().at(water.ph()),
                AlkalinityFactor.published().at(water.alkalinityMgPerLAsCaco3()),
                salinity.estimate(),
                carbon.estimate());
        Factors low = factors.with(salinity.lower(), carbon.lower());
        Factors high = factors.with(salinity.upper(), carbon.upper());
        return new Rate(
                perVolume(),
                reference.estimate() * factors.product(),
                OptionalDouble.of(reference.lower() * low.product()),
                OptionalDouble.of(reference.upper() * high.product()),
                reference.estimate() * kinetics.cut() * factors.withoutSubstrate(),
                reference.estimate(),
                factors);
    }

    static double temperatureFactor(FilterWater water, TemperatureResponse response, double referenceC) {
        TemperatureCredit credit = TemperatureCredit.published();
        boolean byOxygen = new SubstrateKinetics(water.tanMgPerL(), water.dissolvedOxygenMgPerL()).oxygenLimited();
        return credit.cut(water.temperatureC())
                * response.ratio(credit.effectiveC(water.temperatureC()), credit.effectiveC(referenceC), byOxygen);
    }
}
