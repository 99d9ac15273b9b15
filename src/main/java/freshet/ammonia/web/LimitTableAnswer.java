package freshet.ammonia.web;

import freshet.ammonia.LimitTable;
import freshet.ammonia.LimitTable.Grid;
import freshet.answer.Answer;
import freshet.answer.Fault;
import freshet.answer.FaultCode;
import freshet.answer.Notice;
import freshet.answer.Refusal;
import freshet.method.Validity;
import freshet.quantity.Sample;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.IntStream;

/** Puts together the answer that is a table of limits. */
final class LimitTableAnswer {

    private static final int MOST_CELLS = 10_000;
    private static final double ROUNDING = 1e-9;

    private final AmmoniaLimitTableRequest request;
    private final List<Fault> faults = new ArrayList<>(0);

    private LimitTableAnswer(AmmoniaLimitTableRequest request) {
        this.request = request;
    }

    static Answer<AmmoniaLimitTableResponse> to(AmmoniaLimitTableRequest request) {
        return new LimitTableAnswer(request).answer();
    }

    private Answer<AmmoniaLimitTableResponse> answer() {
        Grid grid = grid();
        DissociationChoice choice = DissociationChoice.of(
                new Sample(request.phMin(), request.temperatureMinC(), request.salinity(), request.phScale()),
                request.method());
        LimitTable table = new LimitTable(
                request.limitMgPerL(),
                grid,
                choice.dissociation(),
                new LimitTable.SaltWater(request.salinity(), choice.sample().scale()));
        AmmoniaLimitTableResponse response = new AmmoniaLimitTableResponse(
                AmmoniaLimitTableResponse.Interpolation.BILINEAR,
                table.lossPercent(),
                request.limitMgPerL(),
                IntStream.range(0, grid.phCount()).mapToObj(grid::ph).toList(),
                IntStream.range(0, grid.temperatureCount())
                        .mapToObj(grid::temperatureC)
                        .toList(),
                Arrays.stream(table.nodes())
                        .map(row -> Arrays.stream(row).boxed().toList())
                        .toList());
        Validity validity =
                choice.validity().and(choice.dissociation().validity(request.temperatureMaxC(), request.salinity()));
        return new Answer<>(response, LimitTable.METHOD, validity, notices(choice));
    }

    private List<Notice> notices(DissociationChoice choice) {
        List<Notice> notices = new ArrayList<>(choice.notices());
        notices.add(new Notice(
                "limit-conditional",
                "tan_limit_mg_per_l",
                "For salinity " + freshet.http.media.SixDigits.text(request.salinity()) + " and "
                        + choice.dissociation().method().id()
                        + "; a table never replaces a reading. Above the last node the limit is 0."));
        return notices;
    }

    private Grid grid() {
        int phCount = count("ph", request.phMin(), request.phMax(), request.phStep());
        int temperatureCount =
                count("temperature", request.temperatureMinC(), request.temperatureMaxC(), request.temperatureStepC());
        if (faults.isEmpty() && (long) phCount * temperatureCount > MOST_CELLS) {
            faults.add(new Fault(
                            "ph_step",
                            FaultCode.ABOVE_MAXIMUM,
                            "The table would have " + (long) phCount * temperatureCount
                                    + " cells; at most 10000 are made: take greater steps.")
                    .bounds(OptionalDouble.empty(), OptionalDouble.of(MOST_CELLS), "1"));
        }
        if (!faults.isEmpty()) {
            throw new Refusal(faults);
        }
        return new Grid(
                request.phMin(),
                request.phStep(),
                phCount,
                request.temperatureMinC(),
                request.temperatureStepC(),
                temperatureCount);
    }

    private int count(String axis, double from, double to, double step) {
        String unit = axis.equals("ph") ? "" : "_c";
        if (to <= from) {
            faults.add(new Fault(
                    axis + "_max" + unit,
                    FaultCode.INCONSISTENT,
                    axis + "_max" + unit + " must be greater than " + axis + "_min" + unit + "."));
            return 0;
        }
        double steps = (to - from) / step;
        if (Math.abs(steps - Math.rint(steps)) > ROUNDING * steps) {
            faults.add(new Fault(
                    axis + "_step" + unit,
                    FaultCode.INCONSISTENT,
                    axis + "_step" + unit + " does not divide the range from " + axis + "_min" + unit + " to " + axis
                            + "_max" + unit + "."));
        }
        return (int) Math.min(Integer.MAX_VALUE - 1, Math.rint(steps)) + 1;
    }
}
