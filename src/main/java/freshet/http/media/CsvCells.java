package freshet.http.media;

import java.nio.charset.StandardCharsets;

/** Cells of tables after RFC 4180. */
public final class CsvCells {

    private CsvCells() {}

    /** Appends a cell, in quotes if it needs them where {@code separator} stands between cells. */
    public static void put(String text, char separator, Bytes out) {
        byte[] bytes = text.getBytes(StandardCharsets.UTF_8);
        if (needsQuotes(bytes, separator)) {
            quoted(bytes, 0, bytes.length, out);
        } else {
            out.put(bytes);
        }
    }

    /** Appends a part of {@code bytes} as a cell in quotes. */
    public static void quoted(byte[] bytes, int start, int end, Bytes out) {
        out.put('"');
        for (int i = start; i < end; i++) {
            if (bytes[i] == '"') {
                out.put('"');
            }
            out.put((char) bytes[i]);
        }
        out.put('"');
    }

    private static boolean needsQuotes(byte[] bytes, char separator) {
        for (byte b : bytes) {
            if (b == separator || b == '"' || b == '\r' || b == '\n') {
                return true;
            }
        }
        return false;
    }
}
