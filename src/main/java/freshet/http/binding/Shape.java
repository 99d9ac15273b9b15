package freshet.http.binding;

import freshet.quantity.AtMostOneOf;
import freshet.quantity.ExactlyOneOf;
import freshet.quantity.Flat;
import freshet.quantity.Together;
import java.lang.invoke.MethodHandle;
import java.lang.reflect.RecordComponent;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.jspecify.annotations.Nullable;

/**
 * What a request record declares, read once: its inputs, the names they may be given by, and the rules between them.
 *
 * @param <T> the request record
 */
public final class Shape<T extends Record> {

    /** A name and the input it gives. */
    record Entry(Input input, Spelling spelling) {}

    private final RecordMaker<T> maker;
    private final List<Input> inputs = new ArrayList<>();
    private final Map<String, Entry> entries = new LinkedHashMap<>();
    private final List<Rule> rules;
    private final @Nullable Object[] defaults;
    private final Input[] required;

    private Shape(Class<T> type) {
        List<Rule> found = new ArrayList<>();
        maker = read(type, found);
        rules = List.copyOf(found);
        inputs.forEach(input -> input.spellings().forEach(spelling -> {
            if (entries.put(spelling.name(), new Entry(input, spelling)) != null) {
                throw new IllegalStateException("Two inputs are called " + spelling.name());
            }
        }));
        rules.forEach(rule -> rule.names().forEach(this::input));
        defaults = inputs.stream().map(Input::defaultValue).toArray();
        required = inputs.stream().filter(Input::required).toArray(Input[]::new);
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
        return Collections.unmodifiableList(inputs);
    }

    /** The rules between the inputs. */
    public List<Rule> rules() {
        return rules;
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

    private <R extends Record> RecordMaker<R> read(Class<R> type, List<Rule> found) {
        Arrays.stream(type.getAnnotationsByType(ExactlyOneOf.class))
                .forEach(group -> found.add(new Rule(Rule.Kind.EXACTLY_ONE, List.of(group.value()), group.beside())));
        Arrays.stream(type.getAnnotationsByType(AtMostOneOf.class))
                .forEach(group -> found.add(new Rule(Rule.Kind.AT_MOST_ONE, List.of(group.value()))));
        Arrays.stream(type.getAnnotationsByType(Together.class))
                .forEach(pair -> found.add(new Rule(Rule.Kind.TOGETHER, List.of(pair.given(), pair.needs()))));
        List<MethodHandle> parts = new ArrayList<>();
        for (RecordComponent component : type.getRecordComponents()) {
            parts.add(component.isAnnotationPresent(Flat.class) ? nested(component, found) : leaf(component));
        }
        return new RecordMaker<>(type, parts);
    }

    private MethodHandle nested(RecordComponent component, List<Rule> found) {
        return read(component.getType().asSubclass(Record.class), found).handle();
    }

    private MethodHandle leaf(RecordComponent component) {
        int index = inputs.size();
        inputs.add(InputReader.read(component, index));
        return RecordMaker.value(index);
    }
}
