package freshet.http;

import freshet.answer.Answer;
import freshet.http.binding.Controls.Format;
import freshet.http.binding.Shape;
import freshet.http.media.Bytes;
import freshet.http.media.Negotiation;
import freshet.http.media.Table;
import freshet.method.Method;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.function.Function;

/**
 * A calculation as its topic declares it: a pure function from a request record to a response record. Everything
 * else, from the query parameters to the OpenAPI document, follows from this value.
 *
 * @param <I> the request record
 * @param <O> the response record
 * @param path topic and calculation, for example {@code ammonia/speciation}
 * @param summary one line
 * @param cautions what the reader must know before acting on an answer
 * @param inputs what the request record declares
 * @param outputs what the response record declares
 * @param responseType the response record
 * @param function the calculation; throws {@link freshet.answer.Refusal} where it cannot answer
 * @param methods every method an answer may rest on
 * @param example a query that shows the main use
 * @param forms media that the calculation writes itself
 * @param readOnly whether it is asked by GET only
 */
public record Calculation<I extends Record, O extends Record>(
        String path,
        String summary,
        String cautions,
        Shape<I> inputs,
        Table outputs,
        Class<O> responseType,
        Function<I, Answer<O>> function,
        List<Method> methods,
        String example,
        Map<Format, Function<Answer<O>, Bytes>> forms,
        boolean readOnly) {

    /** Copies the list of methods. */
    public Calculation {
        methods = List.copyOf(methods);
        forms = Map.copyOf(forms);
    }

    /** Starts a declaration. */
    public static <I extends Record, O extends Record> Calculation<I, O> of(
            String path, Class<I> requestType, Class<O> responseType, Function<I, Answer<O>> function) {
        return new Calculation<>(
                path,
                "",
                "",
                Shape.of(requestType),
                Table.of(responseType),
                responseType,
                function,
                List.of(),
                "",
                Map.of(),
                false);
    }

    /** The same with the texts that documents show. */
    public Calculation<I, O> describedAs(String oneLine, String caution) {
        return new Calculation<>(
                path, oneLine, caution, inputs, outputs, responseType, function, methods, example, forms, readOnly);
    }

    /** The same with the methods that an answer may rest on. */
    public Calculation<I, O> using(List<Method> used) {
        return new Calculation<>(
                path, summary, cautions, inputs, outputs, responseType, function, used, example, forms, readOnly);
    }

    /** The same, asked by GET only and written by itself in some media. */
    public Calculation<I, O> readOnly(Map<Format, Function<Answer<O>, Bytes>> own) {
        return new Calculation<>(
                path, summary, cautions, inputs, outputs, responseType, function, methods, example, own, true);
    }

    /** The media that an answer can be given in, the preferred one first. */
    public List<Format> formats() {
        List<Format> formats = new ArrayList<>(Negotiation.formats(outputs));
        forms.keySet().stream().filter(form -> !formats.contains(form)).forEach(formats::add);
        return formats;
    }

    /** The same with a query that shows the main use. */
    public Calculation<I, O> shownBy(String query) {
        return new Calculation<>(
                path, summary, cautions, inputs, outputs, responseType, function, methods, query, forms, readOnly);
    }

    /**
     * Computes.
     *
     * @param strict whether inputs outside the range that the method's source states are refused
     * @throws freshet.answer.Refusal where there is no answer
     */
    Answer<O> answer(I request, boolean strict) {
        return StatedRange.check(function.apply(request), strict);
    }

    /** Whether it answers rows of a series too. */
    public boolean hasSeries() {
        return inputs.flat() && outputs.flat();
    }

    /** The address. */
    public String address() {
        return "/v1/" + path;
    }

    /** The address of its series, if it has one. */
    public String seriesAddress() {
        return address() + "/series";
    }

    /** What it computes, as a name: {@code AmmoniaSpeciation}. */
    public String noun() {
        String type = responseType.getSimpleName();
        return type.substring(0, type.length() - "Response".length());
    }
}
