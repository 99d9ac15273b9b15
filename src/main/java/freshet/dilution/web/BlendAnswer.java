package freshet.dilution.web;

import freshet.acidity.PhScale;
import freshet.ammonia.Water;
import freshet.answer.Answer;
import freshet.answer.FaultCode;
import freshet.answer.Refusal;
import freshet.carbonate.CarbonateSystem;
import freshet.carbonate.Litre;
import freshet.dilution.Blend;
import freshet.dilution.BlendedWater;
import freshet.dilution.SafeExchange;
import freshet.method.Validity;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import org.jspecify.annotations.Nullable;

/** Puts together the answer on tank and source water mixed. */
final class BlendAnswer {

    private static final double THIOSULFATE_PER_CL2 = 7 * 1.2;

    private final DilutionBlendRequest request;
    private final PhScale scale;
    private final boolean tanKnown;
    private final Blend blend;
    private final double tankL;
    private final double share;
    private final Blend.Mixture mixture;

    private BlendAnswer(DilutionBlendRequest request) {
        this.request = request;
        scale = request.scale();
        tanKnown = request.tank().tanMgPerL() != null && request.source().tanMgPerL() != null;
        BlendedWater tank = water(request.tank(), "tank");
        Double settled = request.settledCo2MgPerL();
        blend = new Blend(tank, water(request.source(), "source"), settled == null ? tank.co2MgPerL() : settled, scale);
        tankL = request.tank().volumeL() - request.drainedL();
        if (tankL <= 0) {
            throw new Refusal(
                    "drained_l",
                    FaultCode.INCONSISTENT,
                    "As much water is let out as the tank holds: nothing is left to mix.");
        }
        share = blend.massShare(tankL, request.source().volumeL());
        mixture = blend.mixture(share);
    }

    static Answer<DilutionBlendResponse> to(DilutionBlendRequest request) {
        return new BlendAnswer(request).answer();
    }

    private BlendedWater water(WaterSample sample, String name) {
        Double tan = tanKnown ? sample.freedTanMgPerL() : null;
        try {
            return BlendedWater.measured(
                    new Water(sample.ph(), sample.temperatureC(), sample.salinity(), scale),
                    sample.alkalinityMgPerLAsCaco3(),
                    tan == null ? 0 : tan);
        } catch (Refusal inconsistent) {
            throw new Refusal(inconsistent.faults().stream()
                    .map(fault -> new freshet.answer.Fault(name + "." + fault.field(), fault.code(), fault.detail()))
                    .toList());
        }
    }

    private Answer<DilutionBlendResponse> answer() {
        SafeExchange safe = SafeExchange.of(blend, limits());
        boolean chlorinated = BlendNotices.chlorinated(request.source());
        BlendedWater mixed = mixture.water();
        Litre litre = mixed.litre();
        double massKg = tankL * blend.tank().water().kgPerL()
                + request.source().volumeL() * blend.source().water().kgPerL();
        double sourceL = request.source().volumeL();
        DilutionBlendResponse response = new DilutionBlendResponse(
                chlorinated ? 0 : safe.sharePercent(),
                chlorinated ? Optional.empty() : Optional.of(safe.limitedBy()),
                nh3(blend.tank(), blend.tank().state().ph()),
                nh3(mixed, mixed.state().ph()),
                nh3(mixed, mixture.settled().ph()),
                blend.tank().state().ph(),
                mixed.state().ph(),
                mixture.settled().ph(),
                blend.phChange(mixture),
                blend.temperatureChangeC(mixture),
                massKg / litre.kgPerL(),
                100 * sourceL / (tankL + sourceL),
                mixed.water().temperatureC(),
                mixed.water().salinity(),
                litre.alkalinityMgPerL(mixed.water().alkalinity()),
                litre.millimoles(mixed.water().inorganicCarbon()),
                mixed.co2MgPerL(),
                tanKnown ? OptionalDouble.of(mixed.tanMgPerL()) : OptionalDouble.empty(),
                mixed(WaterSample::no2NMgPerL),
                mixed(WaterSample::no3NMgPerL),
                mixed(WaterSample::calciumMgPerL),
                chlorine(WaterSample::chlorineMgPerLAsCl2),
                chlorine(WaterSample::chloramineMgPerLAsCl2),
                request.source().namesChlorine()
                        ? OptionalDouble.of(
                                THIOSULFATE_PER_CL2 * request.source().allChlorineMgPerL() * sourceL / 1000)
                        : OptionalDouble.empty());
        return new Answer<>(
                response, Blend.METHOD, validity(), new BlendNotices(request, blend, mixture, response).all());
    }

    private SafeExchange.Limits limits() {
        OptionalDouble nh3 = OptionalDouble.empty();
        if (tanKnown) {
            Double own = request.nh3NLimitMgPerL();
            double before = blend.nh3NBeforeMgPerL();
            nh3 = OptionalDouble.of(own == null ? before : Math.max(own, before));
        }
        return new SafeExchange.Limits(nh3, request.phChangeLimit(), request.temperatureChangeLimitC());
    }

    private Validity validity() {
        return CarbonateSystem.validity(
                        request.tank().temperatureC(), request.tank().salinity())
                .and(CarbonateSystem.validity(
                        request.source().temperatureC(), request.source().salinity()));
    }

    private OptionalDouble nh3(BlendedWater water, double ph) {
        return tanKnown ? OptionalDouble.of(water.nh3NMgPerL(ph, scale)) : OptionalDouble.empty();
    }

    /** A concentration that is mixed by mass; only where both waters name it. */
    private OptionalDouble mixed(Function<WaterSample, @Nullable Double> quantity) {
        Double tank = quantity.apply(request.tank());
        Double source = quantity.apply(request.source());
        if (tank == null || source == null) {
            return OptionalDouble.empty();
        }
        double tankPerKg = tank / blend.tank().water().kgPerL();
        double sourcePerKg = source / blend.source().water().kgPerL();
        return OptionalDouble.of((tankPerKg + share * (sourcePerKg - tankPerKg))
                * mixture.water().water().kgPerL());
    }

    /** Chlorine that only one water names is taken as none in the other: fish live in the one, the other was not treated. */
    private OptionalDouble chlorine(Function<WaterSample, @Nullable Double> quantity) {
        if (quantity.apply(request.tank()) == null && quantity.apply(request.source()) == null) {
            return OptionalDouble.empty();
        }
        return mixed(sample -> WaterSample.zeroIfNone(quantity.apply(sample)));
    }
}
