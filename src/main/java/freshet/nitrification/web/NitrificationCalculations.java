package freshet.nitrification.web;

import freshet.http.Calculation;
import freshet.method.Method;
import freshet.nitrification.BiofilterCapacity;
import freshet.nitrification.BiofilterSizing;
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
    Calculation<NitrificationCapacityRequest, NitrificationCapacityResponse> nitrificationCapacity() {
        return Calculation.of(
                        "nitrification/capacity",
                        NitrificationCapacityRequest.class,
                        NitrificationCapacityResponse.class,
                        CapacityAnswer::to)
                .describedAs(
                        "How much ammonia a biofilter oxidizes, whether it carries a load, and at which total ammonia",
                        "Total ammonia is that of the water entering the filter, oxygen that at the media. Published"
                                + " rates spread five- to tenfold; a mature, untreated film is assumed, and nitrite may"
                                + " lag. The equilibrium assumes the present pH, oxygen and temperature and no exchange"
                                + " of water. Confirm it by measurement.")
                .using(List.of(BiofilterCapacity.METHOD))
                .shownBy("media=moving-bed&media_volume_m3=3&ph=7.3&temperature_c=22&tan_mg_per_l=1.1"
                        + "&dissolved_oxygen_mg_per_l=6.2&alkalinity_mg_per_l_as_caco3=110"
                        + "&biofilter_flow_l_per_hour=24000&feed_kg_per_day=6&protein_percent=40");
    }

    @Bean
    Calculation<NitrificationSizingRequest, NitrificationSizingResponse> nitrificationSizing() {
        return Calculation.of(
                        "nitrification/sizing",
                        NitrificationSizingRequest.class,
                        NitrificationSizingResponse.class,
                        SizingAnswer::to)
                .describedAs(
                        "How much media and flow a load of ammonia needs",
                        "Published rates spread five- to tenfold: look at the upper amount too. A mature, untreated film"
                                + " is assumed, and nitrite may lag. Fill of moving-bed carriers is at most 67 % of the"
                                + " reactor.")
                .using(List.of(BiofilterSizing.METHOD))
                .shownBy("media=trickling&feed_kg_per_day=15&protein_percent=38&ph=7.4&temperature_c=18"
                        + "&tan_mg_per_l=1.2&dissolved_oxygen_mg_per_l=7&alkalinity_mg_per_l_as_caco3=100");
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
