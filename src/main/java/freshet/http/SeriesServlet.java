package freshet.http;

import freshet.http.limits.Admission;
import freshet.http.series.Series;
import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.io.IOException;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/** Answers the series of every calculation; has places of its own, so that long ones do not keep short requests out. */
final class SeriesServlet extends ProblemServlet {

    private static final long serialVersionUID = 1L;

    private final transient Map<String, Series<?>> series;

    /** A servlet for the series by their addresses. */
    SeriesServlet(Map<String, Series<?>> series, Admission admission, RequestTimers timers) {
        super(admission, timers);
        this.series = series;
    }

    @Override
    void answer(HttpServletRequest request, HttpServletResponse response) throws IOException {
        Series<?> asked = series.get(request.getServletPath());
        if (asked == null) {
            throw nothingHere();
        }
        if (!"POST".equals(request.getMethod())) {
            throw methodNotAllowed("A series is asked by POST of JSON, CSV or NDJSON.");
        }
        asked.post(request, response);
    }

    @Override
    String allowed(HttpServletRequest request) {
        return "POST, OPTIONS";
    }

    @Override
    @Nullable
    String holder(HttpServletRequest request) {
        return null;
    }
}
