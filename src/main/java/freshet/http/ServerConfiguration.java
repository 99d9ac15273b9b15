package freshet.http;

import freshet.http.problem.ProblemValve;
import org.apache.catalina.core.StandardHost;
import org.springframework.boot.tomcat.servlet.TomcatServletWebServerFactory;
import org.springframework.boot.web.server.WebServerFactoryCustomizer;
import org.springframework.context.annotation.Bean;
import org.springframework.context.annotation.Configuration;

/** The server's own answers follow the service's rules. */
@Configuration(proxyBeanMethods = false)
class ServerConfiguration {

    /** Tomcat writes 8 KiB at a time; a series is written in parts of 32 KiB. */
    @Bean
    WebServerFactoryCustomizer<TomcatServletWebServerFactory> largerWrites() {
        return factory ->
                factory.addConnectorCustomizers(connector -> connector.setProperty("socket.appWriteBufSize", "32768"));
    }

    @Bean
    WebServerFactoryCustomizer<TomcatServletWebServerFactory> problemsFromTheServer() {
        return factory -> factory.addContextCustomizers(context -> {
            if (context.getParent() instanceof StandardHost host) {
                host.setErrorReportValveClass(ProblemValve.class.getName());
            }
        });
    }
}
