package freshet.http;

import freshet.answer.Answer;
import freshet.http.binding.Controls;
import freshet.http.binding.Controls.Format;
import freshet.http.binding.Request;
import freshet.http.caching.EntityTag;
import freshet.http.limits.Sizes;
import freshet.http.media.AnswerWriter;
import freshet.http.media.Bytes;
import freshet.http.media.Negotiation;
import freshet.method.Method;
import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.io.IOException;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.function.Function;

/** One calculation as HTTP reaches it: GET with a query, POST with a JSON object. */
final class Endpoint<I extends Record, O extends Record> {

    private static final String OPENAPI_LINK = "</openapi.yaml>; rel=\"service-desc\"";

    private final Calculation<I, O> calculation;
    private final List<Format> formats;
    private final Map<Format, AnswerWriter> writers = new EnumMap<>(Format.class);
    private final long tagSeed;

    Endpoint(Calculation<I, O> calculation, String release) {
        this.calculation = calculation;
        formats = calculation.formats();
        formats.stream()
                .filter(format -> !calculation.forms().containsKey(format))
                .forEach(format -> writers.put(format, AnswerWriter.of(format, calculation.outputs())));
        tagSeed = EntityTag.seed(calculation.path(), calculation.methods(), release);
    }

    /** Whether a query can hold the inputs. */
    boolean takesQuery() {
        return calculation.inputs().flat();
    }

    /** Whether a body is taken. */
    boolean takesBody() {
        return !calculation.readOnly();
    }

    void get(HttpServletRequest request, HttpServletResponse response) throws IOException {
        Request<I> read = Request.fromQuery(calculation.inputs(), request.getQueryString());
        Format format = format(read.controls(), request);
        String tag = EntityTag.of(
                tagSeed, read.fingerprint(), format, read.controls().compact());
        String known = request.getHeader("If-None-Match");
        boolean unchanged = known != null && !read.controls().strict() && EntityTag.matches(known, tag);
        Bytes body = unchanged ? new Bytes(0) : compute(read, format, response);
        response.setHeader("ETag", tag);
        response.setHeader("Cache-Control", "public, max-age=300");
        response.setHeader("Vary", "Accept");
        if (unchanged) {
            response.setStatus(HttpServletResponse.SC_NOT_MODIFIED);
        } else {
            send(body, format, request, response);
        }
    }

    void post(HttpServletRequest request, HttpServletResponse response) throws IOException {
        Negotiation.body(request, List.of(Format.JSON));
        Request<I> read = Request.fromJson(calculation.inputs(), Sizes.body(request), request.getQueryString());
        Format format = format(read.controls(), request);
        Bytes body = compute(read, format, response);
        response.setHeader("Cache-Control", "no-store");
        send(body, format, request, response);
    }

    private Format format(Controls controls, HttpServletRequest request) {
        return Negotiation.format(controls.format(), request.getHeader("Accept"), formats);
    }

    private Bytes compute(Request<I> read, Format format, HttpServletResponse response) {
        boolean compact = read.controls().compact();
        Answer<O> answer = calculation.answer(read.inputs(), read.controls().strict());
        Function<Answer<O>, Bytes> own = calculation.forms().get(format);
        Bytes body = own != null
                ? own.apply(answer)
                : Objects.requireNonNull(writers.get(format)).write(answer, compact);
        return link(answer.method(), compact, response, body);
    }

    private static Bytes link(Method method, boolean compact, HttpServletResponse response, Bytes body) {
        if (!compact) {
            response.setHeader("Link", "</v1/methods/" + method.id() + ">; rel=\"describedby\", " + OPENAPI_LINK);
        }
        return body;
    }

    private static void send(Bytes body, Format format, HttpServletRequest request, HttpServletResponse response)
            throws IOException {
        response.setContentType(format.mediaType());
        response.setContentLength(body.length());
        if (!"HEAD".equals(request.getMethod())) {
            response.getOutputStream().write(body.array(), 0, body.length());
        }
    }
}
