package freshet.nitrate.web;

import freshet.nitrate.MixedTank;
import freshet.quantity.Reported;
import java.util.List;
import java.util.stream.IntStream;

record NitrateTrajectoryResponse(
        @Reported("Nitrate at even steps from now to the horizon")
        List<Point> items) {

    record Point(
            @Reported("Time from now") double timeDays,
            @Reported("Nitrate, as N") double no3NMgPerL) {}

    static NitrateTrajectoryResponse of(MixedTank tank, double horizonDays, int points) {
        return new NitrateTrajectoryResponse(IntStream.range(0, points)
                .mapToDouble(i -> horizonDays * i / (points - 1))
                .mapToObj(days -> new Point(days, tank.mgPerLAfter(days)))
                .toList());
    }
}
