package freshet.http.binding;

import freshet.answer.Fault;
import java.util.List;
import org.jspecify.annotations.Nullable;

/** Turns the text of one input into its value, in the canonical unit. */
final class ValueReader {

    private ValueReader() {}

    /** The value, or null and a fault. */
    static @Nullable Object read(Shape.Entry entry, String text, List<Fault> faults) {
        if (text.isEmpty()) {
            faults.add(Wording.missing(entry.input(), entry.spelling().name()));
            return null;
        }
        return switch (entry.input().kind()) {
            case NUMBER -> number(entry, text, faults);
            case WHOLE -> whole(entry, text, faults);
            case FLAG -> flag(entry, text, faults);
            case CHOICE -> choice(entry, text, faults);
            case LIST -> list(entry, text, faults);
        };
    }

    private static @Nullable Double number(Shape.Entry entry, String text, List<Fault> faults) {
        double given = NumberText.read(text);
        if (Double.isNaN(given)) {
            faults.add(Wording.unreadable(entry, text));
            return null;
        }
        Input input = entry.input();
        double value = input.settled(entry.spelling(), given);
        if (value < input.minimum() || value > input.maximum()) {
            faults.add(Wording.outOfBounds(entry, text, value < input.minimum()));
            return null;
        }
        return value;
    }

    private static @Nullable Integer whole(Shape.Entry entry, String text, List<Fault> faults) {
        Double value = number(entry, text, faults);
        if (value == null || value == Math.rint(value)) {
            return value == null ? null : value.intValue();
        }
        faults.add(Wording.notWhole(entry, text));
        return null;
    }

    private static @Nullable Boolean flag(Shape.Entry entry, String text, List<Fault> faults) {
        if (text.equals("true") || text.equals("false")) {
            return text.equals("true");
        }
        faults.add(Wording.unreadable(entry, text));
        return null;
    }

    private static @Nullable Object list(Shape.Entry entry, String text, List<Fault> faults) {
        List<Object> values = entry.input().list(text).orElse(null);
        if (values == null) {
            faults.add(Wording.unreadable(entry, text));
        }
        return values;
    }

    private static @Nullable Object choice(Shape.Entry entry, String text, List<Fault> faults) {
        Object value = entry.input().choices().get(text);
        if (value == null) {
            faults.add(Wording.unreadable(entry, text));
        }
        return value;
    }
}
