package freshet.carbonate.web;

import freshet.ammonia.AmmoniaMethod;
import freshet.carbonate.AlkalinityDose;
import freshet.carbonate.CarbonateSystem;
import freshet.carbonate.Mucci1983;
import freshet.carbonate.Weiss1974;
import freshet.http.Calculation;
import java.util.List;
import org.springframework.context.annotation.Bean;
import org.springframework.context.annotation.Configuration;

/** The calculations of this topic. */
@Configuration(proxyBeanMethods = false)
class CarbonateCalculations {

    @Bean
    Calculation<CarbonateSpeciationRequest, CarbonateSpeciationResponse> carbonateSpeciation() {
        return Calculation.of(
                        "carbonate/speciation",
                        CarbonateSpeciationRequest.class,
                        CarbonateSpeciationResponse.class,
                        SpeciationAnswer::to)
                .describedAs(
                        "Carbon dioxide, bicarbonate and carbonate from any two of pH, alkalinity, carbon dioxide and"
                                + " inorganic carbon",
                        "An error of 0.1 in pH is an error of 26 % in carbon dioxide; below pH 6 or 10 mg/L of alkalinity"
                                + " what is derived from pH is uncertain. Measure carbon dioxide where fish depend on it.")
                .using(List.of(CarbonateSystem.METHOD, Mucci1983.METHOD, Weiss1974.METHOD))
                .shownBy("ph=7.2&alkalinity_mg_per_l_as_caco3=120&temperature_c=15&calcium_mg_per_l=40");
    }

    @Bean
    Calculation<CarbonateDoseRequest, CarbonateDoseResponse> carbonateDose() {
        return Calculation.of("carbonate/dose", CarbonateDoseRequest.class, CarbonateDoseResponse.class, DoseAnswer::to)
                .describedAs(
                        "How much of a base to dose for an alkalinity or a pH, in which steps, and what it does to ammonia",
                        "Hydroxides and carbonates burn people and fish: goggles and gloves, the solid into water and never"
                                + " water onto the solid, never into a line with acid or hypochlorite. Bicarbonate is the"
                                + " mild choice. A rise of pH makes toxic ammonia of the harmless part: steps, and measure"
                                + " between them. Local codes and licensed practice decide.")
                .using(List.of(
                        AlkalinityDose.METHOD,
                        CarbonateSystem.METHOD,
                        Mucci1983.METHOD,
                        Weiss1974.METHOD,
                        AmmoniaMethod.EMERSON_1975.dissociation().method(),
                        AmmoniaMethod.CLEGG_WHITFIELD_1995.dissociation().method()))
                .shownBy("volume_l=10000&ph=7&temperature_c=25&alkalinity_mg_per_l_as_caco3=40&tan_mg_per_l=1"
                        + "&target_alkalinity_mg_per_l_as_caco3=100&chemical=sodium-bicarbonate");
    }
}
