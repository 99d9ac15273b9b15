package freshet.carbonate.web;

import freshet.answer.Fault;
import freshet.answer.FaultCode;
import freshet.answer.Refusal;
import freshet.carbonate.AlkalinityDose;
import freshet.carbonate.CalciteSaturation;
import freshet.carbonate.CarbonateSolver;
import freshet.carbonate.CarbonateState;
import freshet.carbonate.CarbonateWater;
import freshet.carbonate.Litre;
import freshet.quantity.Sample;
import freshet.substance.MolarMass;
import java.util.OptionalDouble;

/** The doses that a request asks for, in mol of chemical for each kg of water, and what they do. */
final class DosePlan {

    private static final int HALVINGS = 60;

    private final CarbonateDoseRequest request;
    private final Sample sample;
    private final Litre litre;
    private final CarbonateState before;
    private final AlkalinityDose chemistry;

    DosePlan(CarbonateDoseRequest request) {
        this.request = request;
        sample = request.sample();
        litre = Litre.of(sample.temperatureC(), sample.salinity());
        Double given = request.tanMgPerL();
        double tan = litre.ofMilligrams(given == null ? 0 : given, MolarMass.NITROGEN);
        double alkalinity = litre.alkalinity(request.alkalinityMgPerLAsCaco3());
        before = CarbonateSolver.of(sample.temperatureC(), sample.salinity(), sample.scale(), tan)
                .ofPhAndAlkalinity(sample.ph(), alkalinity);
        CarbonateWater water =
                new CarbonateWater(sample.temperatureC(), sample.salinity(), alkalinity, before.inorganicCarbon(), tan);
        chemistry = new AlkalinityDose(water, request.chemical(), sample.scale());
    }

    /** The whole dose. */
    double dose() {
        if (request.chemical().limestone() && calcite(before, 0).orElse(-1) >= 0) {
            throw new Refusal(
                    "chemical",
                    FaultCode.UNREACHABLE,
                    "The water is saturated with calcite already: calcium carbonate does not dissolve in it.");
        }
        Double alkalinity = request.targetAlkalinityMgPerLAsCaco3();
        Double ph = request.targetPh();
        return alkalinity != null ? doseForAlkalinity(alkalinity) : doseForPh(ph == null ? 0 : ph);
    }

    private double doseForAlkalinity(double target) {
        double present = request.alkalinityMgPerLAsCaco3();
        if (target < present) {
            throw new Refusal(new Fault(
                            "target_alkalinity_mg_per_l_as_caco3",
                            FaultCode.UNREACHABLE,
                            "The water has more alkalinity already; every one of these chemicals raises it.")
                    .bounds(OptionalDouble.of(present), OptionalDouble.empty(), "mg/L"));
        }
        return chemistry.toAlkalinity(litre.alkalinity(target));
    }

    private double doseForPh(double target) {
        if (request.chemical().limestone()) {
            throw new Refusal(
                    "target_ph",
                    FaultCode.UNREACHABLE,
                    "Calcium carbonate dissolves too slowly to set a pH; give a target alkalinity.");
        }
        if (target < sample.ph()) {
            throw new Refusal(new Fault(
                            "target_ph",
                            FaultCode.UNREACHABLE,
                            "The pH is higher already; every one of these chemicals raises it.")
                    .bounds(OptionalDouble.of(sample.ph()), OptionalDouble.empty(), "[pH]"));
        }
        return chemistry
                .toPh(target)
                .orElseThrow(() -> new Refusal(
                        "target_ph",
                        FaultCode.UNREACHABLE,
                        "No dose of this chemical lifts closed water to that pH: bicarbonates end at about 8.3. A well"
                                + " aerated tank may stand higher, since carbon dioxide leaves it; hydroxides and carbonates"
                                + " reach it, with care."));
    }

    /** The most that may be given at once. */
    double step(double dose) {
        double most = litre.alkalinity(request.chemical().mostStepMgPerLAsCaco3())
                / request.chemical().equivalents();
        double highest = Math.min(14, sample.ph() + request.phRiseLimit());
        return Math.min(most, chemistry.toPh(highest).orElse(dose));
    }

    /** The part of a dose that dissolves: of limestone no more than to saturation, where calcium is known. */
    double dissolved(double dose) {
        if (!request.chemical().limestone() || request.calciumMgPerL() == null) {
            return dose;
        }
        double low = 0;
        double high = dose;
        for (int i = 0; i < HALVINGS; i++) {
            double middle = (low + high) / 2;
            boolean saturated = calcite(closed(middle), middle).orElse(-1) > 0;
            low = saturated ? low : middle;
            high = saturated ? middle : high;
        }
        return high;
    }

    /** Saturation index of calcite with a dose; empty where calcium is not known. */
    OptionalDouble calcite(CarbonateState state, double dose) {
        Double given = request.calciumMgPerL();
        if (given == null) {
            return OptionalDouble.empty();
        }
        double calcium = litre.ofMilligrams(given, MolarMass.CALCIUM)
                + (request.chemical().calcium() ? dose : 0);
        return CalciteSaturation.index(calcium, state.co3(), sample.temperatureC(), sample.salinity());
    }

    CarbonateState closed(double dose) {
        try {
            return chemistry.closed(dose);
        } catch (Refusal beyondAnyPh) {
            throw new Refusal(
                    request.targetPh() == null ? "target_alkalinity_mg_per_l_as_caco3" : "target_ph",
                    FaultCode.UNREACHABLE,
                    "So much of this chemical would lift closed water beyond pH 14; choose a bicarbonate or a lower target.");
        }
    }

    /** The equilibrium when carbon dioxide is what it was before, or what the caller says. */
    CarbonateState settled(double dose) {
        return chemistry.settled(dose, settledCo2());
    }

    /** Carbon dioxide of the settled state, mol/kg. */
    double settledCo2() {
        Double given = request.settledCo2MgPerL();
        return given == null ? before.co2() : litre.ofMilligrams(given, MolarMass.CARBON_DIOXIDE);
    }

    double alkalinityMgPerL(double dose) {
        return litre.alkalinityMgPerL(chemistry.alkalinity(dose));
    }

    /** Grams of the chemical as it is bought. */
    double grams(double dose) {
        return chemistry.grams(dose, request.volumeL()) * 100 / request.purityPercent();
    }
}
