package freshet.catalogue.openapi;

import org.springframework.context.annotation.Configuration;
import org.springframework.web.servlet.config.annotation.ViewControllerRegistry;
import org.springframework.web.servlet.config.annotation.WebMvcConfigurer;

/** Gives the JSON document the address that its YAML sibling has. */
@Configuration(proxyBeanMethods = false)
class OpenApiAddresses implements WebMvcConfigurer {

    @Override
    public void addViewControllers(ViewControllerRegistry registry) {
        registry.addViewController("/openapi.json").setViewName("forward:/openapi");
    }
}
