package freshet.salinity.web;

import freshet.answer.Answer;
import freshet.answer.Notice;
import freshet.http.Calculation;
import freshet.method.Validity;
import freshet.salinity.Hill1986;
import freshet.salinity.MilleroPoisson1981;
import freshet.salinity.PracticalSalinity1978;
import java.util.ArrayList;
import java.util.List;
import org.springframework.context.annotation.Bean;
import org.springframework.context.annotation.Configuration;

/** The calculations of this topic. */
@Configuration(proxyBeanMethods = false)
class SalinityCalculations {

    private static final double COMPENSATED_C = 25;
    /** Salinity below which other salts than those of the sea are the rule. Common practice. */
    private static final double FRESH = 1;

    private static final PracticalSalinity1978 SCALE = PracticalSalinity1978.published();

    @Bean
    Calculation<SalinityFromConductivityRequest, SalinityFromConductivityResponse> salinityFromConductivity() {
        return Calculation.of(
                        "salinity/from-conductivity",
                        SalinityFromConductivityRequest.class,
                        SalinityFromConductivityResponse.class,
                        SalinityCalculations::salinity)
                .describedAs(
                        "Practical salinity and density from a conductivity meter",
                        "Holds for sea salt. Water whose salt is another, hard well water above all, gets an index only. Say"
                                + " whether the meter compensates: the difference is about 2 % for each °C.")
                .using(List.of(PracticalSalinity1978.METHOD, Hill1986.METHOD, MilleroPoisson1981.METHOD))
                .shownBy("conductivity_ms_per_cm=30&temperature_c=15");
    }

    private static Answer<SalinityFromConductivityResponse> salinity(SalinityFromConductivityRequest request) {
        List<Notice> notices = new ArrayList<>(1);
        Double compensated = request.conductivity_25cMsPerCm();
        double t = request.temperatureC();
        double salinity;
        if (compensated != null) {
            salinity = SCALE.salinity(compensated, COMPENSATED_C);
            notices.add(
                    new Notice(
                            "compensated-by-meter",
                            "conductivity_25c_ms_per_cm",
                            "The meter's own compensation to 25 °C was taken as right; one made for fresh water errs in sea water."));
        } else {
            Double measured = request.conductivityMsPerCm();
            salinity = SCALE.salinity(measured == null ? 0 : measured, t);
        }
        if (salinity < FRESH) {
            notices.add(
                    new Notice(
                            "sea-salt-assumed",
                            "salinity",
                            "Holds for diluted sea water only: well water of other salts conducts too, and other calculations want salinity 0 for it."));
        }
        Validity validity = PracticalSalinity1978.validity(compensated == null ? t : COMPENSATED_C, salinity);
        return new Answer<>(
                new SalinityFromConductivityResponse(salinity, MilleroPoisson1981.kgPerM3(t, salinity)),
                PracticalSalinity1978.METHOD,
                validity.and(MilleroPoisson1981.validity(t, salinity)),
                notices);
    }
}
