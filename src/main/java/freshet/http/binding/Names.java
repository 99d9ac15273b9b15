package freshet.http.binding;

import java.util.Collection;
import java.util.Comparator;
import java.util.Locale;
import java.util.Optional;
import org.apache.commons.text.similarity.LevenshteinDistance;

/** How names are spelled on the wire, and which known name a mistaken one was meant for. */
public final class Names {

    private static final LevenshteinDistance DISTANCE = LevenshteinDistance.getDefaultInstance();

    private static final int MOST_EDITS = 2;

    private Names() {}

    /**
     * The wire name of a record component: {@code tanMgPerL} is {@code tan_mg_per_l}. One underscore at the end, which a
     * word of the Java language needs to be a name, is dropped.
     */
    public static String snake(String component) {
        String bare = component.endsWith("_") ? component.substring(0, component.length() - 1) : component;
        StringBuilder name = new StringBuilder();
        for (char c : bare.toCharArray()) {
            if (Character.isUpperCase(c)) {
                name.append('_');
            }
            name.append(Character.toLowerCase(c));
        }
        return name.toString();
    }

    /** The wire name of an enumerated value: {@code EMERSON_1975} is {@code emerson-1975}. */
    public static String kebab(Enum<?> value) {
        return value.name().toLowerCase(Locale.ROOT).replace('_', '-');
    }

    /**
     * The known name that takes the fewest edits from {@code given}, if that is at most half of its letters. Where that are
     * more than a slip, the first name of the same quantity goes before: what differs may be the unit.
     */
    public static Optional<String> nearest(String given, Collection<String> known) {
        if (given.length() > 100) {
            return Optional.empty();
        }
        String folded = given.toLowerCase(Locale.ROOT).replace('-', '_').replace(' ', '_');
        Optional<String> nearest = known.stream()
                .filter(name -> distance(folded, name) <= Math.max(1, given.length() / 2))
                .min(Comparator.comparingInt(name -> distance(folded, name)));
        String quantity = folded.replaceFirst("_.*", "_");
        return nearest.filter(name -> distance(folded, name) <= MOST_EDITS)
                .or(() -> known.stream()
                        .filter(name -> folded.contains("_") && name.startsWith(quantity))
                        .findFirst())
                .or(() -> nearest);
    }

    /** The known name that {@code given} is nearly, so that it was hardly meant as a name of its own. */
    public static Optional<String> almost(String given, Collection<String> known) {
        String folded = folded(given);
        return known.stream()
                .filter(name -> folded.equals(folded(name)) || isNear(given, name))
                .min(Comparator.comparingInt(name -> DISTANCE.apply(given, name)));
    }

    /** Two edits or fewer, and not every letter another. */
    private static boolean isNear(String given, String known) {
        int longer = Math.max(given.length(), known.length());
        if (Math.abs(given.length() - known.length()) > MOST_EDITS) {
            return false;
        }
        int edits = DISTANCE.apply(given, known);
        return edits <= MOST_EDITS && edits < longer;
    }

    private static String folded(String name) {
        return name.toLowerCase(Locale.ROOT).replaceAll("[\\s_-]", "");
    }

    private static int distance(String given, String known) {
        return known.startsWith(given) && given.length() > 1 ? 1 : DISTANCE.apply(given, known.replace('-', '_'));
    }
}
