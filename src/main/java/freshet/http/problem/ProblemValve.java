package freshet.http.problem;

import java.io.IOException;
import org.apache.catalina.connector.Request;
import org.apache.catalina.connector.Response;
import org.apache.catalina.valves.ErrorReportValve;
import org.apache.tomcat.util.res.StringManager;
import org.jspecify.annotations.Nullable;

/** The server's own refusals (a request line it cannot parse, header fields that are too large) as problems. */
public class ProblemValve extends ErrorReportValve {

    private static final String TOO_LARGE =
            StringManager.getManager("org.apache.coyote.http11").getString("iib.requestheadertoolarge.error");

    @Override
    protected void report(Request request, Response response, @Nullable Throwable thrown) {
        int status = response.getStatus();
        if (status < 400 || response.getContentWritten() > 0 || !response.setErrorReported()) {
            return;
        }
        try {
            boolean tooLarge = thrown != null && TOO_LARGE.equals(thrown.getMessage());
            Problems.send(problem(status, tooLarge, request.getRequestURI() == null), request, response);
            response.finishResponse();
        } catch (IOException | IllegalStateException gone) {
            container.getLogger().debug("A problem could not be sent", gone);
        }
    }

    private static Problem problem(int status, boolean tooLarge, boolean inAddress) {
        if (tooLarge) {
            return Problem.of(ProblemType.TOO_LARGE, inAddress ? 414 : 431, ProblemType.TOO_LARGE.explanation());
        }
        return Problem.ofStatus(status);
    }
}
