package freshet.http.binding;

import freshet.answer.Fault;
import freshet.answer.Refusal;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.function.Predicate;
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
    private final @Nullable String[] constants;
    private final List<Fault> faults;
    private boolean repeatsConstant;

    Draft(Shape<T> shape, List<Fault> faults) {
        this.shape = shape;
        this.faults = faults;
        values = shape.defaults();
        givenBy = new @Nullable String[values.length];
        constants = new @Nullable String[values.length];
    }

    private Draft(Draft<T> constants, List<Fault> faults) {
        this.shape = constants.shape;
        this.faults = faults;
        this.values = constants.values.clone();
        this.givenBy = constants.givenBy.clone();
        this.constants = constants.givenBy;
    }

    /** A row of a series for whose rows this holds the constants. */
    Draft<T> row() {
        return new Draft<>(this, new ArrayList<>(0));
    }

    /** What is wrong so far. */
    List<Fault> faults() {
        return faults;
    }

    /** Whether a value was given that all rows have already. */
    boolean repeatsConstant() {
        return repeatsConstant;
    }

    Shape<T> shape() {
        return shape;
    }

    Shape.@Nullable Entry entry(String name) {
        return shape.entry(name);
    }

    boolean isGroup(String name) {
        return shape.groups().containsKey(name);
    }

    /** All names, those of the groups too. */
    Set<String> names() {
        if (shape.flat()) {
            return shape.names();
        }
        Set<String> names = new LinkedHashSet<>(shape.groups().keySet());
        names.addAll(shape.names());
        return names;
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

    /** The name by which an input was given; null if it was not. */
    @Nullable
    String givenBy(Input input) {
        return givenBy[input.index()];
    }

    /**
     * What is wrong with every row that has these values.
     *
     * @param columns the inputs that the rows may give besides; null if each row may give any
     */
    List<Fault> faultsOfAllRows(@Nullable Set<Input> columns) {
        List<Fault> found = new ArrayList<>();
        Predicate<String> possible = name -> isGiven(name) || columns == null || columns.contains(shape.input(name));
        for (Input input : shape.inputs()) {
            if (input.required() && !possible.test(input.name())) {
                found.add(Wording.missing(input, input.name()));
            }
        }
        for (Rule rule : shape.rules()) {
            rule.brokenWhateverElse(this::isGiven, possible).ifPresent(found::add);
        }
        return found;
    }

    /** Takes a number that is spelled plainly and within bounds, which most are; false if this is none, and nothing taken. */
    boolean plain(Shape.Entry entry, char[] text, int offset, int length) {
        Input input = entry.input();
        if (input.kind() != Input.Kind.NUMBER) {
            return false;
        }
        double value = entry.spelling().canonical(NumberText.plain(text, offset, length));
        if (!(value >= input.minimum() && value <= input.maximum())) {
            return false;
        }
        if (claim(entry)) {
            values[input.index()] = value;
        }
        return true;
    }

    /** Takes a cell of a table; an empty one leaves out an input that may be left out and has no default. */
    void cell(Shape.Entry entry, String text) {
        if (!text.isEmpty()) {
            text(entry, text);
        } else if (entry.input().defaultText().isPresent()) {
            nothing(entry);
        }
    }

    /** Takes a cell whose number has a point where a comma is due. */
    void decimalPoint(Shape.Entry entry, String text) {
        if (claim(entry)) {
            faults.add(Wording.decimalPoint(entry.spelling().name(), text));
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
        for (Input input : shape.required()) {
            if (givenBy[input.index()] == null) {
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

    /**
     * The request record.
     *
     * @throws Refusal with every fault
     */
    T finish() {
        complete();
        if (!faults.isEmpty()) {
            throw new Refusal(faults);
        }
        return create();
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
        int index = entry.input().index();
        String name = entry.spelling().name();
        String earlier = givenBy[index];
        if (earlier == null) {
            givenBy[index] = name;
            return true;
        }
        boolean constant = constants[index] != null;
        repeatsConstant |= constant;
        faults.add(
                !earlier.equals(name)
                        ? Wording.givenTwice(entry)
                        : constant ? Wording.repeatsConstant(name) : Wording.repeated(name));
        return false;
    }
}
