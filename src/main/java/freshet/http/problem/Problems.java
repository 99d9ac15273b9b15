package freshet.http.problem;

import freshet.answer.Refusal;
import freshet.http.binding.Controls;
import freshet.http.binding.UnreadableBody;
import jakarta.servlet.RequestDispatcher;
import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.io.IOException;
import java.util.HexFormat;
import java.util.Objects;
import java.util.Optional;
import java.util.concurrent.ThreadLocalRandom;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;

/** Ends requests with a problem, for the servlet, Spring MVC and the server alike. */
public final class Problems {

    /** Media type of every problem. */
    public static final String MEDIA_TYPE = "application/problem+json";

    private static final Logger LOG = LoggerFactory.getLogger(Problems.class);
    private static final String REQUEST_ID_ATTRIBUTE = Problems.class.getName() + ".requestId";
    private static final Pattern REQUEST_ID = Pattern.compile("([A-Za-z0-9._-]{1,64})");
    /** W3C Trace Context: the trace id finds the request in the caller's own traces. */
    private static final Pattern TRACE_PARENT = Pattern.compile("[0-9a-f]{2}-([0-9a-f]{32})-[0-9a-f]{16}-[0-9a-f]{2}");

    private Problems() {}

    /**
     * The problem that an exception stands for; an unforeseen one is the service's own fault.
     *
     * @param holder JSON pointer of the object that holds the inputs; null if they are not in a JSON body
     */
    public static Problem of(Exception thrown, @Nullable String holder) {
        if (thrown instanceof Refusal refusal) {
            return Problem.of(refusal.faults(), holder);
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

    /** The path the caller asked for, also where the server has since turned to its error page. */
    private static String path(HttpServletRequest request) {
        Object asked = request.getAttribute(RequestDispatcher.ERROR_REQUEST_URI);
        return asked != null ? asked.toString() : Objects.requireNonNullElse(request.getRequestURI(), "/");
    }

    private static String requestId(HttpServletRequest request) {
        if (request.getAttribute(REQUEST_ID_ATTRIBUTE) instanceof String known) {
            return known;
        }
        String id = matched(REQUEST_ID, request.getHeader("X-Request-Id"))
                .or(() -> matched(TRACE_PARENT, request.getHeader("traceparent")))
                .orElseGet(() ->
                        HexFormat.of().toHexDigits(ThreadLocalRandom.current().nextLong()));
        request.setAttribute(REQUEST_ID_ATTRIBUTE, id);
        return id;
    }

    private static Optional<String> matched(Pattern pattern, @Nullable String header) {
        Matcher matcher = pattern.matcher(String.valueOf(header));
        return header != null && matcher.matches() ? Optional.of(matcher.group(1)) : Optional.empty();
    }
}
