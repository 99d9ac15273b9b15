package freshet.http.binding;

import java.io.IOException;
import java.io.InputStream;

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

    byte[] bytes() {
        return buffer;
    }

    int start() {
        return start;
    }

    int length() {
        return end - start;
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
        } while (!tooLong && isBlank());
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
                return upTo(filled, filled) && (length() > 0 || tooLong);
            }
            scanned = fill();
        }
    }

    private boolean upTo(int last, int following) {
        end = last;
        next = following;
        tooLong |= length() > Rows.LONGEST_ROW;
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

    private boolean isBlank() {
        for (int i = start; i < end; i++) {
            if (buffer[i] != ' ' && buffer[i] != '\t' && buffer[i] != '\r') {
                return false;
            }
        }
        return true;
    }
}
