package freshet.answer;

import java.util.Locale;

/** What can be wrong with an input. */
public enum FaultCode {
    /** A required input is absent, empty or null. */
    MISSING,
    /** No input has this name. */
    UNKNOWN,
    /** The input was given more than once. */
    REPEATED,
    /** The text is not a number as RFC 8259 writes it. */
    NOT_A_NUMBER,
    /** The text is neither true nor false. */
    NOT_BOOLEAN,
    /** The value is less than the least allowed. */
    BELOW_MINIMUM,
    /** The value is more than the greatest allowed. */
    ABOVE_MAXIMUM,
    /** The value is not one of the allowed ones. */
    NOT_ALLOWED,
    /** Inputs that exclude each other were given together. */
    CONFLICT,
    /** One of several inputs is needed and none was given. */
    ONE_REQUIRED,
    /** What is asked for cannot be reached from here. */
    UNREACHABLE,
    /** The inputs lie outside the range the method's source states, and the request is strict. */
    OUTSIDE_VALIDITY,
    /** The inputs contradict each other. */
    INCONSISTENT;

    private final String code = name().toLowerCase(Locale.ROOT).replace('_', '-');

    /** The code as an answer spells it. */
    public String code() {
        return code;
    }

    /** Whether the input could not be read at all, as against read and refused. */
    public boolean unreadable() {
        return this == UNKNOWN || this == REPEATED || this == NOT_A_NUMBER || this == NOT_BOOLEAN;
    }
}
