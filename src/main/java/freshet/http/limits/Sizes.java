package freshet.http.limits;

import freshet.http.problem.Problem;
import freshet.http.problem.ProblemException;
import freshet.http.problem.ProblemType;
import jakarta.servlet.http.HttpServletRequest;
import java.io.FilterInputStream;
import java.io.IOException;
import java.io.InputStream;

/** How large a request may be. */
public final class Sizes {

    /** Bytes of the body of one calculation. */
    public static final int BODY = 64 * 1024;
    /** Characters of the path and the query together. */
    public static final int ADDRESS = 8 * 1024;

    /** Rows of a series in JSON. */
    public static final int ROWS = 10_000;
    /** Bytes of the body of a series in JSON. */
    public static final int SERIES_BODY = 16 * 1024 * 1024;

    private Sizes() {}

    /**
     * Refuses an address that is too long.
     *
     * @throws ProblemException 414
     */
    public static void checkAddress(HttpServletRequest request) {
        String query = request.getQueryString();
        int length = request.getRequestURI().length() + (query == null ? 0 : query.length() + 1);
        if (length > ADDRESS) {
            throw tooLarge(414, "The path and query have " + length + " characters; at most " + ADDRESS + " are read.");
        }
    }

    /**
     * The whole body.
     *
     * @throws ProblemException 413 if it is too large
     */
    public static byte[] body(HttpServletRequest request) throws IOException {
        byte[] body = request.getContentLengthLong() > BODY
                ? new byte[BODY + 1]
                : request.getInputStream().readNBytes(BODY + 1);
        if (body.length > BODY) {
            throw tooLarge(413, "The body is longer than " + BODY + " bytes.");
        }
        return body;
    }

    /** The body of a series in JSON, which throws a {@link ProblemException} 413 when too much was read of it. */
    public static InputStream seriesBody(InputStream body) {
        return new FilterInputStream(body) {
            private long length;

            @Override
            public int read(byte[] target, int offset, int most) throws IOException {
                int read = in.read(target, offset, most);
                length += read;
                if (length > SERIES_BODY) {
                    throw tooLarge(413, "The body is longer than " + SERIES_BODY + " bytes; send it as CSV or NDJSON.");
                }
                return read;
            }
        };
    }

    /**
     * Refuses a row too many.
     *
     * @throws ProblemException 413
     */
    public static void checkRows(int rows) {
        if (rows > ROWS) {
            throw tooLarge(413, "There are more than " + ROWS + " items; send more as CSV or NDJSON.");
        }
    }

    /** What is said of a row that is too long, of {@code most} bytes at most. */
    public static ProblemException rowTooLong(int most) {
        return tooLarge(413, "The row is longer than " + most + " bytes.");
    }

    private static ProblemException tooLarge(int status, String detail) {
        return new ProblemException(Problem.of(ProblemType.TOO_LARGE, status, detail));
    }
}
