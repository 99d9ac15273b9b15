package freshet.http.series;

import freshet.http.media.Bytes;
import jakarta.servlet.http.HttpServletResponse;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;

/** The answers of a series on their way out: held to the end, or sent as they come. */
final class SeriesOutput {

    private final HttpServletResponse response;
    private final boolean streams;
    private final List<Bytes> held = new ArrayList<>();
    private Bytes bytes = Parts.take();

    SeriesOutput(HttpServletResponse response, boolean streams) {
        this.response = response;
        this.streams = streams;
    }

    /** Takes what comes next. */
    Bytes bytes() {
        return bytes;
    }

    /** Makes room when there is much. */
    void rowEnds() throws IOException {
        if (bytes.length() >= Parts.FULL) {
            if (streams) {
                send();
            } else {
                held.add(bytes);
                bytes = Parts.take();
            }
        }
    }

    /** Sends what there is, unless everything is held to the end. */
    void send() throws IOException {
        if (streams && bytes.length() > 0) {
            write(bytes);
            bytes.dropTo(0);
            response.flushBuffer();
        }
    }

    void end() throws IOException {
        held.add(bytes);
        if (!streams) {
            response.setContentLength(held.stream().mapToInt(Bytes::length).sum());
        }
        for (Bytes part : held) {
            write(part);
        }
        held.forEach(Parts::giveBack);
    }

    private void write(Bytes part) throws IOException {
        response.getOutputStream().write(part.array(), 0, part.length());
    }
}
