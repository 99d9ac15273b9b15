package freshet.http.problem;

import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.io.IOException;
import org.springframework.core.Ordered;
import org.springframework.core.annotation.Order;
import org.springframework.http.HttpMethod;
import org.springframework.web.ErrorResponse;
import org.springframework.web.HttpRequestMethodNotSupportedException;
import org.springframework.web.bind.annotation.ControllerAdvice;
import org.springframework.web.bind.annotation.ExceptionHandler;

/** Turns what Spring MVC could not answer into problems. */
@ControllerAdvice
@Order(Ordered.HIGHEST_PRECEDENCE)
class ProblemAdvice {

    @ExceptionHandler
    void handle(Exception thrown, HttpServletRequest request, HttpServletResponse response) throws IOException {
        if (thrown instanceof HttpRequestMethodNotSupportedException refused
                && refused.getSupportedHttpMethods() != null) {
            response.setHeader(
                    "Allow",
                    String.join(
                            ", ",
                            refused.getSupportedHttpMethods().stream()
                                    .map(HttpMethod::name)
                                    .toList()));
        }
        Problems.send(problem(thrown), thrown, request, response);
    }

    private static Problem problem(Exception thrown) {
        return thrown instanceof ErrorResponse known
                ? Problem.ofStatus(known.getStatusCode().value())
                : Problems.of(thrown, null);
    }
}
