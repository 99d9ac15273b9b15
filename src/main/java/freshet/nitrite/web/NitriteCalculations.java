package freshet.nitrite.web;

import freshet.http.Calculation;
import freshet.method.Method;
import freshet.nitrite.ChlorideProtection;
import freshet.nitrite.ChlorideRatios;
import freshet.nitrite.NitriteMethod;
import freshet.nitrite.NitrousAcidInhibition;
import freshet.nitrite.SaltDose;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;
import org.springframework.context.annotation.Bean;
import org.springframework.context.annotation.Configuration;

/** The calculations of this topic. */
@Configuration(proxyBeanMethods = false)
class NitriteCalculations {

    private static final List<Method> SPECIATION_METHODS = Stream.concat(
                    Arrays.stream(NitriteMethod.values())
                            .map(choice -> choice.dissociation().method()),
                    Stream.of(NitrousAcidInhibition.METHOD))
            .toList();

    @Bean
    Calculation<NitriteSpeciationRequest, NitriteSpeciationResponse> nitriteSpeciation() {
        return Calculation.of(
                        "nitrite/speciation",
                        NitriteSpeciationRequest.class,
                        NitriteSpeciationResponse.class,
                        SpeciationAnswer::to)
                .describedAs(
                        "How much of the nitrite is nitrous acid, which slows nitrifiers at low pH",
                        "An error of 0.1 in pH is an error of about 25 % in nitrous acid: calibrate the probe. What harms"
                                + " fish is mostly the nitrite ion: see nitrite/protection.")
                .using(SPECIATION_METHODS)
                .shownBy("no2_n_mg_per_l=0.8&ph=6.4&temperature_c=22");
    }

    @Bean
    Calculation<NitriteProtectionRequest, NitriteProtectionResponse> nitriteProtection() {
        return Calculation.of(
                        "nitrite/protection",
                        NitriteProtectionRequest.class,
                        NitriteProtectionResponse.class,
                        ProtectionAnswer::to)
                .describedAs(
                        "Whether the chloride keeps nitrite out of fish at a ratio you choose, and the salt that is missing",
                        "The ratio is Cl : NO2-N by mass; ratios are also quoted as molar or per NO2, and a mix-up is an"
                                + " error of 2.5 to 3.3 times. Chloride protects some species only. Salt harms plants and"
                                + " stalls biofilters: dissolve it, spread it over hours, at most 1 g/L a day, and measure"
                                + " between.")
                .using(List.of(ChlorideProtection.METHOD, ChlorideRatios.METHOD, SaltDose.METHOD))
                .shownBy("no2_n_mg_per_l=0.8&chloride_mg_per_l=12&chloride_to_no2_n_mass_ratio=40.5&volume_l=20000"
                        + "&chemical=sodium-chloride");
    }
}
