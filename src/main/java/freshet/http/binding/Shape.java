package freshet.http.binding;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import tools.jackson.core.sym.PropertyNameMatcher;

/**
 * What a request record declares, read once: its inputs, the names they may be given by, and the rules between them.
 *
 * @param <T> the request record
 */
public final class Shape<T extends Record> {

    /** A name and the input it gives. */
    record Entry(Input input, Spelling spelling) {}

    private final RecordMaker<T> maker;
    private final List<Input> inputs;
    private final Map<String, Entry> entries = new LinkedHashMap<>();
    private final List<Rule> rules;
    private final Map<String, String> groups;
    private final @Nullable Object[] defaults;
    private final Input[] required;
    private final Entry[] matched;
    private final PropertyNameMatcher matcher;

    private Shape(Class<T> type) {
        ShapeReader reader = new ShapeReader();
        maker = reader.read(type);
        inputs = List.copyOf(reader.inputs());
        rules = List.copyOf(reader.rules());
        groups = Collections.unmodifiableMap(reader.groups());
        inputs.forEach(input -> input.spellings().forEach(spelling -> {
            if (entries.put(spelling.name(), new Entry(input, spelling)) != null) {
                throw new IllegalStateException("Two inputs are called " + spelling.name());
            }
        }));
        rules.forEach(rule -> rule.names().forEach(this::input));
        defaults = inputs.stream().map(Input::defaultValue).toArray();
        required = inputs.stream().filter(Input::required).toArray(Input[]::new);
        matched = entries.values().toArray(Entry[]::new);
        matcher = JsonBinder.matcher(entries.keySet());
    }

    /**
     * Reads a request record.
     *
     * @throws IllegalStateException if it bears an annotation that is not understood
     */
    public static <T extends Record> Shape<T> of(Class<T> type) {
        return new Shape<>(type);
    }

    /** The inputs in the order in which the record declares them. */
    public List<Input> inputs() {
        return inputs;
    }

    /** The rules between the inputs. */
    public List<Rule> rules() {
        return rules;
    }

    /** What each group of inputs is, by its name; the inputs in it have names that begin with that name and a point. */
    public Map<String, String> groups() {
        return groups;
    }

    /** Whether no input stands in a group, so that a query or a row can hold them all. */
    public boolean flat() {
        return groups.isEmpty();
    }

    /** All names by which an input may be given. */
    public Set<String> names() {
        return entries.keySet();
    }

    /** The input with this canonical name. */
    public Input input(String name) {
        Entry entry = entries.get(name);
        if (entry == null) {
            throw new IllegalStateException("No input is called " + name);
        }
        return entry.input();
    }

    @Nullable
    Entry entry(String name) {
        return entries.get(name);
    }

    /** Finds names in JSON as they are read, without making text of them: gives what {@link #matched} takes. */
    PropertyNameMatcher matcher() {
        return matcher;
    }

    Entry matched(int match) {
        return matched[match];
    }

    /** The values when nothing is given, a new array each time. */
    @Nullable
    Object[] defaults() {
        return defaults.clone();
    }

    /** The inputs without which there is no answer, never to be changed. */
    Input[] required() {
        return required;
    }

    T create(@Nullable Object[] values) {
        return maker.create(values);
    }
}
