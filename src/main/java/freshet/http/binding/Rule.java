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

    /** What is broken by what is given, whatever is given besides of what is possible. */
    Optional<Fault> brokenWhateverElse(Predicate<String> given, Predicate<String> possible) {
        List<String> remedies = kind == Kind.TOGETHER ? names.subList(1, 2) : names;
        return broken(given)
                .filter(fault ->
                        fault.code() == FaultCode.CONFLICT || remedies.stream().noneMatch(possible));
    }

    Optional<Fault> broken(Predicate<String> given) {
        if (kind == Kind.TOGETHER) {
            return given.test(names.get(0)) && !given.test(names.get(1))
                    ? Optional.of(new Fault(
                            names.get(1),
                            FaultCode.MISSING,
                            names.get(1) + " is missing: " + names.get(0) + " cannot be used without it."))
                    : Optional.empty();
        }
        int rivals = 0;
        boolean none = true;
        for (String name : names) {
            boolean there = given.test(name);
            none &= !there;
            rivals += there && !name.equals(beside) ? 1 : 0;
        }
        if (rivals > 1) {
            List<String> present = names.stream().filter(given).toList();
            return Optional.of(new Fault(
                            present.get(1),
                            FaultCode.CONFLICT,
                            "Give only one of " + String.join(", ", names) + "; " + String.join(" and ", present)
                                    + " were given.")
                    .allowing(names));
        }
        return none && kind == Kind.EXACTLY_ONE
                ? Optional.of(new Fault(
                                names.get(0),
                                FaultCode.ONE_REQUIRED,
                                "Give exactly one of " + String.join(", ", names) + ".")
                        .allowing(names))
                : Optional.empty();
    }
}
