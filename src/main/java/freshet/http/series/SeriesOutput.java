package freshet.http.series;

import freshet.http.media.Bytes;
import jakarta.servlet.http.HttpServletResponse;
import java.io.IOException;

/** The answers of a series on their way out. */
final class SeriesOutput {

    private static final int FULL = 32 * 1024;

    private final HttpServletResponse response;
    private final Bytes bytes = new Bytes(FULL + 4096);

    SeriesOutput(HttpServletResponse response) {
        this.response = response;
    }

    /** Takes what comes next. */
    Bytes bytes() {
        return bytes;
    }

    /** Makes room when there is much. */
    void rowEnds() throws IOException {
        if (bytes.length() >= FULL) {
            write();
        }
    }

    /** Sends what there is. */
    void send() throws IOException {
        if (bytes.length() > 0) {
            write();
            response.flushBuffer();
        }
    }

    void end() throws IOException {
        write();
    }

    private void write() throws IOException {
        response.getOutputStream().write(bytes.array(), 0, bytes.length());
        bytes.dropTo(0);
    }
}
