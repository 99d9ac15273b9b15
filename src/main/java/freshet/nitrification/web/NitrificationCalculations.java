package freshet.nitrification.web;

import freshet.http.Calculation;
import freshet.method.Method;
import freshet.nitrification.LoadMethod;
import freshet.nitrification.Meals;
import freshet.nitrification.ProteinCoefficient;
import freshet.nitrification.Stoichiometry;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;
import org.springframework.context.annotation.Bean;
import org.springframework.context.annotation.Configuration;

/** The calculations of this topic. */
@Configuration(proxyBeanMethods = false)
class NitrificationCalculations {

    private static final List<Method> LOAD_METHODS = Stream.concat(
                    Arrays.stream(LoadMethod.values()).map(LoadMethod::method), Stream.of(Meals.METHOD))
            .toList();
    private static final List<Method> DEMAND_METHODS = Stream.concat(
                    Arrays.stream(Stoichiometry.values()).map(Stoichiometry::method),
                    Stream.of(ProteinCoefficient.METHOD))
            .toList();

    @Bean
    Calculation<NitrificationLoadRequest, NitrificationLoadResponse> nitrificationLoad() {
        return Calculation.of(
                        "nitrification/load",
                        NitrificationLoadRequest.class,
                        NitrificationLoadResponse.class,
                        LoadAnswer::to)
                .describedAs(
                        "How much ammonia fish give off for the feed they get",
                        "A daily mean for fed, growing fish: not for fasting fish, fry on live feed or much uneaten feed."
                                + " Confirm it by measurement.")
                .using(LOAD_METHODS)
                .shownBy("feed_kg_per_day=24&protein_percent=40&meals=one");
    }

    @Bean
    Calculation<NitrificationDemandRequest, NitrificationDemandResponse> nitrificationDemand() {
        return Calculation.of(
                        "nitrification/demand",
                        NitrificationDemandRequest.class,
                        NitrificationDemandResponse.class,
                        DemandAnswer::to)
                .describedAs(
                        "What the oxidation of ammonia to nitrate consumes: oxygen, alkalinity, bicarbonate",
                        "A running farm doses the net figure. A filter that stalls at nitrite still consumes all the"
                                + " alkalinity. Respiration of fish and decay of solids take oxygen besides.")
                .using(DEMAND_METHODS)
                .shownBy("feed_kg_per_day=24&protein_percent=40&volume_l=80000&alkalinity_mg_per_l_as_caco3=140");
    }
}
