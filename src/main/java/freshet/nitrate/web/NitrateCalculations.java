package freshet.nitrate.web;

import freshet.answer.Answer;
import freshet.answer.Notice;
import freshet.http.Calculation;
import freshet.method.Method;
import freshet.nitrate.MixedTank;
import freshet.nitrate.NitrateFromFeed;
import freshet.nitrate.NitrateLimit;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.springframework.context.annotation.Bean;
import org.springframework.context.annotation.Configuration;

/** The calculations of this topic. */
@Configuration(proxyBeanMethods = false)
class NitrateCalculations {

    private static final List<Method> METHODS = List.of(MixedTank.METHOD, NitrateFromFeed.METHOD);
    private static final String CAUTIONS =
            "The tank is taken as mixed and the sources as constant. Before a large exchange"
                    + " look at pH, temperature and chlorine as well; discharge may need a permit.";
    private static final String EXAMPLE = "volume_l=50000&no3_n_mg_per_l=40&feed_kg_per_day=10&protein_percent=42"
            + "&exchange_l_per_day=3000&source_no3_n_mg_per_l=5&plant_area_m2=60&denitrified_percent=15";

    @Bean
    Calculation<NitrateAccumulationRequest, NitrateAccumulationResponse> nitrateAccumulation() {
        return Calculation.of(
                        "nitrate/accumulation",
                        NitrateAccumulationRequest.class,
                        NitrateAccumulationResponse.class,
                        request -> accumulation(request.inputs()))
                .describedAs("Where nitrate ends up, when it passes a limit, and the exchange that holds it", CAUTIONS)
                .using(METHODS)
                .shownBy(EXAMPLE + "&no3_n_limit_mg_per_l=100");
    }

    @Bean
    Calculation<NitrateTrajectoryRequest, NitrateTrajectoryResponse> nitrateTrajectory() {
        return Calculation.of(
                        "nitrate/trajectory",
                        NitrateTrajectoryRequest.class,
                        NitrateTrajectoryResponse.class,
                        NitrateCalculations::trajectory)
                .describedAs("Nitrate over the days ahead", CAUTIONS)
                .using(METHODS)
                .shownBy(EXAMPLE + "&points=4");
    }

    private static Answer<NitrateAccumulationResponse> accumulation(NitrateInputs inputs) {
        MixedTank tank = inputs.tank();
        List<Notice> notices = inputs.notices(tank);
        Optional<NitrateLimit> limit =
                Optional.ofNullable(inputs.no3NLimitMgPerL()).map(value -> new NitrateLimit(tank, value));
        limit.ifPresent(value -> notices.addAll(0, limitNotices(value)));
        return answer(
                new NitrateAccumulationResponse(
                        limit.map(NitrateLimit::outcome),
                        limit.map(NitrateLimit::days).orElse(OptionalDouble.empty()),
                        limit.map(NitrateLimit::exchangeLPerDay).orElse(OptionalDouble.empty()),
                        tank.mgPerLAfter(inputs.horizonDays()),
                        tank.plateauMgPerL(),
                        tank.netGPerDay()),
                inputs,
                notices);
    }

    private static List<Notice> limitNotices(NitrateLimit limit) {
        List<Notice> notices = new ArrayList<>(2);
        if (limit.tank().nowMgPerL() > limit.limitMgPerL()) {
            notices.add(new Notice(
                    "above-limit-now",
                    "no3_n_limit_mg_per_l",
                    "Nitrate is above the limit now: see dilution/volume for the water that brings it down."));
        }
        if (limit.exchangeLPerDay().isEmpty()) {
            notices.add(new Notice(
                    "source-not-below-limit",
                    "source_no3_n_mg_per_l",
                    "No exchange holds the limit: the source water is not below it."));
        }
        return notices;
    }

    private static Answer<NitrateTrajectoryResponse> trajectory(NitrateTrajectoryRequest request) {
        NitrateInputs inputs = request.inputs();
        MixedTank tank = inputs.tank();
        List<Notice> notices = inputs.notices(tank);
        if (inputs.no3NLimitMgPerL() != null) {
            notices.add(new Notice(
                    "input-not-used", "no3_n_limit_mg_per_l", "A trajectory has no limit; see nitrate/accumulation."));
        }
        return answer(NitrateTrajectoryResponse.of(tank, inputs.horizonDays(), request.points()), inputs, notices);
    }

    private static <R extends Record> Answer<R> answer(R response, NitrateInputs inputs, List<Notice> notices) {
        return new Answer<>(response, MixedTank.METHOD, inputs.validity(), notices);
    }
}
