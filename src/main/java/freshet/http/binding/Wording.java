package freshet.http.binding;

import freshet.answer.Fault;
import freshet.answer.FaultCode;
import freshet.http.media.SixDigits;
import java.util.Collection;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** The sentences in which faults of reading are told. */
final class Wording {

    private static final int LONGEST_QUOTE = 40;

    private Wording() {}

    static Fault missing(Input input, String name) {
        String unit = input.numeric() ? input.unit().with(" in").strip() : "";
        return new Fault(
                name,
                FaultCode.MISSING,
                name + " is missing: " + input.meaning() + (unit.equals("in") || unit.isEmpty() ? "" : ", " + unit)
                        + "." + (input.spellings().size() > 1 ? " Give one of " + input.anyName() + "." : ""));
    }

    static Fault repeated(String name) {
        return new Fault(name, FaultCode.REPEATED, name + " was given more than once.");
    }

    static Fault repeatsConstant(String name) {
        return new Fault(
                name,
                FaultCode.REPEATED,
                name + " stands in the query for all rows and is given by the rows as well; take one away.");
    }

    static Fault unknown(String name, Collection<String> known) {
        var nearest = Names.nearest(name, known);
        return new Fault(
                        shortened(name),
                        FaultCode.UNKNOWN,
                        "There is no input " + quoted(name) + " here"
                                + nearest.map(near -> "; did you mean " + near + "?")
                                        .orElse("."))
                .near(nearest);
    }

    /** A column that is carried along, unless it was meant as an input. */
    static Fault almost(String column, String known) {
        return new Fault(
                        shortened(column),
                        FaultCode.UNKNOWN,
                        "The column " + quoted(column) + " is nearly the input " + known
                                + ": spell it so if it is meant, or rename the column if it is only carried along.")
                .near(Optional.of(known));
    }

    static Fault notAnObject(String group) {
        return new Fault(group, FaultCode.NOT_ALLOWED, group + " must be a JSON object that holds its inputs.");
    }

    static Fault decimalPoint(String name, String text) {
        return new Fault(
                name,
                FaultCode.NOT_A_NUMBER,
                name + " is " + quoted(text) + "; with csv=semicolon a number has a decimal comma and no point.");
    }

    static Fault belongsInQuery(String name) {
        return new Fault(name, FaultCode.UNKNOWN, name + " is a control: it stands in the query, not in the body.");
    }

    /** A value that is not of the kind its input takes. */
    static Fault unreadable(Shape.Entry entry, String text) {
        String name = entry.spelling().name();
        return switch (entry.input().kind()) {
            case NUMBER, WHOLE -> notNumber(name, text);
            case FLAG ->
                new Fault(name, FaultCode.NOT_BOOLEAN, name + " is " + quoted(text) + "; write true or false.")
                        .allowing(List.of("true", "false"));
            case CHOICE, LIST -> notAllowed(name, text, entry.input().allowed());
        };
    }

    static Fault notWhole(Shape.Entry entry, String text) {
        String name = entry.spelling().name();
        return new Fault(name, FaultCode.NOT_ALLOWED, name + " is " + text + "; it must be a whole number.");
    }

    static Fault givenTwice(Shape.Entry entry) {
        return new Fault(
                entry.spelling().name(),
                FaultCode.CONFLICT,
                "Give only one of " + entry.input().anyName() + ", even if they agree.");
    }

    private static Fault notNumber(String name, String text) {
        return new Fault(
                name,
                FaultCode.NOT_A_NUMBER,
                name + " is " + quoted(text) + ", not a number as RFC 8259 writes it (at most 32 characters)"
                        + NumberText.corrected(text)
                                .map(spelling -> "; write " + spelling + ".")
                                .orElse("."));
    }

    private static Fault notAllowed(String name, String text, List<String> allowed) {
        return new Fault(
                        name,
                        FaultCode.NOT_ALLOWED,
                        name + " is " + quoted(text) + "; allowed are " + String.join(", ", allowed) + ".")
                .allowing(allowed)
                .near(Names.nearest(text, allowed));
    }

    static Fault outOfBounds(Shape.Entry entry, String text, boolean below) {
        Input input = entry.input();
        Spelling spelling = entry.spelling();
        String canonical = range(input, input.spellings().get(0));
        String detail = spelling.name() + " is " + spelling.unit().with(text) + "; it must be " + range(input, spelling)
                + (spelling.name().equals(input.name()) ? "." : " (" + input.name() + " " + canonical + ").");
        return new Fault(spelling.name(), below ? FaultCode.BELOW_MINIMUM : FaultCode.ABOVE_MAXIMUM, detail)
                .bounds(
                        OptionalDouble.of(input.minimum()),
                        OptionalDouble.of(input.maximum()),
                        input.unit().ucum());
    }

    private static String range(Input input, Spelling spelling) {
        return spelling.unit()
                .with(SixDigits.text(spelling.given(input.minimum())) + " to "
                        + SixDigits.text(spelling.given(input.maximum())));
    }

    private static String quoted(String text) {
        return "\"" + shortened(text) + "\"";
    }

    private static String shortened(String text) {
        return text.length() <= LONGEST_QUOTE ? text : text.substring(0, LONGEST_QUOTE) + "…";
    }
}
