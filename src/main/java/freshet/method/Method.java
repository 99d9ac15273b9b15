package freshet.method;

import java.util.List;
import java.util.regex.Pattern;

/**
 * A published method, or a construction of this project, as the catalogue shows it and every answer names it.
 *
 * @param id author and year, or for a construction of our own a plain description; lower case with hyphens
 * @param version rises when any reported digit could change, and only then
 * @param title what it gives, in one line
 * @param citation where it was published
 * @param seen how well the source was seen
 * @param equation the equation in plain text
 * @param constants its numbers
 * @param ranges where its source states it to hold
 * @param accuracy what the source states of its accuracy, or what was found here
 * @param errata known misprints and traps
 * @param uses ids of the methods it is composed of
 * @param changelog one line for each version, newest first
 */
public record Method(
        String id,
        int version,
        String title,
        Citation citation,
        Seen seen,
        String equation,
        List<Constant> constants,
        List<Range> ranges,
        String accuracy,
        List<String> errata,
        List<String> uses,
        List<String> changelog) {

    private static final Pattern ID = Pattern.compile("[a-z0-9]+(-[a-z0-9]+)*");

    /** Checks the form of the id and copies the lists. */
    public Method {
        if (!ID.matcher(id).matches()) {
            throw new IllegalArgumentException("Not a method id: " + id);
        }
        constants = List.copyOf(constants);
        ranges = List.copyOf(ranges);
        errata = List.copyOf(errata);
        uses = List.copyOf(uses);
        changelog = List.copyOf(changelog);
    }

    /** Starts the description of a method in its first version. */
    public static Method of(String id, String title, Citation citation, Seen seen) {
        return new Method(
                id,
                1,
                title,
                citation,
                seen,
                "",
                List.of(),
                List.of(),
                "",
                List.of(),
                List.of(),
                List.of("1: first version"));
    }

    /** The same with its equation and the constants in it. */
    public Method equation(String text, Constant... numbers) {
        return new Method(
                id, version, title, citation, seen, text, List.of(numbers), ranges, accuracy, errata, uses, changelog);
    }

    /** The same with the ranges its source states. */
    public Method within(Range... stated) {
        return new Method(
                id,
                version,
                title,
                citation,
                seen,
                equation,
                constants,
                List.of(stated),
                accuracy,
                errata,
                uses,
                changelog);
    }

    /** The same with what is known of its accuracy. */
    public Method accuracy(String text) {
        return new Method(
                id, version, title, citation, seen, equation, constants, ranges, text, errata, uses, changelog);
    }

    /** The same with its known misprints and traps. */
    public Method errata(String... lines) {
        return new Method(
                id,
                version,
                title,
                citation,
                seen,
                equation,
                constants,
                ranges,
                accuracy,
                List.of(lines),
                uses,
                changelog);
    }

    /** The same with the methods it is composed of. */
    public Method uses(Method... parts) {
        List<String> ids = List.of(parts).stream().map(Method::id).toList();
        return new Method(
                id, version, title, citation, seen, equation, constants, ranges, accuracy, errata, ids, changelog);
    }

    /** The values of the constants in their order, as the formula's own code uses them. */
    public double[] values() {
        return constants.stream().mapToDouble(Constant::value).toArray();
    }
}
