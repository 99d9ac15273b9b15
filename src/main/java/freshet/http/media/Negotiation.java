package freshet.http.media;

import freshet.http.problem.Problem;
import freshet.http.problem.ProblemException;
import freshet.http.problem.ProblemType;
import jakarta.servlet.http.HttpServletRequest;
import java.nio.charset.StandardCharsets;
import org.jspecify.annotations.Nullable;
import org.springframework.http.InvalidMediaTypeException;
import org.springframework.http.MediaType;

/** Which media types a calculation reads and writes. */
public final class Negotiation {

    private Negotiation() {}

    /**
     * Refuses a request for media that cannot be given.
     *
     * @throws ProblemException 406
     */
    public static void checkAccept(@Nullable String accept) {
        if (accept == null
                || accept.isBlank()
                || accept.equals("*/*")
                || accept.equals(MediaType.APPLICATION_JSON_VALUE)) {
            return;
        }
        try {
            boolean json = MediaType.parseMediaTypes(accept).stream()
                    .anyMatch(type -> type.includes(MediaType.APPLICATION_JSON) && type.getQualityValue() > 0);
            if (json) {
                return;
            }
        } catch (InvalidMediaTypeException unreadable) {
            // Not a media type, so not one that can be given.
        }
        throw new ProblemException(Problem.of(
                ProblemType.NOT_ACCEPTABLE,
                "The Accept header allows no media type that can be given: application/json."));
    }

    /**
     * Refuses a body that is not JSON in UTF-8.
     *
     * @throws ProblemException 415
     */
    public static void checkContentType(HttpServletRequest request) {
        String given = request.getContentType();
        if (!MediaType.APPLICATION_JSON_VALUE.equals(given) && !isJson(given)) {
            throw new ProblemException(Problem.of(
                    ProblemType.UNSUPPORTED_MEDIA,
                    (given == null ? "The request has no Content-Type" : "The Content-Type is not one that can be read")
                            + "; send Content-Type: application/json."));
        }
    }

    private static boolean isJson(@Nullable String contentType) {
        try {
            MediaType type = MediaType.parseMediaType(String.valueOf(contentType));
            return type.equalsTypeAndSubtype(MediaType.APPLICATION_JSON)
                    && (type.getCharset() == null || type.getCharset().equals(StandardCharsets.UTF_8));
        } catch (InvalidMediaTypeException unreadable) {
            return false;
        }
    }
}
