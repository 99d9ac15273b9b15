package freshet.http.media;

import freshet.answer.Answer;
import freshet.answer.Notice;
import freshet.method.Method;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import org.jspecify.annotations.Nullable;

/** Flat JSON objects, most decisive key first, one line feed at the end. */
final class JsonWriter implements AnswerWriter {

    private static final byte[] WITHIN = "\"validity\":\"within\",".getBytes(StandardCharsets.US_ASCII);

    /** The members that tell of a method; hardly any two answers in a row come from different ones. */
    private record Signature(@Nullable Method method, boolean compact, byte[] members) {}

    private final Table table;
    private volatile Signature last = new Signature(null, false, new byte[0]);

    JsonWriter(Table table) {
        this.table = table;
    }

    @Override
    public Bytes write(Answer<?> answer, boolean compact) {
        Bytes out = new Bytes(512);
        out.put('{');
        members(answer, compact, out);
        out.put('\n');
        return out;
    }

    /** The members of the answer and the brace that closes it. */
    void members(Answer<?> answer, boolean compact, Bytes out) {
        table.read(answer.result(), new JsonMembers(out));
        out.put(signature(answer.method(), compact));
        if (answer.validity().within()) {
            out.put(WITHIN);
        } else {
            JsonText.member("validity", AnswerWriter.validity(answer), out);
        }
        if (compact) {
            codes(AnswerWriter.codes(answer), out);
        } else if (!answer.notices().isEmpty()) {
            notices(AnswerWriter.shown(answer), out);
        }
        out.dropLast();
        out.put('}');
    }

    private static void codes(String codes, Bytes out) {
        if (!codes.isEmpty()) {
            JsonText.member("notice_codes", codes, out);
        }
    }

    private byte[] signature(Method method, boolean compact) {
        Signature known = last;
        if (known.method() != method || known.compact() != compact) {
            Bytes out = new Bytes(128);
            method(method, compact, out);
            known = new Signature(method, compact, Arrays.copyOf(out.array(), out.length()));
            last = known;
        }
        return known.members();
    }

    private static void method(Method method, boolean compact, Bytes out) {
        JsonText.member("method", method.id(), out);
        JsonText.member("method_version", Integer.toString(method.version()), out);
        if (!compact) {
            JsonText.member("reference", method.citation().reference(), out);
        }
    }

    private static void notices(List<Notice> notices, Bytes out) {
        JsonText.key("notices", out);
        out.put('[');
        for (Notice notice : notices) {
            out.put('{');
            JsonText.member("code", notice.code(), out);
            JsonText.member("field", notice.field(), out);
            JsonText.member("detail", notice.detail(), out);
            out.dropLast();
            out.put('}');
            out.put(',');
        }
        out.dropLast();
        out.put(']');
        out.put(',');
    }
}
