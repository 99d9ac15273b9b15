package freshet.http.media;

import freshet.answer.Answer;
import freshet.answer.Fault;
import freshet.answer.FaultCode;
import freshet.answer.Notice;
import freshet.answer.Refusal;
import freshet.http.binding.Names;
import freshet.method.Method;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import tools.jackson.core.io.JsonStringEncoder;

/** Writes answers as flat JSON objects, most decisive key first, one line feed at the end. */
public final class JsonWriter {

    private static final JsonStringEncoder ENCODER = JsonStringEncoder.getInstance();
    private static final int MOST_NOTICES = 5;

    private final Table table;

    /** A writer of one response record. */
    public JsonWriter(Table table) {
        this.table = table;
    }

    /**
     * Writes an answer.
     *
     * @throws Refusal if a number is too large to be printed
     */
    public Bytes write(Answer<?> answer, boolean compact) {
        Bytes out = new Bytes(512);
        out.put('{');
        members(table, answer.result(), out);
        method(answer.method(), compact, out);
        text("validity", answer.validity().within() ? "within" : "outside", out);
        notices(answer.notices(), compact, out);
        out.dropLast();
        out.put('}');
        out.put('\n');
        return out;
    }

    private static void members(Table columns, Record result, Bytes out) {
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
            quoted(Names.kebab(constant), out);
        } else {
            out.put(ENCODER.quoteAsUTF8(value.toString()));
        }
        out.put(',');
    }

    private static void rows(Column column, List<Record> records, Bytes out) {
        out.put(column.key());
        out.put('[');
        for (Record row : records) {
            out.put('{');
            members(column.rows().orElseThrow(), row, out);
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

    private static void method(Method method, boolean compact, Bytes out) {
        text("method", method.id(), out);
        text("method_version", Integer.toString(method.version()), out);
        if (!compact) {
            text("reference", method.citation().reference(), out);
        }
    }

    private static void notices(List<Notice> all, boolean compact, Bytes out) {
        List<Notice> notices = all.subList(0, Math.min(MOST_NOTICES, all.size()));
        if (notices.isEmpty()) {
            return;
        }
        if (compact) {
            text(
                    "notice_codes",
                    String.join(";", notices.stream().map(Notice::code).toList()),
                    out);
            return;
        }
        key("notices", out);
        out.put('[');
        for (Notice notice : notices) {
            out.put('{');
            text("code", notice.code(), out);
            text("field", notice.field(), out);
            text("detail", notice.detail(), out);
            out.dropLast();
            out.put('}');
            out.put(',');
        }
        out.dropLast();
        out.put(']');
        out.put(',');
    }

    private static void text(String name, String value, Bytes out) {
        key(name, out);
        quoted(value, out);
        out.put(',');
    }

    private static void key(String name, Bytes out) {
        quoted(name, out);
        out.put(':');
    }

    private static void quoted(String value, Bytes out) {
        out.put('"');
        out.put(ENCODER.quoteAsUTF8(value));
        out.put('"');
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
