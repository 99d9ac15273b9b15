package freshet.http.media;

import freshet.answer.Fault;
import freshet.answer.FaultCode;
import freshet.answer.Refusal;
import freshet.http.binding.Names;
import freshet.quantity.Unit;
import java.lang.invoke.MethodHandle;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * One output of an answer, as its response record declares it.
 *
 * @param name name on the wire
 * @param kind what kind of value it is
 * @param meaning what it is
 * @param optional whether it may be left out
 * @param rows the outputs of each row, only of {@link Kind#ROWS}
 * @param choices the enumerated values, only of {@link Kind#TEXT} that is an enumeration
 * @param accessor reads it from the response record: of {@link Kind#NUMBER} as a double, of others as an object
 * @param key the name as the start of a JSON member
 */
public record Column(
        String name,
        Kind kind,
        String meaning,
        boolean optional,
        Optional<Table> rows,
        List<String> choices,
        MethodHandle accessor,
        byte[] key) {

    /** The kinds of values. */
    public enum Kind {
        /** A number. */
        NUMBER,
        /** A whole number. */
        WHOLE,
        /** True or false. */
        FLAG,
        /** One of an enumeration. */
        TEXT,
        /** A list of records. */
        ROWS,
        /** A list of numbers. */
        NUMBERS,
        /** Lists of numbers in a list. */
        MATRIX
    }

    /** Whether it is a single value. */
    public boolean single() {
        return kind != Kind.ROWS && kind != Kind.NUMBERS && kind != Kind.MATRIX;
    }

    /** The unit. */
    public Unit unit() {
        return Unit.ofName(name);
    }

    /** Passes what {@code result} has for this output, which is not a {@link Kind#NUMBER}, on to {@code sink}. */
    void read(Record result, Sink sink) {
        try {
            Object value = (Object) accessor.invokeExact(result);
            other(value, sink);
        } catch (RuntimeException | Error unchecked) {
            throw unchecked;
        } catch (Throwable checked) {
            throw new IllegalStateException(checked);
        }
    }

    @SuppressWarnings("unchecked")
    private void other(Object value, Sink sink) {
        if (value instanceof Optional<?> perhaps) {
            perhaps.ifPresentOrElse(present -> other(present, sink), () -> sink.absent(this));
        } else if (kind == Kind.NUMBERS || kind == Kind.MATRIX) {
            sink.numbers(this, (List<?>) value);
        } else if (kind == Kind.ROWS) {
            sink.rows(this, (List<? extends Record>) value);
        } else {
            sink.word(this, value instanceof Enum<?> constant ? Names.kebab(constant) : value.toString());
        }
    }

    /**
     * Passes a number, or {@link Numbers#ABSENT}, on to {@code sink}.
     *
     * @throws Refusal if the number is too large to be printed
     */
    void number(double value, Sink sink) {
        if (Math.abs(value) < SixDigits.TOO_LARGE) {
            sink.number(this, value);
        } else if (Numbers.isAbsent(value)) {
            sink.absent(this);
        } else {
            throw new Refusal(new Fault(
                            name,
                            FaultCode.ABOVE_MAXIMUM,
                            "The result " + name + " would be 1e15 or more; no farm holds that: check the inputs.")
                    .bounds(OptionalDouble.empty(), OptionalDouble.of(SixDigits.TOO_LARGE), unit().ucum()));
        }
    }
}
