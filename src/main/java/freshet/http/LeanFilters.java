package freshet.http;

import io.micrometer.observation.ObservationRegistry;
import jakarta.servlet.Filter;
import org.springframework.boot.web.servlet.FilterRegistrationBean;
import org.springframework.boot.webmvc.autoconfigure.DispatcherServletAutoConfiguration;
import org.springframework.context.annotation.Bean;
import org.springframework.context.annotation.Configuration;
import org.springframework.web.filter.CharacterEncodingFilter;
import org.springframework.web.filter.FormContentFilter;
import org.springframework.web.filter.RequestContextFilter;
import org.springframework.web.filter.ServerHttpObservationFilter;

/**
 * Keeps Spring's filters in front of Spring MVC only: the servlet of the calculations needs none of them. Declaring a
 * registration makes Boot's own filter of the same type back off.
 */
@Configuration(proxyBeanMethods = false)
class LeanFilters {

    @Bean
    FilterRegistrationBean<CharacterEncodingFilter> characterEncodingFilterRegistration() {
        return beforeMvc(new CharacterEncodingFilter("UTF-8"));
    }

    @Bean
    FilterRegistrationBean<FormContentFilter> formContentFilterRegistration() {
        return beforeMvc(new FormContentFilter());
    }

    @Bean
    FilterRegistrationBean<RequestContextFilter> requestContextFilterRegistration() {
        return beforeMvc(new RequestContextFilter());
    }

    @Bean
    FilterRegistrationBean<ServerHttpObservationFilter> observationFilterRegistration(ObservationRegistry registry) {
        return beforeMvc(new ServerHttpObservationFilter(registry));
    }

    private static <F extends Filter> FilterRegistrationBean<F> beforeMvc(F filter) {
        FilterRegistrationBean<F> registration = new FilterRegistrationBean<>(filter);
        registration.addServletNames(DispatcherServletAutoConfiguration.DEFAULT_DISPATCHER_SERVLET_BEAN_NAME);
        return registration;
    }
}
