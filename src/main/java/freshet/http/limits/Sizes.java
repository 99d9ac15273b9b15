package freshet.http.limits;

import freshet.http.problem.Problem;
import freshet.http.problem.ProblemException;
import freshet.http.problem.ProblemType;
import jakarta.servlet.http.HttpServletRequest;
import java.io.IOException;

/** How large a request may be. */
public final class Sizes {

    /** Bytes of the body of one calculation. */
    public static final int BODY = 64 * 1024;
    /** Characters of the path and the query together. */
    public static final int ADDRESS = 8 * 1024;

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

    private static ProblemException tooLarge(int status, String detail) {
        return new ProblemException(Problem.of(ProblemType.TOO_LARGE, status, detail));
    }
}
