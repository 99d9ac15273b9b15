package freshet.http.series;

import freshet.answer.Answer;
import freshet.answer.Refusal;
import freshet.http.binding.Rows;
import freshet.http.binding.SeriesControls;
import freshet.http.binding.SeriesControls.Format;
import freshet.http.binding.SeriesRequest;
import freshet.http.binding.Shape;
import freshet.http.media.Negotiation;
import freshet.http.media.RowWriter;
import freshet.http.media.Table;
import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;

/**
 * A calculation for many rows, each answered as it comes; JSON comes whole, so that a body that is broken or too large is
 * one problem.
 *
 * @param <I> the request record
 */
public final class Series<I extends Record> {

    /**
     * What is done with each row.
     *
     * @param <I> the request record
     */
    public interface Step<I extends Record> {

        /**
         * The answer.
         *
         * @param strict whether inputs outside the range that the method's source states are refused
         * @throws Refusal if there is none
         */
        Answer<?> answer(I inputs, boolean strict);
    }

    private static final String OPENAPI = "; rel=\"describedby\", </openapi.yaml>; rel=\"service-desc\"";

    private final Shape<I> inputs;
    private final Table outputs;
    private final Step<I> step;
    private final Set<String> results;
    private final String link;

    /**
     * A series of one calculation.
     *
     * @param path the calculation, for example {@code ammonia/speciation}
     */
    public Series(String path, Shape<I> inputs, Table outputs, Step<I> step) {
        this.inputs = inputs;
        this.outputs = outputs;
        this.step = step;
        results = Set.copyOf(outputs.columnNames(List.of("validity", "notice_codes", "error")));
        link = "</v1/methods?calculation=" + path + ">" + OPENAPI;
    }

    /** Answers a request. */
    public void post(HttpServletRequest request, HttpServletResponse response) throws IOException {
        Format from = Negotiation.body(request, List.of(Format.values()));
        SeriesRequest<I> asked = SeriesRequest.fromQuery(inputs, request.getQueryString());
        SeriesControls controls = asked.controls();
        Format to = Negotiation.format(controls.format(), request.getHeader("Accept"), startingWith(from));
        SeriesOutput out = new SeriesOutput(response);
        Rows<I> rows = asked.rows(from, results, new PromptInput(request.getInputStream(), out));
        response.setContentType(to.mediaType());
        response.setHeader("Cache-Control", "no-store");
        if (!controls.compact()) {
            response.setHeader("Link", link);
        }
        RowWriter writer = RowWriter.of(to, outputs, controls, String.valueOf(request.getRequestURI()));
        new SeriesRun<>(rows, inputs -> step.answer(inputs, controls.strict()), writer, out).run(controls.atomic());
    }

    private static List<Format> startingWith(Format first) {
        List<Format> formats = new ArrayList<>(List.of(Format.values()));
        formats.remove(first);
        formats.add(0, first);
        return formats;
    }
}
