package freshet.http.media;

import java.nio.charset.StandardCharsets;

/** Cells of tables after RFC 4180. */
public final class CsvCells {

    private CsvCells() {}

    /** Appends a cell, in quotes if it needs them where {@code separator} stands between cells. */
    public static void put(String text, char separator, Bytes out) {
        byte[] bytes = text.getBytes(StandardCharsets.UTF_8);
        if (needsQuotes(bytes, separator)) {
            char[] chars = new String(bytes, StandardCharsets.ISO_8859_1).toCharArray();
            quoted(chars, 0, chars.length, out);
        } else {
            out.put(bytes);
        }
    }

    /** Appends a part of {@code chars}, each of them one byte, as a cell in quotes. */
    public static void quoted(char[] chars, int start, int end, Bytes out) {
        out.put('"');
        for (int i = start; i < end; i++) {
            if (chars[i] == '"') {
                out.put('"');
            }
            out.put(chars[i]);
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
