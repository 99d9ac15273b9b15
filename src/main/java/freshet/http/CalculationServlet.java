package freshet.http;

import freshet.http.limits.Admission;
import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.io.IOException;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/** Answers every calculation. */
final class CalculationServlet extends ProblemServlet {

    private static final long serialVersionUID = 1L;

    private final transient Map<String, Endpoint<?, ?>> endpoints;

    /** A servlet for the endpoints by their addresses. */
    CalculationServlet(Map<String, Endpoint<?, ?>> endpoints, Admission admission, RequestTimers timers) {
        super(admission, timers);
        this.endpoints = endpoints;
    }

    @Override
    void answer(HttpServletRequest request, HttpServletResponse response) throws IOException {
        Endpoint<?, ?> endpoint = endpoints.get(request.getServletPath());
        if (endpoint == null) {
            throw nothingHere();
        }
        switch (request.getMethod()) {
            case "GET", "HEAD" -> {
                if (!endpoint.takesQuery()) {
                    throw methodNotAllowed("The inputs stand in groups: ask by POST with JSON.");
                }
                endpoint.get(request, response);
            }
            case "POST" -> {
                if (!endpoint.takesBody()) {
                    throw methodNotAllowed("This is asked by GET with a query.");
                }
                endpoint.post(request, response);
            }
            default -> throw methodNotAllowed("A calculation is asked by GET with a query or by POST with JSON.");
        }
    }

    @Override
    String allowed(HttpServletRequest request) {
        Endpoint<?, ?> endpoint = endpoints.get(request.getServletPath());
        boolean reads = endpoint == null || endpoint.takesQuery();
        boolean takes = endpoint == null || endpoint.takesBody();
        return (reads ? "GET, HEAD, " : "") + (takes ? "POST, " : "") + "OPTIONS";
    }

    @Override
    @Nullable
    String holder(HttpServletRequest request) {
        return "POST".equals(request.getMethod()) ? "" : null;
    }
}
