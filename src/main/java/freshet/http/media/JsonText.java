package freshet.http.media;

import tools.jackson.core.io.JsonStringEncoder;

/** Names and texts of a JSON object. */
public final class JsonText {

    private static final JsonStringEncoder ENCODER = JsonStringEncoder.getInstance();

    private JsonText() {}

    /** A member whose value is a text, and the comma after it. */
    static void member(String name, String value, Bytes out) {
        key(name, out);
        quoted(value, out);
        out.put(',');
    }

    static void key(String name, Bytes out) {
        quoted(name, out);
        out.put(':');
    }

    /** A text in quotes, what must be escaped escaped. */
    public static void quoted(String value, Bytes out) {
        out.put('"');
        out.put(ENCODER.quoteAsUTF8(value));
        out.put('"');
    }
}
