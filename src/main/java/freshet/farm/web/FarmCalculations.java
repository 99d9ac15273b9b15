package freshet.farm.web;

import freshet.ammonia.AmmoniaMethod;
import freshet.farm.AlarmProfile;
import freshet.farm.GuardBand;
import freshet.http.Calculation;
import java.util.List;
import org.springframework.context.annotation.Bean;
import org.springframework.context.annotation.Configuration;

/** The calculations of this topic. */
@Configuration(proxyBeanMethods = false)
class FarmCalculations {

    @Bean
    Calculation<AlarmSetpointsRequest, AlarmSetpointsResponse> farmAlarmSetpoints() {
        return Calculation.of(
                        "farm/alarm-setpoints",
                        AlarmSetpointsRequest.class,
                        AlarmSetpointsResponse.class,
                        SetpointsAnswer::to)
                .describedAs(
                        "Alarm set-points for today's water, as far inside the limits as the sensors are uncertain, and when to"
                                + " ask again",
                        "The guard covers the sensors only: not stratification, drift since calibration, or the time between"
                                + " samples. Set-points of total ammonia hold for this pH and temperature; above is the"
                                + " dangerous side. Profiles are starting points, not advice for a species.")
                .using(List.of(
                        GuardBand.METHOD,
                        AlarmProfile.COLD_WATER.method(),
                        AlarmProfile.WARM_WATER.method(),
                        AlarmProfile.MARINE.method(),
                        AmmoniaMethod.EMERSON_1975.dissociation().method(),
                        AmmoniaMethod.CLEGG_WHITFIELD_1995.dissociation().method()))
                .shownBy("ph=7.4&temperature_c=26&profile=warm-water&tan_mg_per_l=0.8"
                        + "&variables=tan,ph,temperature,dissolved_oxygen");
    }
}
