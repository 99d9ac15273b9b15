package freshet.http.binding;

import java.util.Collection;
import java.util.Comparator;
import java.util.Locale;
import java.util.Optional;
import org.apache.commons.text.similarity.LevenshteinDistance;

/** How names are spelled on the wire, and which known name a mistaken one was meant for. */
public final class Names {

    private static final LevenshteinDistance DISTANCE = LevenshteinDistance.getDefaultInstance();

    private Names() {}

    /** The wire name of a record component: {@code tanMgPerL} is {@code tan_mg_per_l}. */
    public static String snake(String component) {
        StringBuilder name = new StringBuilder();
        for (char c : component.toCharArray()) {
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

    /** The known name that takes the fewest edits from {@code given}, if that is at most half of its letters. */
    public static Optional<String> nearest(String given, Collection<String> known) {
        if (given.length() > 100) {
            return Optional.empty();
        }
        String folded = given.toLowerCase(Locale.ROOT).replace('-', '_').replace(' ', '_');
        return known.stream()
                .filter(name -> distance(folded, name) <= Math.max(1, given.length() / 2))
                .min(Comparator.comparingInt(name -> distance(folded, name)));
    }

    private static int distance(String given, String known) {
        return known.startsWith(given) && given.length() > 1 ? 1 : DISTANCE.apply(given, known.replace('-', '_'));
    }
}
