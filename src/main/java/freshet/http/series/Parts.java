package freshet.http.series;

import freshet.http.media.Bytes;
import java.util.concurrent.ArrayBlockingQueue;
import java.util.concurrent.BlockingQueue;

/** Buffers that answers of earlier series have left, so that an answer that is held need not fill fresh memory. */
final class Parts {

    /** Bytes from which a part counts as full. */
    static final int FULL = 32 * 1024;

    private static final int MOST_KEPT = 256;
    private static final BlockingQueue<Bytes> LEFT = new ArrayBlockingQueue<>(MOST_KEPT);

    private Parts() {}

    static Bytes take() {
        Bytes left = LEFT.poll();
        return left == null ? new Bytes(FULL + 4096) : left;
    }

    static void giveBack(Bytes part) {
        part.dropTo(0);
        if (part.array().length <= 2 * FULL) {
            LEFT.offer(part);
        }
    }
}
