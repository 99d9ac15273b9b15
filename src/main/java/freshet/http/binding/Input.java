package freshet.http.binding;

import freshet.quantity.Unit;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;

/**
 * One input of a calculation, as its request record declares it.
 *
 * @param index its place among the inputs of the request
 * @param kind what kind of value it takes
 * @param meaning what it is
 * @param example a typical value
 * @param minimum least value in the canonical unit
 * @param maximum greatest value in the canonical unit
 * @param required whether it must be given
 * @param defaultText the value when it is not given
 * @param spellings the names it may be given by, the canonical one first
 * @param choices the enumerated values by name; empty unless the kind is a choice
 */
public record Input(
        int index,
        Kind kind,
        String meaning,
        String example,
        double minimum,
        double maximum,
        boolean required,
        Optional<String> defaultText,
        List<Spelling> spellings,
        Map<String, Object> choices) {

    private static final double ROUNDING = 5e-6;

    /** The kinds of values. */
    public enum Kind {
        /** A number. */
        NUMBER,
        /** A whole number. */
        WHOLE,
        /** True or false. */
        FLAG,
        /** One of an enumeration. */
        CHOICE,
        /** Some of an enumeration, with commas between. */
        LIST
    }

    /** The canonical name. */
    public String name() {
        return spellings.get(0).name();
    }

    /** The canonical unit. */
    public Unit unit() {
        return spellings.get(0).unit();
    }

    /** Whether it takes a number. */
    public boolean numeric() {
        return kind == Kind.NUMBER || kind == Kind.WHOLE;
    }

    /** All names it may be given by, joined by "or". */
    public String anyName() {
        return spellings.stream().map(Spelling::name).collect(Collectors.joining(" or "));
    }

    /** The names of the enumerated values. */
    public List<String> allowed() {
        return List.copyOf(choices.keySet());
    }

    /** The enumerated values that {@code text} names; empty if it names another or none. */
    Optional<List<Object>> list(String text) {
        List<Object> values = new ArrayList<>();
        for (String part : text.split(",", -1)) {
            Object value = choices.get(part.strip());
            if (value == null) {
                return Optional.empty();
            }
            values.add(value);
        }
        return Optional.of(List.copyOf(values));
    }

    /** Whether it takes one or some of an enumeration, which JSON holds as a text. */
    public boolean enumerated() {
        return kind == Kind.CHOICE || kind == Kind.LIST;
    }

    /** The value when it is not given; null if there is none. */
    @Nullable
    Object defaultValue() {
        return defaultText
                .map(text -> switch (kind) {
                    case NUMBER -> Double.valueOf(text);
                    case WHOLE -> Integer.valueOf(text);
                    case FLAG -> Boolean.valueOf(text);
                    case CHOICE -> choices.get(text);
                    case LIST -> list(text).orElseThrow();
                })
                .orElse(null);
    }

    /**
     * The canonical value of {@code given}. A bound that is told in another unit has six digits: what is beyond it by less
     * than their rounding is the bound.
     */
    double settled(Spelling spelling, double given) {
        double value = spelling.canonical(given);
        if (spelling.name().equals(name())) {
            return value;
        }
        return value < minimum && value >= minimum - ROUNDING * Math.abs(minimum)
                ? minimum
                : value > maximum && value <= maximum + ROUNDING * Math.abs(maximum) ? maximum : value;
    }
}
