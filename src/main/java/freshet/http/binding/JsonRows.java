package freshet.http.binding;

import freshet.answer.Fault;
import freshet.answer.FaultCode;
import freshet.answer.Refusal;
import freshet.http.limits.Sizes;
import freshet.http.media.Bytes;
import java.io.IOException;
import java.io.InputStream;
import java.util.List;
import org.jspecify.annotations.Nullable;
import tools.jackson.core.JacksonException;
import tools.jackson.core.JsonParser;
import tools.jackson.core.JsonToken;
import tools.jackson.core.exc.JacksonIOException;

/** The members of the one array {@code items} of a JSON object. */
public final class JsonRows<T extends Record> implements Rows<T> {

    private static final String ITEMS = "items";

    private final Draft<T> constants;
    private final JsonParser parser;
    private final Tag tag = new Tag();
    private int row = -1;
    private Draft<T> draft;
    private boolean object;

    /**
     * Starts to read a series.
     *
     * @param constants what all rows have in common
     * @throws Refusal if the object does not hold {@code items} only
     * @throws UnreadableBody if it is not a JSON object
     */
    JsonRows(Draft<T> constants, InputStream body) throws IOException {
        this.constants = constants;
        draft = constants;
        List<Fault> faults = constants.faultsOfAllRows(null);
        if (!faults.isEmpty()) {
            throw new Refusal(faults);
        }
        parser = JsonBinder.parser(Sizes.seriesBody(body));
        if (token() != JsonToken.START_OBJECT) {
            throw new UnreadableBody("The body must be one JSON object: {\"items\":[…]}.");
        }
        if (token() != JsonToken.PROPERTY_NAME) {
            throw new Refusal(ITEMS, FaultCode.MISSING, "items is missing: the rows of the series, a JSON array.");
        }
        checkName();
        if (token() != JsonToken.START_ARRAY) {
            throw new UnreadableBody("items must be a JSON array of objects, one for each row.");
        }
    }

    @Override
    public List<String> carried() {
        return List.of(Tag.NAME);
    }

    @Override
    public boolean next() throws IOException {
        JsonToken token = token();
        if (token == JsonToken.END_ARRAY) {
            end();
            return false;
        }
        Sizes.checkRows(++row + 1);
        draft = constants.row();
        tag.clear();
        object = token == JsonToken.START_OBJECT;
        try {
            if (object) {
                JsonBinder.members(parser, "", draft, tag);
            } else {
                parser.skipChildren();
            }
        } catch (JacksonException malformed) {
            throw broken(malformed);
        }
        if (draft.repeatsConstant()) {
            throw new Refusal(draft.faults());
        }
        return true;
    }

    @Override
    public T inputs() {
        if (!object) {
            throw new UnreadableBody("The row is not a JSON object.");
        }
        return draft.finish();
    }

    private void end() throws IOException {
        JsonToken token = token();
        if (token == JsonToken.PROPERTY_NAME) {
            checkName();
            throw new Refusal(List.of(Wording.repeated(ITEMS)));
        }
        if (token != JsonToken.END_OBJECT || token() != null) {
            throw new UnreadableBody("The body must end after one JSON object.");
        }
    }

    private void checkName() {
        String name = parser.currentName();
        if (!name.equals(ITEMS)) {
            throw new Refusal(List.of(Wording.unknown(name, List.of(ITEMS))));
        }
    }

    private @Nullable JsonToken token() throws IOException {
        try {
            return parser.nextToken();
        } catch (JacksonException malformed) {
            throw broken(malformed);
        }
    }

    private static RuntimeException broken(JacksonException malformed) throws IOException {
        if (malformed instanceof JacksonIOException failed) {
            throw failed.getCause();
        }
        return UnreadableBody.at(malformed, "body");
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
    public @Nullable String pointer() {
        return "/items/" + row;
    }
}
