package freshet.http.media;

import freshet.answer.Fault;
import freshet.answer.FaultCode;
import freshet.answer.Refusal;
import freshet.http.binding.Names;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** The outputs of a response record as members of a JSON object, each with a comma after it. */
final class JsonMembers {

    private JsonMembers() {}

    static void write(Table columns, Record result, Bytes out) {
        for (Column column : columns.columns()) {
            try {
                member(column, result, out);
            } catch (RuntimeException | Error unchecked) {
                throw unchecked;
            } catch (Throwable checked) {
                throw new IllegalStateException(checked);
            }
        }
    }

    @SuppressWarnings("unchecked")
    private static void member(Column column, Record result, Bytes out) throws Throwable {
        if (column.kind() == Column.Kind.NUMBER && !column.optional()) {
            number(column, (double) column.accessor().invokeExact(result), out);
            return;
        }
        Object value = (Object) column.accessor().invokeExact(result);
        if (value instanceof OptionalDouble number) {
            if (number.isPresent()) {
                number(column, number.getAsDouble(), out);
            }
        } else if (value instanceof Optional<?> perhaps) {
            perhaps.ifPresent(present -> other(column, present, out));
        } else if (column.kind() == Column.Kind.ROWS) {
            rows(column, (List<Record>) value, out);
        } else {
            other(column, value, out);
        }
    }

    private static void number(Column column, double value, Bytes out) {
        if (!(Math.abs(value) < SixDigits.TOO_LARGE)) {
            throw tooLarge(column);
        }
        out.put(column.key());
        SixDigits.write(value, out);
        out.put(',');
    }

    private static void other(Column column, Object value, Bytes out) {
        out.put(column.key());
        if (value instanceof Enum<?> constant) {
            JsonText.quoted(Names.kebab(constant), out);
        } else {
            out.put(value.toString().getBytes(StandardCharsets.US_ASCII));
        }
        out.put(',');
    }

    private static void rows(Column column, List<Record> records, Bytes out) {
        out.put(column.key());
        out.put('[');
        for (Record row : records) {
            out.put('{');
            write(column.rows().orElseThrow(), row, out);
            out.dropLast();
            out.put('}');
            out.put(',');
        }
        if (!records.isEmpty()) {
            out.dropLast();
        }
        out.put(']');
        out.put(',');
    }

    private static Refusal tooLarge(Column column) {
        return new Refusal(new Fault(
                        column.name(),
                        FaultCode.ABOVE_MAXIMUM,
                        "The result " + column.name() + " would be 1e15 or more; no farm holds that: check the inputs.")
                .bounds(
                        OptionalDouble.empty(),
                        OptionalDouble.of(SixDigits.TOO_LARGE),
                        column.unit().ucum()));
    }
}
