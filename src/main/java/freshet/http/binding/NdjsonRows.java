package freshet.http.binding;

import freshet.answer.Fault;
import freshet.answer.Refusal;
import freshet.http.limits.Sizes;
import freshet.http.media.Bytes;
import java.io.IOException;
import java.io.InputStream;
import java.util.List;
import org.jspecify.annotations.Nullable;
import tools.jackson.core.JsonParser;

/** JSON objects, one on each line. */
public final class NdjsonRows<T extends Record> implements Rows<T> {

    private final Draft<T> constants;
    private final Lines lines;
    private @Nullable JsonParser parser;
    private final Tag tag = new Tag();
    private Draft<T> draft;
    private boolean first = true;
    private @Nullable RuntimeException unreadable;

    /**
     * Starts to read a series.
     *
     * @param constants what all rows have in common
     * @throws Refusal if they contradict each other
     */
    NdjsonRows(Draft<T> constants, InputStream body) {
        this.constants = constants;
        draft = constants;
        List<Fault> faults = constants.faultsOfAllRows(null);
        if (!faults.isEmpty()) {
            throw new Refusal(faults);
        }
        lines = new Lines(body);
    }

    @Override
    public List<String> carried() {
        return List.of(Tag.NAME);
    }

    @Override
    public boolean next() throws IOException {
        if (!lines.next()) {
            return false;
        }
        draft = constants.row();
        tag.clear();
        unreadable = lines.tooLong() ? Sizes.rowTooLong(LONGEST_ROW) : read();
        if (first && draft.repeatsConstant()) {
            throw new Refusal(draft.faults());
        }
        first = false;
        return true;
    }

    /** One parser reads line after line, since a new one costs as much as a row; after a fault another takes its place. */
    private @Nullable RuntimeException read() {
        JsonParser current = parser == null ? JsonBinder.parser(lines.asInput()) : parser;
        parser = null;
        try {
            JsonBinder.line(current, draft, tag);
            parser = current;
            return lines.restIsBlank(current) ? null : JsonBinder.notOneObject(tag);
        } catch (UnreadableBody malformed) {
            return malformed;
        }
    }

    @Override
    public T inputs() {
        if (unreadable != null) {
            throw unreadable;
        }
        return draft.finish();
    }

    @Override
    public void carryCell(int column, char separator, Bytes out) {
        tag.asCell(separator, out);
    }

    @Override
    public boolean carryText(int column, Bytes out) {
        return tag.asText(out);
    }

    @Override
    public String pointer() {
        return "";
    }
}
