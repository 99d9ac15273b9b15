package freshet.http;

import freshet.http.limits.Admission;
import freshet.http.series.Series;
import io.micrometer.core.instrument.MeterRegistry;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Set;
import org.springframework.beans.factory.annotation.Value;
import org.springframework.boot.info.BuildProperties;
import org.springframework.boot.web.servlet.ServletRegistrationBean;
import org.springframework.context.annotation.Bean;
import org.springframework.context.annotation.Configuration;

/** Puts the servlets at the addresses of all calculations and of their series. */
@Configuration(proxyBeanMethods = false)
class HttpConfiguration {

    @Bean
    RequestTimers requestTimers(MeterRegistry registry) {
        return new RequestTimers(registry);
    }

    @Bean
    ServletRegistrationBean<CalculationServlet> calculationServlet(
            Calculations calculations,
            RequestTimers timers,
            BuildProperties build,
            @Value("${freshet.limits.calculations-at-once}") int atOnce) {
        Map<String, Endpoint<?, ?>> endpoints = new LinkedHashMap<>();
        calculations
                .all()
                .forEach(calculation -> endpoints.put(
                        calculation.address(), new Endpoint<>(calculation, String.valueOf(build.getVersion()))));
        return at(endpoints.keySet(), new CalculationServlet(endpoints, new Admission(atOnce), timers), "calculations");
    }

    @Bean
    ServletRegistrationBean<SeriesServlet> seriesServlet(
            Calculations calculations, RequestTimers timers, @Value("${freshet.limits.series-at-once}") int atOnce) {
        Map<String, Series<?>> series = new LinkedHashMap<>();
        calculations.all().stream()
                .filter(Calculation::hasSeries)
                .forEach(calculation -> series.put(calculation.seriesAddress(), series(calculation)));
        return at(series.keySet(), new SeriesServlet(series, new Admission(atOnce), timers), "series");
    }

    private static <I extends Record, O extends Record> Series<I> series(Calculation<I, O> calculation) {
        return new Series<>(calculation.path(), calculation.inputs(), calculation.outputs(), calculation::answer);
    }

    private static <S extends ProblemServlet> ServletRegistrationBean<S> at(
            Set<String> addresses, S servlet, String name) {
        ServletRegistrationBean<S> registration =
                new ServletRegistrationBean<>(servlet, addresses.toArray(String[]::new));
        registration.setName(name);
        return registration;
    }
}
