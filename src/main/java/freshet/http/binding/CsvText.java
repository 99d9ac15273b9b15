package freshet.http.binding;

import java.io.IOException;
import java.io.InputStream;
import java.io.PushbackInputStream;
import java.io.Reader;
import java.util.Arrays;

/**
 * The bytes of a table, each as one character: separators and quotes are ASCII in UTF-8, and what is only carried along
 * leaves with the bytes it came with. A byte order mark is skipped. The end is marked by a line that no body can hold,
 * so that a quote that is never closed, which swallows it, shows.
 */
final class CsvText extends Reader {

    /** The character that marks the end, on a line of its own. */
    static final char END = '\uFFFF';

    private static final byte[] BYTE_ORDER_MARK = {(byte) 0xEF, (byte) 0xBB, (byte) 0xBF};
    private static final String LAST_LINE = "\n" + END;

    private final InputStream in;
    private final byte[] buffer = new byte[8192];
    private int ofLastLine = -1;

    CsvText(InputStream body) throws IOException {
        byte[] first = body.readNBytes(BYTE_ORDER_MARK.length);
        if (Arrays.equals(first, BYTE_ORDER_MARK)) {
            in = body;
        } else {
            PushbackInputStream whole = new PushbackInputStream(body, BYTE_ORDER_MARK.length);
            whole.unread(first);
            in = whole;
        }
    }

    @Override
    public int read(char[] target, int offset, int length) throws IOException {
        int read = ofLastLine < 0 ? in.read(buffer, 0, Math.min(length, buffer.length)) : -1;
        for (int i = 0; i < read; i++) {
            target[offset + i] = (char) (buffer[i] & 0xFF);
        }
        return read < 0 ? lastLine(target, offset) : read;
    }

    private int lastLine(char[] target, int offset) {
        ofLastLine++;
        if (ofLastLine >= LAST_LINE.length()) {
            return -1;
        }
        target[offset] = LAST_LINE.charAt(ofLastLine);
        return 1;
    }

    @Override
    public void close() {
        // The body belongs to the request.
    }
}
