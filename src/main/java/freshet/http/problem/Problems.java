package freshet.http.problem;

import freshet.answer.Refusal;
import freshet.http.binding.Controls;
import freshet.http.binding.UnreadableBody;
import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.io.IOException;
import java.util.HexFormat;
import java.util.concurrent.ThreadLocalRandom;
import java.util.regex.Pattern;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;

/** Ends requests with a problem, for the servlet, Spring MVC and the server alike. */
public final class Problems {

    /** Media type of every problem. */
    public static final String MEDIA_TYPE = "application/problem+json";

    private static final Logger LOG = LoggerFactory.getLogger(Problems.class);
    private static final String REQUEST_ID_ATTRIBUTE = Problems.class.getName() + ".requestId";
    private static final Pattern REQUEST_ID = Pattern.compile("[A-Za-z0-9._-]{1,64}");

    private Problems() {}

    /** The problem that an exception stands for; an unforeseen one is the service's own fault. */
    public static Problem of(Exception thrown, boolean inBody) {
        if (thrown instanceof Refusal refusal) {
            return Problem.of(refusal.faults(), inBody);
        }
        if (thrown instanceof ProblemException known) {
            return known.problem();
        }
        if (thrown instanceof UnreadableBody unreadable) {
            return Problem.of(ProblemType.UNREADABLE, String.valueOf(unreadable.getMessage()));
        }
        return Problem.of(
                ProblemType.INTERNAL, "The service failed; nothing is wrong with the request as far as it knows.");
    }

    /** Sends a problem, and logs one that is the service's own fault together with what caused it. */
    public static void send(Problem problem, Exception cause, HttpServletRequest request, HttpServletResponse response)
            throws IOException {
        if (problem.type() == ProblemType.INTERNAL) {
            LOG.error(
                    "Request {} failed: {} {}",
                    requestId(request),
                    request.getMethod(),
                    request.getRequestURI(),
                    cause);
        }
        send(problem, request, response);
    }

    /** Sends a problem. */
    public static void send(Problem problem, HttpServletRequest request, HttpServletResponse response)
            throws IOException {
        byte[] body = ProblemRenderer.render(
                problem, String.valueOf(request.getRequestURI()), Controls.compactAsked(request.getQueryString()));
        response.setStatus(problem.status());
        response.setContentType(MEDIA_TYPE);
        response.setHeader("Cache-Control", "no-store");
        response.setHeader("X-Request-Id", requestId(request));
        if (problem.type() == ProblemType.BUSY) {
            response.setHeader("Retry-After", "1");
        }
        response.setContentLength(body.length);
        if (!"HEAD".equals(request.getMethod())) {
            response.getOutputStream().write(body);
        }
    }

    private static String requestId(HttpServletRequest request) {
        if (request.getAttribute(REQUEST_ID_ATTRIBUTE) instanceof String known) {
            return known;
        }
        String given = request.getHeader("X-Request-Id");
        String id = given != null && REQUEST_ID.matcher(given).matches()
                ? given
                : HexFormat.of().toHexDigits(ThreadLocalRandom.current().nextLong());
        request.setAttribute(REQUEST_ID_ATTRIBUTE, id);
        return id;
    }
}
