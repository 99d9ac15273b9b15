package freshet.carbonate.web;

import freshet.ammonia.AmmoniaSpeciation;
import freshet.ammonia.Water;
import freshet.answer.Answer;
import freshet.answer.Notice;
import freshet.carbonate.AlkalinityDose;
import freshet.carbonate.CarbonateState;
import freshet.carbonate.CarbonateSystem;
import freshet.carbonate.Weiss1974;
import freshet.quantity.Sample;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** Puts together the answer on a dose. */
final class DoseAnswer {

    private static final double ROUNDING = 1e-6;
    /** Change of pH that a probe does not tell. */
    private static final double SAME_PH = 0.1;

    private final CarbonateDoseRequest request;
    private final Sample sample;
    private final DosePlan plan;

    private DoseAnswer(CarbonateDoseRequest request) {
        this.request = request;
        sample = request.sample();
        plan = new DosePlan(request);
    }

    static Answer<CarbonateDoseResponse> to(CarbonateDoseRequest request) {
        return new DoseAnswer(request).answer();
    }

    private Answer<CarbonateDoseResponse> answer() {
        double dose = plan.dose();
        boolean limestone = request.chemical().limestone();
        OptionalDouble closedPh = limestone
                ? OptionalDouble.empty()
                : OptionalDouble.of(plan.closed(dose).ph());
        double dissolved = plan.dissolved(dose);
        CarbonateState settled = plan.settled(dissolved);
        double doseG = plan.grams(dose);
        double stepG = plan.grams(plan.step(dose));
        Double solution = request.solutionGPerL();
        CarbonateDoseResponse response = new CarbonateDoseResponse(
                stepG == 0 ? 0 : (int) Math.min(Integer.MAX_VALUE, Math.ceil(doseG / stepG * (1 - 1e-12))),
                stepG,
                AlkalinityDose.hoursBetweenSteps(request.phRiseLimit()),
                doseG,
                solution == null ? OptionalDouble.empty() : OptionalDouble.of(doseG / solution),
                sample.ph(),
                closedPh,
                settled.ph(),
                plan.alkalinityMgPerL(dissolved),
                nh3(OptionalDouble.of(sample.ph())),
                worse(nh3(closedPh), nh3(OptionalDouble.of(settled.ph()))),
                nh3(OptionalDouble.of(settled.ph())));
        return new Answer<>(
                response,
                AlkalinityDose.METHOD,
                CarbonateSystem.validity(sample.temperatureC(), sample.salinity()),
                notices(response, dose));
    }

    private OptionalDouble nh3(OptionalDouble ph) {
        Double tan = request.tanMgPerL();
        return tan == null || ph.isEmpty()
                ? OptionalDouble.empty()
                : OptionalDouble.of(AmmoniaSpeciation.nh3NMgPerL(
                        tan, new Water(ph.getAsDouble(), sample.temperatureC(), sample.salinity(), sample.scale())));
    }

    private static OptionalDouble worse(OptionalDouble closed, OptionalDouble settled) {
        return closed.isEmpty() ? closed : OptionalDouble.of(Math.max(closed.getAsDouble(), settled.orElse(0)));
    }

    private List<Notice> notices(CarbonateDoseResponse response, double dose) {
        List<Notice> notices = new ArrayList<>();
        if (request.chemical().caustic()) {
            notices.add(new Notice(
                    "caustic-protect-people",
                    "chemical",
                    "Goggles, gloves; the solid into water, never water onto it; never with acid or hypochlorite in a line."
                            + " Bicarbonate is milder."));
        }
        if (response.steps() > 1) {
            notices.add(
                    new Notice(
                            "dose-in-steps",
                            "steps",
                            "Never the whole dose at once: between steps let carbon dioxide recover, and measure pH and ammonia."));
        }
        notices.addAll(calciteNotices(response, dose));
        ammonia(response).ifPresent(notices::add);
        notices.addAll(
                WaterNotices.of(sample.salinity(), sample.phScale(), request.alkalinityMgPerLAsCaco3(), sample.ph()));
        settling(response, dose).ifPresent(notices::add);
        if (Weiss1974.farBelowAir(plan.settledCo2(), sample.temperatureC(), sample.salinity())) {
            notices.add(new Notice(
                    "settled-co2-below-air",
                    "settled_co2_mg_per_l",
                    "Less than half of what outdoor air leaves in water: pH and NH3 will settle lower than shown."));
        }
        return notices;
    }

    private Optional<Notice> ammonia(CarbonateDoseResponse response) {
        if (request.tanMgPerL() == null) {
            return Optional.of(new Notice(
                    "nh3-not-judged",
                    "tan_mg_per_l",
                    "Total ammonia was not given: what this rise of pH makes of it is not known. Measure it first."));
        }
        double before = response.nh3NBeforeMgPerL().orElse(0) * (1 + ROUNDING);
        boolean rises = Math.max(
                        response.nh3NMgPerL().orElse(0),
                        response.nh3NSettledMgPerL().orElse(0))
                > before;
        return rises
                ? Optional.of(
                        new Notice(
                                "nh3-rises",
                                "nh3_n_mg_per_l",
                                "Toxic ammonia rises with pH, at once or when CO2 has settled: keep it below what the fish bear."))
                : Optional.empty();
    }

    private Optional<Notice> settling(CarbonateDoseResponse response, double dose) {
        if (request.targetPh() != null && Math.abs(response.phSettled() - request.targetPh()) > SAME_PH) {
            return Optional.of(
                    new Notice(
                            "ph-settles-elsewhere",
                            "ph_settled",
                            "When carbon dioxide has settled, pH is near ph_settled, not target_ph: do not dose again for the rest."));
        }
        double step = plan.settled(plan.step(dose)).ph() - sample.ph();
        return step > request.phRiseLimit() + ROUNDING
                ? Optional.of(
                        new Notice(
                                "step-settles-higher",
                                "max_step_g",
                                "When carbon dioxide has settled, one step has raised pH by more than ph_rise_limit: give smaller ones."))
                : Optional.empty();
    }

    private List<Notice> calciteNotices(CarbonateDoseResponse response, double dose) {
        List<Notice> notices = new ArrayList<>(2);
        Double target = request.targetAlkalinityMgPerLAsCaco3();
        if (target != null && response.alkalinityAfterMgPerLAsCaco3() < target * (1 - ROUNDING)) {
            notices.add(
                    new Notice(
                            "target-not-reached",
                            "alkalinity_after_mg_per_l_as_caco3",
                            "The water is saturated with calcite before the target is reached: the rest of the dose does not dissolve."));
        }
        if (request.chemical().limestone()) {
            notices.add(
                    new Notice(
                            "dissolves-slowly",
                            "alkalinity_after_mg_per_l_as_caco3",
                            "The most that can dissolve, over days and weeks; pH and NH3 settled are those of that upper bound."));
        }
        if (request.chemical().calcium() && request.calciumMgPerL() == null) {
            notices.add(new Notice(
                    "precipitation-not-checked",
                    "calcium_mg_per_l",
                    "Calcium was not given, so saturation with calcite could not be judged."));
        }
        if (!request.chemical().limestone()
                && plan.calcite(plan.closed(dose), dose).orElse(-1) > 0) {
            notices.add(
                    new Notice(
                            "calcite-may-precipitate",
                            "dose_g",
                            "The whole dose at once passes saturation with calcite: milky water, and alkalinity is lost again."));
        }
        return notices;
    }
}
