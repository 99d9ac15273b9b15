package freshet.http.binding;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import tools.jackson.core.JsonParser;

/** The lines of a body that are not blank; of one that is longer than a row may be only that it is. */
final class Lines {

    private final InputStream in;
    private final byte[] buffer = new byte[2 * Rows.LONGEST_ROW];
    private int start;
    private int end;
    private int next;
    private int filled;
    private boolean ended;
    private boolean tooLong;

    Lines(InputStream in) {
        this.in = in;
    }

    /** What a parser reads: the line, and at its end the end. */
    InputStream asInput() {
        return new InputStream() {
            @Override
            public int read() {
                return start < end ? buffer[start++] & 0xFF : -1;
            }

            @Override
            public int read(byte[] target, int offset, int most) {
                int length = Math.min(most, end - start);
                System.arraycopy(buffer, start, target, offset, length);
                start += length;
                return length == 0 ? -1 : length;
            }
        };
    }

    /** Whether nothing but blanks follows in the line after what {@code parser} has read of it. */
    boolean restIsBlank(JsonParser parser) {
        int from = start;
        ByteArrayOutputStream read = new ByteArrayOutputStream(0);
        parser.releaseBuffered(read);
        start = end;
        return isBlank(buffer, from, end) && isBlank(read.toByteArray(), 0, read.size());
    }

    boolean tooLong() {
        return tooLong;
    }

    /** Goes to the next line; false at the end of the body. */
    boolean next() throws IOException {
        do {
            if (!line()) {
                return false;
            }
        } while (!tooLong && isBlank(buffer, start, end));
        return true;
    }

    private boolean line() throws IOException {
        tooLong = false;
        start = next;
        int scanned = start;
        while (true) {
            for (int i = scanned; i < filled; i++) {
                if (buffer[i] == '\n') {
                    return upTo(i, i + 1);
                }
            }
            if (ended) {
                return upTo(filled, filled) && (end > start || tooLong);
            }
            scanned = fill();
        }
    }

    private boolean upTo(int last, int following) {
        end = last;
        next = following;
        tooLong |= end - start > Rows.LONGEST_ROW;
        return true;
    }

    /** Reads on, and tells where the bytes that were read begin. */
    private int fill() throws IOException {
        if (filled - start > Rows.LONGEST_ROW) {
            tooLong = true;
            start = filled;
        }
        System.arraycopy(buffer, start, buffer, 0, filled - start);
        filled -= start;
        start = 0;
        int from = filled;
        int read = in.read(buffer, filled, buffer.length - filled);
        ended = read < 0;
        filled += Math.max(0, read);
        return from;
    }

    private static boolean isBlank(byte[] bytes, int from, int to) {
        for (int i = from; i < to; i++) {
            if (bytes[i] != ' ' && bytes[i] != '\t' && bytes[i] != '\r') {
                return false;
            }
        }
        return true;
    }
}
