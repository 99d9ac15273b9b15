package freshet.dilution.web;

import freshet.ammonia.AmmoniaMethod;
import freshet.carbonate.CarbonateSystem;
import freshet.carbonate.Weiss1974;
import freshet.dilution.Blend;
import freshet.dilution.DilutionMode;
import freshet.http.Calculation;
import java.util.Arrays;
import java.util.List;
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

    @Bean
    Calculation<DilutionBlendRequest, DilutionBlendResponse> dilutionBlend() {
        return Calculation.of(
                        "dilution/blend", DilutionBlendRequest.class, DilutionBlendResponse.class, BlendAnswer::to)
                .describedAs(
                        "What tank water becomes when source water is mixed in, at once and hours later: pH, toxic ammonia,"
                                + " temperature; and how much may safely be exchanged",
                        "Hard, alkaline source water lowers total ammonia and still raises toxic ammonia, since pH rises: at"
                                + " once, or hours later when carbon dioxide has gone. Dechlorinate before mixing and measure to"
                                + " zero. Confirm pH, temperature and ammonia by measurement; discharge may need a permit.")
                .using(List.of(
                        Blend.METHOD,
                        CarbonateSystem.METHOD,
                        Weiss1974.METHOD,
                        AmmoniaMethod.EMERSON_1975.dissociation().method(),
                        AmmoniaMethod.CLEGG_WHITFIELD_1995.dissociation().method()))
                .shownBy("tank.volume_l=7000&tank.temperature_c=26&tank.ph=6.8&tank.alkalinity_mg_per_l_as_caco3=25"
                        + "&tank.tan_mg_per_l=4&source.volume_l=3000&source.temperature_c=24&source.ph=8.2"
                        + "&source.alkalinity_mg_per_l_as_caco3=260&source.tan_mg_per_l=0");
    }
}
