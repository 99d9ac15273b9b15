package freshet.nitrification;

import freshet.answer.Fault;
import freshet.answer.FaultCode;
import freshet.method.Citation;
import freshet.method.Constant;
import freshet.method.Method;
import freshet.method.Seen;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/**
 * A rate that was measured on the filter itself, moved to other water by the ratio of each factor. Organic carbon is in the
 * measurement already. Only the response to temperature has a published spread.
 *
 * @param perDay the rate, g TAN as N per m2 (or m3) of media and day
 * @param perVolume whether it is per m3
 * @param aerated whether air keeps up the oxygen around the media
 * @param state the water in which it was measured
 */
public record MeasuredRate(double perDay, boolean perVolume, boolean aerated, ReferenceState state)
        implements ReferenceRate {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "measured-rate",
                    "A measured rate of nitrification moved to other water",
                    Citation.withoutDoi(
                            "This project's construction",
                            "This project's construction; bounds of the factor per degree after Barnard (1.127), Rusten"
                                    + " et al. 2006 (1.09), Zhu and Chen 2002 (1.011) and Ling and Chen 2005 (1.00)"),
                    Seen.SECONDARY)
            .equation(
                    "rate = measured rate x factors now/factors then; spread from the temperature only: l, h per degree"
                            + " colder, L, H per degree warmer",
                    new Constant("l", 1.127, "1", "low corner, colder"),
                    new Constant("h", 1.011, "1", "high corner, colder"),
                    new Constant("L", 1.00, "1", "low corner, warmer"),
                    new Constant("H", 1.09, "1", "high corner, warmer"))
            .accuracy("as good as the measurement while conditions stay near it")
            .errata("bounds per degree are this project's judgement");

    @Override
    public Rate in(FilterWater water, TemperatureMethod temperature) {
        SubstrateKinetics now = new SubstrateKinetics(water.tanMgPerL(), water.dissolvedOxygenMgPerL());
        Factors factors = new Factors(
                PublishedRate.temperatureFactor(water, temperature.response(), state.temperatureC()),
                now.tanFactor() / state.tanFactor(),
                now.oxygenFactor() / state.oxygenFactor(),
                PhFactor.published().at(water.ph()) / state.phFactor(),
                AlkalinityFactor.published().at(water.alkalinityMgPerLAsCaco3()) / state.alkalinityFactor(),
                SalinityFactor.published().at(water.salinity()).estimate() / state.salinityFactor(),
                1);
        double substrateThen = state.tanFactor() * state.oxygenFactor();
        return new Rate(
                perVolume,
                perDay * factors.product(),
                corner(water, factors, 0),
                corner(water, factors, 1),
                perDay * now.cut() * factors.withoutSubstrate() / substrateThen,
                perDay,
                factors);
    }

    private OptionalDouble corner(FilterWater water, Factors factors, int corner) {
        return spread(METHOD.values(), water.temperatureC(), corner).stream()
                .map(temperature ->
                        perDay * factors.withTemperature(temperature).product())
                .findFirst();
    }

    /** Temperature factor at the low (0) or high (1) corner; empty at the temperature of the measurement. */
    OptionalDouble spread(double[] constants, double temperatureC, int corner) {
        TemperatureCredit credit = TemperatureCredit.published();
        double rise = credit.effectiveC(temperatureC) - credit.effectiveC(state.temperatureC());
        if (rise == 0) {
            return OptionalDouble.empty();
        }
        double perDegree = constants[corner + (rise < 0 ? 0 : 2)];
        return OptionalDouble.of(credit.cut(temperatureC) * StrictMath.pow(perDegree, rise));
    }

    /** Why the measurement cannot be moved to {@code water}; empty if it can. */
    public List<Fault> faults(FilterWater water) {
        List<Fault> faults = new ArrayList<>(0);
        refuseZero(state.tanFactor(), "reference_tan_mg_per_l", faults);
        refuseZero(
                new SubstrateKinetics(1, state.dissolvedOxygenMgPerL().orElse(1)).cut(),
                "reference_dissolved_oxygen_mg_per_l",
                faults);
        refuseZero(state.phFactor(), "reference_ph", faults);
        refuseZero(state.alkalinityFactor(), "reference_alkalinity_mg_per_l_as_caco3", faults);
        if (water.salinity() > SalinityFactor.HARMLESS && state.salinity().isEmpty()) {
            faults.add(new Fault(
                    "reference_salinity",
                    FaultCode.MISSING,
                    "reference_salinity is missing: a rate measured at an unknown salinity says nothing above 5."));
        }
        return faults;
    }

    private static void refuseZero(double factor, String field, List<Fault> faults) {
        if (factor == 0) {
            faults.add(new Fault(
                    field,
                    FaultCode.INCONSISTENT,
                    "At this " + field + " no nitrification is expected, so no rate can have been measured there."));
        }
    }
}
