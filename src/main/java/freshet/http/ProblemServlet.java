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
import org.jspecify.annotations.Nullable;

/** A servlet that lets in only so many requests at once, times them, and ends whatever goes wrong with a problem. */
abstract class ProblemServlet extends HttpServlet {

    private static final long serialVersionUID = 1L;

    private final transient Admission admission;
    private final transient RequestTimers timers;

    /** A servlet with so many places. */
    ProblemServlet(Admission admission, RequestTimers timers) {
        this.admission = admission;
        this.timers = timers;
    }

    /** Answers a request, or throws what is wrong with it. */
    abstract void answer(HttpServletRequest request, HttpServletResponse response) throws IOException;

    /** The HTTP methods that the address of a request takes, as the Allow header lists them. */
    abstract String allowed(HttpServletRequest request);

    /** JSON pointer of the object in the body that holds the inputs of a request; null if they are elsewhere. */
    abstract @Nullable String holder(HttpServletRequest request);

    @Override
    protected void service(HttpServletRequest request, HttpServletResponse response) throws IOException {
        long start = System.nanoTime();
        try {
            admission.enter();
            try {
                Sizes.checkAddress(request);
                if ("OPTIONS".equals(request.getMethod())) {
                    response.setHeader("Allow", allowed(request));
                } else {
                    answer(request, response);
                }
            } finally {
                admission.leave();
            }
        } catch (RuntimeException thrown) {
            response.reset();
            Problem problem = Problems.of(thrown, holder(request));
            if (problem.type() == ProblemType.METHOD_NOT_ALLOWED) {
                response.setHeader("Allow", allowed(request));
            }
            Problems.send(problem, thrown, request, response);
        }
        timers.record(request, response, System.nanoTime() - start);
    }

    static ProblemException nothingHere() {
        return new ProblemException(
                Problem.of(ProblemType.NOT_FOUND, "There is no calculation here; GET / lists all of them."));
    }

    static ProblemException methodNotAllowed(String detail) {
        return new ProblemException(Problem.of(ProblemType.METHOD_NOT_ALLOWED, detail));
    }
}
