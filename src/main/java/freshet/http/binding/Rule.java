package freshet.http.binding;

import freshet.answer.Fault;
import freshet.answer.FaultCode;
import java.util.List;
import java.util.Optional;
import java.util.function.Predicate;

/**
 * A rule between the inputs of one request.
 *
 * @param kind what it demands
 * @param names canonical names of the inputs; of {@link Kind#TOGETHER} the one with the need and the one needed
 * @param beside the input that is no rival to the others, of which there must be one all the same; empty if none is
 */
public record Rule(Kind kind, List<String> names, String beside) {

    Rule(Kind kind, List<String> names) {
        this(kind, names, "");
    }

    /** The kinds of rules. */
    public enum Kind {
        /** Exactly one of the inputs must be given. */
        EXACTLY_ONE,
        /** At most one of the inputs may be given. */
        AT_MOST_ONE,
        /** If the first input is given, the second must be too. */
        TOGETHER
    }

    Optional<Fault> broken(Predicate<String> given) {
        List<String> present = names.stream().filter(given).toList();
        if (kind == Kind.TOGETHER) {
            return given.test(names.get(0)) && !given.test(names.get(1))
                    ? Optional.of(new Fault(
                            names.get(1),
                            FaultCode.MISSING,
                            names.get(1) + " is missing: " + names.get(0) + " cannot be used without it."))
                    : Optional.empty();
        }
        if (present.stream().filter(name -> !name.equals(beside)).count() > 1) {
            return Optional.of(new Fault(
                            present.get(1),
                            FaultCode.CONFLICT,
                            "Give only one of " + String.join(", ", names) + "; " + String.join(" and ", present)
                                    + " were given.")
                    .allowing(names));
        }
        return present.isEmpty() && kind == Kind.EXACTLY_ONE
                ? Optional.of(new Fault(
                                names.get(0),
                                FaultCode.ONE_REQUIRED,
                                "Give exactly one of " + String.join(", ", names) + ".")
                        .allowing(names))
                : Optional.empty();
    }
}
