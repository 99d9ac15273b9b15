package freshet.http;

import freshet.http.limits.Admission;
import io.micrometer.core.instrument.MeterRegistry;
import java.util.LinkedHashMap;
import java.util.Map;
import org.springframework.beans.factory.annotation.Value;
import org.springframework.boot.info.BuildProperties;
import org.springframework.boot.web.servlet.ServletRegistrationBean;
import org.springframework.context.annotation.Bean;
import org.springframework.context.annotation.Configuration;

/** Puts the servlet at the addresses of all calculations. */
@Configuration(proxyBeanMethods = false)
class HttpConfiguration {

    @Bean
    ServletRegistrationBean<CalculationServlet> calculationServlet(
            Calculations calculations,
            MeterRegistry registry,
            BuildProperties build,
            @Value("${freshet.limits.calculations-at-once}") int atOnce) {
        Map<String, Endpoint<?, ?>> endpoints = new LinkedHashMap<>();
        calculations
                .all()
                .forEach(calculation -> endpoints.put(
                        calculation.address(), new Endpoint<>(calculation, String.valueOf(build.getVersion()))));
        CalculationServlet servlet =
                new CalculationServlet(endpoints, new Admission(atOnce), new RequestTimers(registry));
        ServletRegistrationBean<CalculationServlet> registration =
                new ServletRegistrationBean<>(servlet, endpoints.keySet().toArray(String[]::new));
        registration.setName("calculations");
        return registration;
    }
}
