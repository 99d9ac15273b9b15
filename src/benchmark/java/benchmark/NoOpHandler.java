package benchmark;

import org.springframework.boot.SpringApplication;
import org.springframework.boot.autoconfigure.SpringBootApplication;
import org.springframework.boot.web.servlet.ServletRegistrationBean;
import org.springframework.context.annotation.Bean;
import org.springframework.web.bind.annotation.GetMapping;
import org.springframework.web.bind.annotation.RestController;

/**
 * What the framework itself costs: a handler that does nothing, in the default configuration of the same stack; and beside
 * it the bound of a series.
 */
@SpringBootApplication
@RestController
public class NoOpHandler {

    record Nothing(boolean ok) {}

    /** Starts it; {@code --server.port} chooses the port. */
    public static void main(String[] arguments) {
        SpringApplication application = new SpringApplication(NoOpHandler.class);
        // The settings of the service are not the framework's defaults.
        System.setProperty("spring.config.location", "optional:classpath:/none/");
        application.run(arguments);
    }

    @Bean
    ServletRegistrationBean<BareSeries> bareSeries() {
        return new ServletRegistrationBean<>(new BareSeries(), "/bare");
    }

    @GetMapping("/noop")
    Nothing noop() {
        return new Nothing(true);
    }
}
