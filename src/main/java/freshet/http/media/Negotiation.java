package freshet.http.media;

import freshet.answer.Fault;
import freshet.answer.FaultCode;
import freshet.answer.Refusal;
import freshet.http.binding.Controls.Format;
import freshet.http.binding.Medium;
import freshet.http.binding.Names;
import freshet.http.problem.Problem;
import freshet.http.problem.ProblemException;
import freshet.http.problem.ProblemType;
import jakarta.servlet.http.HttpServletRequest;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.util.Comparator;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.springframework.http.InvalidMediaTypeException;
import org.springframework.http.MediaType;

/** Which media types a calculation reads and writes. */
public final class Negotiation {

    private static final List<Format> FLAT = List.of(Format.JSON, Format.CSV, Format.CBOR);
    private static final List<Format> NOT_FLAT = List.of(Format.JSON, Format.CSV);

    private Negotiation() {}

    /** The formats that answers of this form can be given in, the preferred one first. */
    public static List<Format> formats(Table outputs) {
        return outputs.flat() ? FLAT : NOT_FLAT;
    }

    /**
     * The format of an answer.
     *
     * @param asked the control of this name, which beats the header; null if it was not given
     * @param accept the Accept header
     * @param formats what can be given, the preferred one first
     * @throws Refusal if the control asks for what cannot be given
     * @throws ProblemException 406 if the header does
     */
    public static <F extends Enum<F> & Medium> F format(@Nullable F asked, @Nullable String accept, List<F> formats) {
        if (asked != null) {
            if (!formats.contains(asked)) {
                throw new Refusal(new Fault(
                                "format",
                                FaultCode.NOT_ALLOWED,
                                "This answer cannot be given as " + Names.kebab(asked) + ".")
                        .allowing(formats.stream().<String>map(Names::kebab).toList()));
            }
            return asked;
        }
        F preferred = formats.get(0);
        if (accept == null || accept.isBlank() || accept.equals("*/*") || accept.equals(preferred.mediaType())) {
            return preferred;
        }
        List<MediaType> ranges = ranges(accept);
        return formats.stream()
                .filter(format -> quality(format, ranges) > 0)
                .max(Comparator.comparingDouble(format -> quality(format, ranges) - 1e-9 * formats.indexOf(format)))
                .orElseThrow(() -> new ProblemException(Problem.of(
                        ProblemType.NOT_ACCEPTABLE,
                        "The Accept header allows no media type that can be given: "
                                + String.join(
                                        ", ",
                                        formats.stream().map(Medium::mediaType).toList())
                                + ".")));
    }

    /**
     * The medium of a body.
     *
     * @param readable what can be read
     * @throws ProblemException 415 if it is none of these, or in an encoding that cannot be read
     */
    public static <F extends Medium> F body(HttpServletRequest request, List<F> readable) {
        String given = request.getContentType();
        for (F medium : readable) {
            if (medium.mediaType().equals(given) || is(given, medium)) {
                return medium;
            }
        }
        throw new ProblemException(Problem.of(
                ProblemType.UNSUPPORTED_MEDIA,
                (given == null ? "The request has no Content-Type" : "The Content-Type is not one that can be read")
                        + "; send Content-Type: "
                        + String.join(
                                " or ", readable.stream().map(Medium::mediaType).toList())
                        + ", in UTF-8."));
    }

    private static boolean is(@Nullable String contentType, Medium medium) {
        try {
            MediaType type = MediaType.parseMediaType(String.valueOf(contentType));
            return type.equalsTypeAndSubtype(MediaType.valueOf(medium.mediaType()))
                    && (type.getCharset() == null || isRead(type.getCharset(), medium));
        } catch (InvalidMediaTypeException unreadable) {
            return false;
        }
    }

    /** Of tables and lines only the ASCII characters are read; what else they hold is carried along as bytes. */
    private static boolean isRead(Charset charset, Medium medium) {
        return charset.equals(StandardCharsets.UTF_8)
                || !medium.mediaType().equals(Format.JSON.mediaType())
                        && charset.contains(StandardCharsets.US_ASCII)
                        && charset.newEncoder().maxBytesPerChar() < 2;
    }

    private static List<MediaType> ranges(String accept) {
        try {
            return MediaType.parseMediaTypes(accept);
        } catch (InvalidMediaTypeException unreadable) {
            return List.of();
        }
    }

    /** The quality of the most specific range that includes the format; 0 if none does. */
    private static double quality(Medium format, List<MediaType> ranges) {
        MediaType type = MediaType.valueOf(format.mediaType());
        return ranges.stream()
                .filter(range -> range.includes(type))
                .max(Comparator.comparingInt(range -> range.isWildcardType() ? 0 : range.isWildcardSubtype() ? 1 : 2))
                .map(MediaType::getQualityValue)
                .orElse(0.0);
    }
}
