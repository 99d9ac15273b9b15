package freshet.http.media;

import freshet.answer.Answer;
import freshet.answer.Notice;
import freshet.answer.Refusal;
import freshet.method.Method;
import java.util.List;

/** Writes answers as flat JSON objects, most decisive key first, one line feed at the end. */
public final class JsonWriter {

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
        JsonMembers.write(table, answer.result(), out);
        method(answer.method(), compact, out);
        JsonText.member("validity", answer.validity().within() ? "within" : "outside", out);
        notices(answer.notices(), compact, out);
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

    private static void notices(List<Notice> all, boolean compact, Bytes out) {
        List<Notice> notices = all.subList(0, Math.min(MOST_NOTICES, all.size()));
        if (notices.isEmpty()) {
            return;
        }
        if (compact) {
            JsonText.member(
                    "notice_codes",
                    String.join(";", notices.stream().map(Notice::code).toList()),
                    out);
            return;
        }
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
