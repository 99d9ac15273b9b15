package freshet.http.media;

import freshet.answer.Answer;
import freshet.answer.Notice;
import freshet.method.Method;
import java.util.List;

/** Flat JSON objects, most decisive key first, one line feed at the end. */
final class JsonWriter implements AnswerWriter {

    private final Table table;

    JsonWriter(Table table) {
        this.table = table;
    }

    @Override
    public Bytes write(Answer<?> answer, boolean compact) {
        Bytes out = new Bytes(512);
        out.put('{');
        table.read(answer.result(), new JsonMembers(out));
        method(answer.method(), compact, out);
        JsonText.member("validity", AnswerWriter.validity(answer), out);
        List<Notice> notices = AnswerWriter.shown(answer);
        if (!notices.isEmpty() && compact) {
            JsonText.member("notice_codes", AnswerWriter.codes(answer), out);
        } else if (!notices.isEmpty()) {
            notices(notices, out);
        }
        out.dropLast();
        out.put('}');
        out.put('\n');
        return out;
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
