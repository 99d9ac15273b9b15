package freshet;

import org.springframework.boot.SpringApplication;
import org.springframework.boot.autoconfigure.SpringBootApplication;

/** The application. */
@SpringBootApplication
public class Freshet {

    /** Starts the service; every setting is a Spring Boot property. */
    public static void main(String[] arguments) {
        SpringApplication.run(Freshet.class, arguments);
    }
}
