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
        /** Exactly two of the inputs must be given. */
        EXACTLY_TWO,
        /** At most one of the inputs may be given. */
        AT_MOST_ONE,
        /** If the first input is given, the second must be too. */
        TOGETHER
    }

    /** What is broken by what is given, whatever is given besides of what is possible. */
    Optional<Fault> brokenWhateverElse(Predicate<String> given, Predicate<String> possible) {
        List<String> remedies = kind == Kind.TOGETHER ? names.subList(1, 2) : names;
        return broken(given)
                .filter(fault -> fault.code() == FaultCode.CONFLICT
                        || remedies.stream().filter(possible).count() < wanted());
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
        int present = 0;
        for (String name : names) {
            boolean there = given.test(name);
            present += there ? 1 : 0;
            rivals += there && !name.equals(beside) ? 1 : 0;
        }
        if (rivals > wanted()) {
            return Optional.of(conflict(names.stream().filter(given).toList()));
        }
        return present < wanted() && kind != Kind.AT_MOST_ONE ? Optional.of(tooFew(given)) : Optional.empty();
    }

    private int wanted() {
        return kind == Kind.EXACTLY_TWO ? 2 : 1;
    }

    private Fault conflict(List<String> present) {
        return new Fault(
                        present.get(wanted()),
                        FaultCode.CONFLICT,
                        "Give only " + (wanted() == 1 ? "one" : "two") + " of " + String.join(", ", names) + "; "
                                + String.join(" and ", present) + " were given.")
                .allowing(names);
    }

    private Fault tooFew(Predicate<String> given) {
        String first = names.stream().filter(given.negate()).findFirst().orElseThrow();
        return new Fault(
                        first,
                        FaultCode.ONE_REQUIRED,
                        "Give exactly " + (wanted() == 1 ? "one" : "two") + " of " + String.join(", ", names) + ".")
                .allowing(names);
    }
}
