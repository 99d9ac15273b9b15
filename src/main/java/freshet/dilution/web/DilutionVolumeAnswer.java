package freshet.dilution.web;

import freshet.answer.Answer;
import freshet.answer.Fault;
import freshet.answer.FaultCode;
import freshet.answer.Notice;
import freshet.answer.Refusal;
import freshet.dilution.ConcentrationChange;
import freshet.dilution.DilutionMode;
import freshet.method.Validity;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.jspecify.annotations.Nullable;

/** Puts together the answer on the water for a change of concentration. */
final class DilutionVolumeAnswer {

    private static final double BLEND_PERCENT = 10;

    private final DilutionVolumeRequest request;
    private final ConcentrationChange change;
    private final List<Notice> notices = new ArrayList<>();

    private DilutionVolumeAnswer(DilutionVolumeRequest request) {
        this.request = request;
        change = request.change();
    }

    static Answer<DilutionVolumeResponse> to(DilutionVolumeRequest request) {
        return new DilutionVolumeAnswer(request).answer();
    }

    private Answer<DilutionVolumeResponse> answer() {
        DilutionVolumeResponse response = switch (request.mode()) {
            case SINGLE -> inStages(1);
            case STAGED -> inStages(stages());
            case CONTINUOUS -> continuous();
        };
        if (change.alreadyMet()) {
            notices.add(new Notice(
                    "target-already-met",
                    "target_mg_per_l",
                    "The concentration is at the target or beyond it already."));
        }
        if (response.exchangePercent() > BLEND_PERCENT) {
            notices.add(new Notice(
                    "check-blend",
                    "exchange_percent",
                    "Look at pH, temperature and chlorine of the mixture first; discharge may need a permit."));
        }
        unusedInputs();
        return new Answer<>(response, request.mode().method(), Validity.WITHIN, notices);
    }

    private int stages() {
        Double most = request.maxStagePercent();
        if (most == null) {
            throw new Refusal(
                    "max_stage_percent", FaultCode.MISSING, "max_stage_percent is missing: mode=staged needs it.");
        }
        return change.alreadyMet() ? 0 : change.stages(most);
    }

    private DilutionVolumeResponse inStages(int planned) {
        int stages = change.alreadyMet() ? 0 : planned;
        double stageL = stages == 0 ? 0 : stages == 1 ? change.singleL() : change.stageL(stages);
        return response(stages * stageL, Optional.of(stages), OptionalDouble.of(stageL), OptionalDouble.empty());
    }

    private DilutionVolumeResponse continuous() {
        Double flow = request.flowLPerHour();
        Double duration = request.durationHours();
        List<String> names = List.of("flow_l_per_hour", "duration_hours");
        if ((flow == null) == (duration == null)) {
            throw new Refusal(new Fault(
                            flow == null ? names.get(0) : names.get(1),
                            flow == null ? FaultCode.ONE_REQUIRED : FaultCode.CONFLICT,
                            "With mode=continuous give exactly one of flow_l_per_hour, duration_hours.")
                    .allowing(names));
        }
        double waterL = change.alreadyMet() ? 0 : change.continuousL();
        double flowLPerHour = flow == null ? waterL / duration : flow;
        if (flowLPerHour == 0 && waterL > 0) {
            throw new Refusal("flow_l_per_hour", FaultCode.BELOW_MINIMUM, "Without a flow nothing is exchanged.");
        }
        return response(waterL, Optional.empty(), OptionalDouble.empty(), OptionalDouble.of(flowLPerHour));
    }

    private DilutionVolumeResponse response(
            double waterL, Optional<Integer> stages, OptionalDouble stageL, OptionalDouble flowLPerHour) {
        Double duration = request.durationHours();
        boolean met = change.alreadyMet();
        return new DilutionVolumeResponse(
                waterL,
                100 * waterL / request.volumeL(),
                stages,
                stageL,
                flowLPerHour,
                flowLPerHour.isEmpty()
                        ? OptionalDouble.empty()
                        : OptionalDouble.of(
                                duration != null ? duration : met ? 0 : waterL / flowLPerHour.getAsDouble()),
                met ? request.concentrationMgPerL() : request.targetMgPerL(),
                met ? OptionalDouble.empty() : OptionalDouble.of(100 * (waterL / change.singleL() - 1)));
    }

    private void unusedInputs() {
        unused(DilutionMode.STAGED, "max_stage_percent", request.maxStagePercent());
        unused(DilutionMode.CONTINUOUS, "flow_l_per_hour", request.flowLPerHour());
        unused(DilutionMode.CONTINUOUS, "duration_hours", request.durationHours());
    }

    private void unused(DilutionMode owner, String field, @Nullable Double value) {
        if (value != null && request.mode() != owner) {
            notices.add(new Notice("input-not-used", field, "It belongs to another mode of exchange."));
        }
    }
}
