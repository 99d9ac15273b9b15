package freshet.http.binding;

import freshet.answer.Fault;
import freshet.answer.FaultCode;
import java.net.URLDecoder;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;

/** Reads a query string in one pass. */
final class QueryBinder {

    private final Draft<?> controls;
    private final @Nullable Draft<?> inputs;
    private final List<Fault> faults;
    private final List<String> strangers = new ArrayList<>(0);

    /**
     * A reader of one query.
     *
     * @param controls takes the controls
     * @param inputs takes the inputs of the calculation; null where the body holds them
     * @param faults takes the faults
     */
    QueryBinder(Draft<?> controls, @Nullable Draft<?> inputs, List<Fault> faults) {
        this.controls = controls;
        this.inputs = inputs;
        this.faults = faults;
    }

    void read(@Nullable String query) {
        int start = 0;
        int length = query == null ? 0 : query.length();
        while (query != null && start < length) {
            int end = query.indexOf('&', start);
            end = end < 0 ? length : end;
            if (end > start) {
                pair(query, start, end);
            }
            start = end + 1;
        }
    }

    private void pair(String query, int start, int end) {
        int equals = query.indexOf('=', start);
        int nameEnd = equals < 0 || equals > end ? end : equals;
        String name = decoded(query.substring(start, nameEnd));
        String value = nameEnd == end ? "" : decoded(query.substring(nameEnd + 1, end));
        if (!(inputs != null && inputs.take(name, value)) && !controls.take(name, value)) {
            stranger(name);
        }
    }

    private void stranger(String name) {
        if (strangers.contains(name)) {
            return;
        }
        strangers.add(name);
        List<String> known = new ArrayList<>(controls.names());
        if (inputs != null) {
            known.addAll(inputs.names());
        }
        Fault fault = Wording.unknown(name, known);
        faults.add(
                inputs == null && fault.nearest().isEmpty()
                        ? new Fault(
                                fault.field(),
                                FaultCode.UNKNOWN,
                                fault.detail() + " The inputs of a POST stand in its body, the query takes "
                                        + String.join(", ", known) + ".")
                        : fault);
    }

    private static String decoded(String text) {
        if (text.indexOf('%') < 0 && text.indexOf('+') < 0) {
            return text;
        }
        try {
            return URLDecoder.decode(text, StandardCharsets.UTF_8);
        } catch (IllegalArgumentException notEscaped) {
            return text;
        }
    }
}
