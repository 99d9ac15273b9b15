package freshet.dilution.web;

import freshet.dilution.DilutionMode;
import freshet.http.Calculation;
import java.util.Arrays;
import org.springframework.context.annotation.Bean;
import org.springframework.context.annotation.Configuration;

/** The calculations of this topic. */
@Configuration(proxyBeanMethods = false)
class DilutionCalculations {

    @Bean
    Calculation<DilutionVolumeRequest, DilutionVolumeResponse> dilutionVolume() {
        return Calculation.of(
                        "dilution/volume",
                        DilutionVolumeRequest.class,
                        DilutionVolumeResponse.class,
                        DilutionVolumeAnswer::to)
                .describedAs(
                        "How much water a change of concentration takes, at once, in stages or continuously",
                        "Nothing is taken to be produced meanwhile, and pH, temperature and chlorine are not looked at: a"
                                + " large exchange can shock fish or raise toxic ammonia. Discharge may need a permit.")
                .using(Arrays.stream(DilutionMode.values())
                        .map(DilutionMode::method)
                        .toList())
                .shownBy("volume_l=10000&concentration_mg_per_l=120&target_mg_per_l=50&source_mg_per_l=5&mode=staged"
                        + "&max_stage_percent=20");
    }
}
