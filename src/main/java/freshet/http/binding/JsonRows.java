package freshet.http.binding;

import freshet.answer.Fault;
import freshet.answer.FaultCode;
import freshet.answer.Refusal;
import freshet.http.limits.Sizes;
import freshet.http.media.Bytes;
import freshet.http.problem.ProblemException;
import java.io.IOException;
import java.io.InputStream;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import tools.jackson.core.JacksonException;
import tools.jackson.core.JsonParser;
import tools.jackson.core.JsonToken;
import tools.jackson.core.exc.JacksonIOException;

/**
 * The members of the one array {@code items} of a JSON object. All are read before the first is handed out, so that a body
 * that is broken or too large is one problem.
 */
public final class JsonRows<T extends Record> implements Rows<T> {

    private static final String ITEMS = "items";

    private final Draft<T> constants;
    private final JsonParser parser;
    private final List<Row<T>> items = new ArrayList<>();
    private int row = -1;

    /** One item: its inputs, or what is wrong with them. */
    private record Row<T>(@Nullable T inputs, @Nullable RuntimeException refused, Tag tag) {}

    /**
     * Reads a series.
     *
     * @param constants what all rows have in common
     * @throws Refusal if the object does not hold {@code items} only, or a row shows that no row can be answered
     * @throws UnreadableBody if it is not a JSON object
     * @throws ProblemException if there are too many rows
     */
    JsonRows(Draft<T> constants, InputStream body) throws IOException {
        this.constants = constants;
        List<Fault> faults = constants.faultsOfAllRows(null);
        if (!faults.isEmpty()) {
            throw new Refusal(faults);
        }
        parser = JsonBinder.parser(Sizes.seriesBody(body));
        try {
            start();
            for (JsonToken token = parser.nextToken(); token != JsonToken.END_ARRAY; token = parser.nextToken()) {
                Sizes.checkRows(items.size() + 1);
                items.add(item(token));
            }
            end();
        } catch (JacksonIOException failed) {
            throw failed.getCause();
        } catch (JacksonException malformed) {
            throw UnreadableBody.at(malformed, "body");
        }
    }

    private void start() {
        if (parser.nextToken() != JsonToken.START_OBJECT) {
            throw new UnreadableBody("The body must be one JSON object: {\"items\":[…]}.");
        }
        if (parser.nextToken() != JsonToken.PROPERTY_NAME) {
            throw new Refusal(ITEMS, FaultCode.MISSING, "items is missing: the rows of the series, a JSON array.");
        }
        checkName();
        if (parser.nextToken() != JsonToken.START_ARRAY) {
            throw new UnreadableBody("items must be a JSON array of objects, one for each row.");
        }
    }

    private Row<T> item(JsonToken token) {
        Tag tag = new Tag();
        if (token != JsonToken.START_OBJECT) {
            parser.skipChildren();
            return new Row<>(null, new UnreadableBody("The row is not a JSON object."), tag);
        }
        Draft<T> draft = constants.row();
        JsonBinder.members(parser, "", draft, tag);
        if (draft.repeatsConstant()) {
            throw new Refusal(draft.faults());
        }
        draft.complete();
        return draft.faults().isEmpty()
                ? new Row<>(draft.create(), null, tag)
                : new Row<>(null, new Refusal(draft.faults()), tag);
    }

    private void end() {
        JsonToken token = parser.nextToken();
        if (token == JsonToken.PROPERTY_NAME) {
            checkName();
            throw new Refusal(List.of(Wording.repeated(ITEMS)));
        }
        if (token != JsonToken.END_OBJECT || parser.nextToken() != null) {
            throw new UnreadableBody("The body must end after one JSON object.");
        }
    }

    private void checkName() {
        String name = parser.currentName();
        if (!name.equals(ITEMS)) {
            throw new Refusal(List.of(Wording.unknown(name, List.of(ITEMS))));
        }
    }

    @Override
    public List<String> carried() {
        return List.of(Tag.NAME);
    }

    @Override
    public boolean next() {
        return ++row < items.size();
    }

    @Override
    public T inputs() {
        RuntimeException refused = items.get(row).refused();
        if (refused != null) {
            throw refused;
        }
        return Objects.requireNonNull(items.get(row).inputs());
    }

    @Override
    public void carryCell(int column, char separator, Bytes out) {
        items.get(row).tag().asCell(separator, out);
    }

    @Override
    public boolean carryText(int column, Bytes out) {
        return items.get(row).tag().asText(out);
    }

    @Override
    public @Nullable String pointer() {
        return "/items/" + row;
    }
}
