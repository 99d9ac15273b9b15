package freshet.http.binding;

import freshet.answer.Fault;
import java.util.List;
import java.util.Set;
import org.jspecify.annotations.Nullable;

/**
 * A request in the making: takes the values as they are read, in any order, and collects what is wrong with them.
 *
 * @param <T> the request record
 */
final class Draft<T extends Record> {

    private final Shape<T> shape;
    private final @Nullable Object[] values;
    private final @Nullable String[] givenBy;
    private final List<Fault> faults;

    Draft(Shape<T> shape, List<Fault> faults) {
        this.shape = shape;
        this.faults = faults;
        values = shape.defaults();
        givenBy = new @Nullable String[values.length];
    }

    Shape.@Nullable Entry entry(String name) {
        return shape.entry(name);
    }

    Set<String> names() {
        return shape.names();
    }

    /** Takes a value as text if there is an input of that name; tells whether there is. */
    boolean take(String name, String text) {
        Shape.Entry entry = shape.entry(name);
        if (entry != null) {
            text(entry, text);
        }
        return entry != null;
    }

    /** Takes a value as text, the way a query string or a table holds it. */
    void text(Shape.Entry entry, String text) {
        if (claim(entry)) {
            values[entry.input().index()] = ValueReader.read(entry, text, faults);
        }
    }

    /** Takes a value that is not there although its name is. */
    void nothing(Shape.Entry entry) {
        if (claim(entry)) {
            faults.add(Wording.missing(entry.input(), entry.spelling().name()));
        }
    }

    /** Takes a value that is of another kind than the input, for example an object. */
    void misfit(Shape.Entry entry, String text) {
        if (claim(entry)) {
            faults.add(Wording.unreadable(entry, text));
        }
    }

    /** Notes what is missing and which rules are broken. */
    void complete() {
        for (Input input : shape.inputs()) {
            if (input.required() && givenBy[input.index()] == null) {
                faults.add(Wording.missing(input, input.name()));
            }
        }
        for (Rule rule : shape.rules()) {
            rule.broken(this::isGiven).ifPresent(faults::add);
        }
    }

    /** The request record; only when there is no fault. */
    T create() {
        return shape.create(values);
    }

    /** A number that differs between requests that differ; the same on every machine. */
    long fingerprint() {
        long hash = 0;
        for (Object value : values) {
            long bits = value instanceof Double number
                    ? Double.doubleToLongBits(number + 0.0)
                    : String.valueOf(value).hashCode();
            hash = (hash ^ bits) * 0x9E3779B97F4A7C15L;
            hash ^= hash >>> 29;
        }
        return hash;
    }

    private boolean isGiven(String name) {
        return givenBy[shape.input(name).index()] != null;
    }

    private boolean claim(Shape.Entry entry) {
        String name = entry.spelling().name();
        String earlier = givenBy[entry.input().index()];
        if (earlier == null) {
            givenBy[entry.input().index()] = name;
            return true;
        }
        faults.add(earlier.equals(name) ? Wording.repeated(name) : Wording.givenTwice(entry));
        return false;
    }
}
