package freshet.catalogue.openapi;

import freshet.http.Calculation;
import freshet.http.Calculations;
import io.swagger.v3.oas.models.Components;
import io.swagger.v3.oas.models.OpenAPI;
import io.swagger.v3.oas.models.PathItem;
import io.swagger.v3.oas.models.Paths;
import io.swagger.v3.oas.models.info.Info;
import io.swagger.v3.oas.models.info.License;
import io.swagger.v3.oas.models.media.Schema;
import io.swagger.v3.oas.models.servers.Server;
import io.swagger.v3.oas.models.tags.Tag;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.springdoc.core.customizers.GlobalOpenApiCustomizer;
import org.springframework.boot.info.BuildProperties;
import org.springframework.context.annotation.Bean;
import org.springframework.context.annotation.Configuration;

/** The document at {@code /openapi.yaml} and {@code /openapi.json}. */
@Configuration(proxyBeanMethods = false)
class OpenApiConfiguration {

    private static final String DESCRIPTION = """
            Nitrogen water chemistry of fish farms and aquaponic greenhouses: stateless, one calculation a request.

            **Units and bases.** Every name ends in its unit, before it the basis: `tan_mg_per_l` is total ammonia as N, \
            `nh3_mg_per_l` is ammonia as NH3. Units never depend on the request. Inputs may be given in other units by other \
            names (`x-alternative-to`), exactly one of them.

            **pH.** An error of 0.1 in pH is an error of about 25 % in NH3: calibrate. In saline water say which scale the pH \
            is on.

            **Answers** name their method, its version and reference, and whether the inputs lie `within` the range its source \
            states. A quantity that does not exist is left out and a notice says why; nothing is ever null.

            **Cautions.** Answers are estimates from published methods. Confirm by measurement before acting on fish or water; \
            changes of pH, temperature, salt and make-up water can kill. Local codes and licensed practice decide on \
            discharge and on chemicals. Gas supersaturation, hydrogen sulfide, metals, phosphate, pathogens and medication are \
            not judged here.""";

    @Bean
    GlobalOpenApiCustomizer freshetDocument(Calculations calculations, BuildProperties build) {
        return document -> {
            document.info(new Info()
                            .title("Freshet")
                            .version(build.getVersion())
                            .description(DESCRIPTION)
                            .license(new License().name("Apache-2.0").identifier("Apache-2.0")))
                    .servers(List.of(new Server().url("/")))
                    .security(List.of())
                    .tags(tags(calculations));
            Map<String, PathItem> paths = new TreeMap<>();
            Map<String, Schema<?>> schemas = new TreeMap<>();
            ProblemResponses.addSchemas(schemas);
            CataloguePaths.add(paths, schemas);
            calculations.all().forEach(calculation -> {
                paths.put(calculation.address(), CalculationPath.of(calculation));
                schemas.putAll(CalculationSchemas.of(calculation));
                if (calculation.hasSeries()) {
                    paths.put(calculation.seriesAddress(), SeriesPath.of(calculation));
                    SeriesPath.addSchemas(calculation, schemas);
                }
            });
            write(document, paths, schemas);
        };
    }

    private static void write(OpenAPI document, Map<String, PathItem> paths, Map<String, Schema<?>> schemas) {
        Paths all = new Paths();
        paths.forEach(all::addPathItem);
        Components components = new Components();
        schemas.forEach(components::addSchemas);
        ProblemResponses.all().forEach(components::addResponses);
        document.paths(all).components(components);
    }

    private static List<Tag> tags(Calculations calculations) {
        Stream<Tag> topics = calculations.all().stream()
                .map(OpenApiConfiguration::topic)
                .distinct()
                .map(topic -> new Tag().name(topic).description("Calculations on " + topic));
        Tag catalogue = new Tag().name(CataloguePaths.TAG).description("What the service tells of itself");
        return Stream.concat(topics, Stream.of(catalogue)).toList();
    }

    static String topic(Calculation<?, ?> calculation) {
        return calculation.path().substring(0, calculation.path().indexOf('/'));
    }
}
