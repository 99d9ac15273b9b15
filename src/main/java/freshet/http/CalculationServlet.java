package freshet.http;

import freshet.http.limits.Admission;
import freshet.http.limits.Sizes;
import freshet.http.problem.Problem;
import freshet.http.problem.ProblemException;
import freshet.http.problem.ProblemType;
import freshet.http.problem.Problems;
import jakarta.servlet.http.HttpServlet;
import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.io.IOException;
import java.util.Map;

/** Answers every calculation. */
final class CalculationServlet extends HttpServlet {

    private static final long serialVersionUID = 1L;
    private static final String ALLOWED = "GET, HEAD, POST, OPTIONS";

    private final transient Map<String, Endpoint<?, ?>> endpoints;
    private final transient Admission admission;
    private final transient RequestTimers timers;

    /** A servlet for the endpoints by their addresses. */
    CalculationServlet(Map<String, Endpoint<?, ?>> endpoints, Admission admission, RequestTimers timers) {
        this.endpoints = endpoints;
        this.admission = admission;
        this.timers = timers;
    }

    @Override
    protected void service(HttpServletRequest request, HttpServletResponse response) throws IOException {
        long start = System.nanoTime();
        try {
            admission.enter();
            try {
                answer(request, response);
            } finally {
                admission.leave();
            }
        } catch (RuntimeException thrown) {
            response.reset();
            boolean inBody = "POST".equals(request.getMethod());
            Problem problem = Problems.of(thrown, inBody);
            if (problem.status() == HttpServletResponse.SC_METHOD_NOT_ALLOWED) {
                response.setHeader("Allow", ALLOWED);
            }
            Problems.send(problem, thrown, request, response);
        }
        timers.record(request, response, System.nanoTime() - start);
    }

    private void answer(HttpServletRequest request, HttpServletResponse response) throws IOException {
        Sizes.checkAddress(request);
        Endpoint<?, ?> endpoint = endpoints.get(request.getServletPath());
        if (endpoint == null) {
            throw new ProblemException(
                    Problem.of(ProblemType.NOT_FOUND, "There is no calculation here; GET / lists all of them."));
        }
        switch (request.getMethod()) {
            case "GET", "HEAD" -> endpoint.get(request, response);
            case "POST" -> endpoint.post(request, response);
            case "OPTIONS" -> response.setHeader("Allow", ALLOWED);
            default ->
                throw new ProblemException(Problem.of(
                        ProblemType.METHOD_NOT_ALLOWED,
                        "A calculation is asked by GET with a query or by POST with JSON."));
        }
    }
}
