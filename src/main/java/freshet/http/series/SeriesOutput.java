package freshet.http.series;

import freshet.http.media.Bytes;
import jakarta.servlet.http.HttpServletResponse;
import java.io.IOException;

/** The answers of a series on their way out: held to the end, or sent as they come. */
final class SeriesOutput {

    private static final int MUCH = 32 * 1024;

    private final HttpServletResponse response;
    private final boolean streams;
    private final Bytes bytes = new Bytes(MUCH + 4096);

    SeriesOutput(HttpServletResponse response, boolean streams) {
        this.response = response;
        this.streams = streams;
    }

    /** What was not sent yet. */
    Bytes bytes() {
        return bytes;
    }

    void sendIfMuch() throws IOException {
        if (bytes.length() >= MUCH) {
            send();
        }
    }

    /** Sends what there is, unless everything is held to the end. */
    void send() throws IOException {
        if (streams && bytes.length() > 0) {
            write();
            response.flushBuffer();
        }
    }

    void end() throws IOException {
        if (!streams) {
            response.setContentLength(bytes.length());
        }
        write();
    }

    private void write() throws IOException {
        response.getOutputStream().write(bytes.array(), 0, bytes.length());
        bytes.dropTo(0);
    }
}
