package freshet.oxygen.web;

import freshet.answer.Answer;
import freshet.answer.Notice;
import freshet.http.Calculation;
import freshet.method.Validity;
import freshet.oxygen.BensonKrause1984;
import freshet.oxygen.StandardAtmosphere1976;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.springframework.context.annotation.Bean;
import org.springframework.context.annotation.Configuration;

/** The calculations of this topic. */
@Configuration(proxyBeanMethods = false)
class OxygenCalculations {

    /** The cut of definitions of the filter; fish suffer earlier. Common practice. */
    private static final double CRITICAL_MG_PER_L = 2;
    /** US EPA 1986: total dissolved gas to 110 % of saturation; from memory. */
    private static final double SUPERSATURATED_PERCENT = 110;

    @Bean
    Calculation<OxygenSaturationRequest, OxygenSaturationResponse> oxygenSaturation() {
        return Calculation.of(
                        "oxygen/saturation",
                        OxygenSaturationRequest.class,
                        OxygenSaturationResponse.class,
                        OxygenCalculations::saturation)
                .describedAs(
                        "Dissolved oxygen at saturation, and percent saturation",
                        "The pressure is that at the place, never the one reduced to sea level that airports and weather"
                                + " reports give. Supersaturation with other gases is not judged.")
                .using(List.of(BensonKrause1984.METHOD, StandardAtmosphere1976.METHOD))
                .shownBy("temperature_c=18&station_pressure_hpa=1001&dissolved_oxygen_mg_per_l=8.2");
    }

    private static Answer<OxygenSaturationResponse> saturation(OxygenSaturationRequest request) {
        List<Notice> notices = new ArrayList<>(1);
        double pressure = pressure(request, notices);
        double t = request.temperatureC();
        double saturation = BensonKrause1984.mgPerL(t, request.salinity(), pressure);
        Double measured = request.dissolvedOxygenMgPerL();
        if (measured != null) {
            judge(measured, 100 * measured / saturation, notices);
        }
        Validity validity = BensonKrause1984.validity(t, request.salinity(), pressure);
        return new Answer<>(
                new OxygenSaturationResponse(
                        saturation,
                        pressure,
                        measured == null ? OptionalDouble.empty() : OptionalDouble.of(100 * measured / saturation)),
                BensonKrause1984.METHOD,
                validity,
                notices);
    }

    private static void judge(double mgPerL, double percent, List<Notice> notices) {
        if (mgPerL < CRITICAL_MG_PER_L) {
            notices.add(
                    new Notice(
                            "oxygen-critical",
                            "dissolved_oxygen_mg_per_l",
                            "Below 2 mg/L most fish are in danger at once and nitrification fails: aerate, and check the probe."));
        } else if (percent > SUPERSATURATED_PERCENT) {
            notices.add(
                    new Notice(
                            "supersaturated",
                            "dissolved_oxygen_mg_per_l",
                            "Above 110 % gas bubbles can harm fish unless other gases are stripped; if this was a percent, it is not mg/L."));
        }
    }

    private static double pressure(OxygenSaturationRequest request, List<Notice> notices) {
        Double measured = request.stationPressureHpa();
        Double altitude = request.altitudeM();
        if (measured != null) {
            return measured;
        }
        if (altitude != null) {
            notices.add(new Notice(
                    "mean-pressure-of-altitude",
                    "altitude_m",
                    "Weather moves the pressure, and saturation with it, by about 3 %: a measured one is better."));
            return StandardAtmosphere1976.hPa(altitude);
        }
        notices.add(new Notice(
                "sea-level-pressure-assumed",
                "station_pressure_hpa",
                "Neither pressure nor altitude was given; 1013.25 hPa was taken. At 1000 m oxygen is 11 % less."));
        return BensonKrause1984.ATMOSPHERE_HPA;
    }
}
