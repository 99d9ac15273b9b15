package freshet.carbonate.web;

import freshet.answer.Answer;
import freshet.answer.Notice;
import freshet.carbonate.CalciteSaturation;
import freshet.carbonate.CarbonateSolver;
import freshet.carbonate.CarbonateState;
import freshet.carbonate.CarbonateSystem;
import freshet.carbonate.Litre;
import freshet.carbonate.Weiss1974;
import freshet.substance.MolarMass;
import java.util.List;
import java.util.OptionalDouble;

/** Puts together the answer on the carbonate equilibrium of one water. */
final class SpeciationAnswer {

    private final CarbonateSpeciationRequest request;
    private final Litre litre;

    private SpeciationAnswer(CarbonateSpeciationRequest request) {
        this.request = request;
        litre = Litre.of(request.temperatureC(), request.salinity());
    }

    static Answer<CarbonateSpeciationResponse> to(CarbonateSpeciationRequest request) {
        return new SpeciationAnswer(request).answer();
    }

    private Answer<CarbonateSpeciationResponse> answer() {
        CarbonateState state = state();
        double alkalinity = litre.alkalinityMgPerL(state.alkalinity());
        List<Notice> notices = WaterNotices.of(request.salinity(), request.phScale(), alkalinity, request.ph());
        if (Weiss1974.farBelowAir(state.co2(), request.temperatureC(), request.salinity())) {
            notices.add(
                    new Notice(
                            "co2-below-air",
                            "co2_mg_per_l",
                            "Less than half of what outdoor air leaves in water: aerated it takes up CO2, and pH falls. Check the readings."));
        }
        CarbonateSpeciationResponse response = new CarbonateSpeciationResponse(
                state.ph(),
                litre.milligrams(state.co2(), MolarMass.CARBON_DIOXIDE),
                alkalinity,
                litre.millimoles(state.inorganicCarbon()),
                litre.milligrams(state.hco3(), MolarMass.BICARBONATE),
                litre.milligrams(state.co3(), MolarMass.CARBONATE),
                calcite(state, notices));
        return new Answer<>(
                response,
                CarbonateSystem.METHOD,
                CarbonateSystem.validity(request.temperatureC(), request.salinity()),
                notices);
    }

    private OptionalDouble calcite(CarbonateState state, List<Notice> notices) {
        Double calcium = request.calciumMgPerL();
        if (calcium == null) {
            return OptionalDouble.empty();
        }
        OptionalDouble index = CalciteSaturation.index(
                litre.ofMilligrams(calcium, MolarMass.CALCIUM),
                state.co3(),
                request.temperatureC(),
                request.salinity());
        if (index.isEmpty()) {
            notices.add(new Notice(
                    "no-calcite-index",
                    "calcite_saturation_index",
                    "Without any calcium or any carbonate there is no saturation index."));
        }
        return index;
    }

    private CarbonateState state() {
        Double tan = request.tanMgPerL();
        CarbonateSolver solver = CarbonateSolver.of(
                request.temperatureC(),
                request.salinity(),
                request.scale(),
                litre.ofMilligrams(tan == null ? 0 : tan, MolarMass.NITROGEN));
        Double ph = request.ph();
        Double alkalinity = request.alkalinityMgPerLAsCaco3();
        Double co2 = request.co2MgPerL();
        Double carbon = request.inorganicCarbonMmolPerL();
        if (ph != null) {
            return alkalinity != null
                    ? solver.ofPhAndAlkalinity(ph, litre.alkalinity(alkalinity))
                    : co2 != null
                            ? solver.ofPhAndCo2(ph, carbonDioxide(co2))
                            : solver.ofPhAndCarbon(ph, litre.ofMillimoles(carbon == null ? 0 : carbon));
        }
        if (alkalinity != null) {
            return co2 != null
                    ? solver.ofAlkalinityAndCo2(litre.alkalinity(alkalinity), carbonDioxide(co2))
                    : solver.ofAlkalinityAndCarbon(
                            litre.alkalinity(alkalinity), litre.ofMillimoles(carbon == null ? 0 : carbon));
        }
        return solver.ofCo2AndCarbon(
                carbonDioxide(co2 == null ? 0 : co2), litre.ofMillimoles(carbon == null ? 0 : carbon));
    }

    private double carbonDioxide(double mgPerL) {
        return litre.ofMilligrams(mgPerL, MolarMass.CARBON_DIOXIDE);
    }
}
