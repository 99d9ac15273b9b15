package freshet.ammonia.web;

import freshet.ammonia.AmmoniaMethod;
import freshet.ammonia.AmmoniaSpeciation;
import freshet.ammonia.AmmoniaUncertainty;
import freshet.ammonia.LimitTable;
import freshet.ammonia.Nh3Guideline;
import freshet.ammonia.TanGuideline;
import freshet.ammonia.UsEpa1989Dissociation;
import freshet.answer.Answer;
import freshet.http.Calculation;
import freshet.http.binding.Controls.Format;
import freshet.method.Method;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;
import org.springframework.context.annotation.Bean;
import org.springframework.context.annotation.Configuration;

/** The calculations of this topic. */
@Configuration(proxyBeanMethods = false)
class AmmoniaCalculations {

    private static final List<Method> DISSOCIATION_METHODS = Arrays.stream(AmmoniaMethod.values())
            .map(choice -> choice.dissociation().method())
            .toList();

    private static final List<Method> CRITERIA_METHODS = Stream.concat(
                    Arrays.stream(TanGuideline.values())
                            .map(choice -> choice.criterion().method()),
                    Stream.of(UsEpa1989Dissociation.METHOD))
            .toList();

    @Bean
    Calculation<AmmoniaSpeciationRequest, AmmoniaSpeciationResponse> ammoniaSpeciation() {
        return Calculation.of(
                        "ammonia/speciation",
                        AmmoniaSpeciationRequest.class,
                        AmmoniaSpeciationResponse.class,
                        AmmoniaCalculations::speciation)
                .describedAs(
                        "How much of the total ammonia is the toxic un-ionized form",
                        "An error of 0.1 in pH is an error of about 25 % in NH3: calibrate the probe.")
                .using(Stream.concat(DISSOCIATION_METHODS.stream(), Stream.of(AmmoniaUncertainty.METHOD))
                        .toList())
                .shownBy("tan_mg_per_l=1.2&ph=8.1&temperature_c=26");
    }

    @Bean
    Calculation<AmmoniaLimitsRequest, AmmoniaLimitsResponse> ammoniaLimits() {
        return Calculation.of(
                        "ammonia/limits", AmmoniaLimitsRequest.class, AmmoniaLimitsResponse.class, LimitsAnswer::to)
                .describedAs(
                        "At which total ammonia a limit of un-ionized ammonia is met, and how far pH and temperature may"
                                + " move before it is",
                        "A limit of total ammonia holds for one pH and one temperature; ask again when either moves."
                                + " Guidelines are for receiving waters: not advice for a culture tank, not a permit.")
                .using(Stream.concat(
                                DISSOCIATION_METHODS.stream(),
                                Arrays.stream(Nh3Guideline.values()).map(Nh3Guideline::method))
                        .toList())
                .shownBy("nh3_n_limit_mg_per_l=0.02&ph=7.4&temperature_c=26&tan_mg_per_l=1.2");
    }

    @Bean
    Calculation<AmmoniaLimitTableRequest, AmmoniaLimitTableResponse> ammoniaLimitTable() {
        return Calculation.of(
                        "ammonia/limit-table",
                        AmmoniaLimitTableRequest.class,
                        AmmoniaLimitTableResponse.class,
                        LimitTableAnswer::to)
                .describedAs(
                        "Limits of total ammonia by pH and temperature for days without a network, safe under interpolation",
                        "A table never replaces a reading. It holds for one salinity; above the last node a lookup must give 0,"
                                + " so that every comparison raises an alarm. Toxicity depends on species, age and"
                                + " acclimation.")
                .using(Stream.concat(
                                Stream.concat(Stream.of(LimitTable.METHOD), DISSOCIATION_METHODS.stream()),
                                Arrays.stream(Nh3Guideline.values()).map(Nh3Guideline::method))
                        .toList())
                .shownBy("nh3_n_limit_mg_per_l=0.02&ph_min=7&ph_max=8.5&ph_step=0.5&temperature_min_c=10"
                        + "&temperature_max_c=30&temperature_step_c=10")
                .readOnly(Map.of(Format.C, LimitTableHeader::of, Format.CSV, LimitTableHeader::csv));
    }

    @Bean
    Calculation<AmmoniaCriteriaRequest, AmmoniaCriteriaResponse> ammoniaCriteria() {
        return Calculation.of(
                        "ammonia/criteria",
                        AmmoniaCriteriaRequest.class,
                        AmmoniaCriteriaResponse.class,
                        CriteriaAnswer::to)
                .describedAs(
                        "Which total ammonia published criteria allow in receiving waters, over which average",
                        "Criteria protect wild animals in receiving waters: fresh-water mussels, salmonids and early life"
                                + " stages of fish (usepa-2013), fish (usepa-1999), sea animals (usepa-1989-saltwater)."
                                + " They are averages that may be exceeded once in three years, for one pH and one"
                                + " temperature; a single reading is no average. They are not advice for a culture tank and"
                                + " not a permit: local codes decide.")
                .using(CRITERIA_METHODS)
                .shownBy("guideline=usepa-2013&ph=7.8&temperature_c=18&tan_mg_per_l=0.9");
    }

    private static Answer<AmmoniaSpeciationResponse> speciation(AmmoniaSpeciationRequest request) {
        DissociationChoice choice = DissociationChoice.of(request.sample(), request.method());
        AmmoniaSpeciation speciation = AmmoniaSpeciation.of(request.tanMgPerL(), choice.water(), choice.dissociation());
        if (!request.namesUncertainty()) {
            return new Answer<>(
                    AmmoniaSpeciationResponse.of(speciation, Optional.empty()),
                    choice.dissociation().method(),
                    choice.validity(),
                    choice.notices());
        }
        SpeciationUncertainty uncertainty = new SpeciationUncertainty(request, choice);
        return new Answer<>(
                AmmoniaSpeciationResponse.of(speciation, uncertainty.relative()),
                choice.dissociation().method(),
                choice.validity(),
                uncertainty.notices());
    }
}
