package freshet.http.binding;

import freshet.answer.Fault;
import freshet.answer.FaultCode;
import freshet.http.binding.Input.Kind;
import java.util.List;
import java.util.Locale;
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
        if (!claim(entry)) {
            return;
        }
        if (text.isEmpty()) {
            faults.add(Wording.missing(entry.input(), entry.spelling().name()));
        } else if (entry.input().numeric()) {
            number(entry, text);
        } else if (entry.input().kind() == Kind.FLAG) {
            flag(entry, text);
        } else {
            choice(entry, text);
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
            faults.add(
                    switch (entry.input().kind()) {
                        case NUMBER, WHOLE -> Wording.notNumber(entry.spelling().name(), text);
                        case FLAG -> Wording.notBoolean(entry.spelling().name(), text);
                        case CHOICE ->
                            Wording.notAllowed(
                                    entry.spelling().name(), text, entry.input().allowed());
                    });
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
        faults.add(
                earlier.equals(name)
                        ? Wording.repeated(name)
                        : new Fault(
                                name,
                                FaultCode.CONFLICT,
                                "Give only one of " + entry.input().anyName() + ", even if they agree."));
        return false;
    }

    private void number(Shape.Entry entry, String text) {
        Input input = entry.input();
        if (!NumberText.isNumber(text)) {
            faults.add(Wording.notNumber(entry.spelling().name(), text));
            return;
        }
        double given = Double.parseDouble(text);
        double value = entry.spelling().canonical(given);
        if (value < input.minimum() || value > input.maximum()) {
            faults.add(Wording.outOfBounds(entry, text, value < input.minimum()));
        } else if (input.kind() == Kind.WHOLE) {
            whole(entry, text, value);
        } else {
            values[input.index()] = value;
        }
    }

    private void whole(Shape.Entry entry, String text, double value) {
        if (value == Math.rint(value)) {
            values[entry.input().index()] = (int) value;
        } else {
            faults.add(new Fault(
                    entry.spelling().name(),
                    FaultCode.NOT_ALLOWED,
                    entry.spelling().name() + " is " + text + "; it must be a whole number."));
        }
    }

    private void flag(Shape.Entry entry, String text) {
        if (text.equals("true") || text.equals("false")) {
            values[entry.input().index()] = text.equals("true");
        } else {
            faults.add(Wording.notBoolean(entry.spelling().name(), text));
        }
    }

    private void choice(Shape.Entry entry, String text) {
        Object value = entry.input().choices().get(text);
        if (value == null) {
            faults.add(Wording.notAllowed(
                    entry.spelling().name(),
                    text.toLowerCase(Locale.ROOT),
                    entry.input().allowed()));
        } else {
            values[entry.input().index()] = value;
        }
    }
}
