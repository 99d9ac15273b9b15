package freshet.http.problem;

import freshet.answer.Fault;
import freshet.answer.FaultCode;
import java.util.List;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;

/**
 * Why a request was not answered, as RFC 9457 tells it.
 *
 * @param type the kind
 * @param status HTTP status
 * @param detail one sentence on this request
 * @param faults every fault of the inputs; empty if the inputs are not at fault
 * @param pointers where in a JSON body each fault stands; empty if the faults stand elsewhere
 */
public record Problem(ProblemType type, int status, String detail, List<Fault> faults, List<String> pointers) {

    private static final String UNREADABLE_BY_SERVER =
            "The request line, a header field or the framing of the body could"
                    + " not be read; percent-encode every character of the address that is not a letter, a digit or one of"
                    + " - . _ ~ / ? & =.";

    /** A problem that its sentence describes fully. */
    public static Problem of(ProblemType type, String detail) {
        return of(type, type.status(), detail);
    }

    /** A problem with a status other than the usual one of its kind. */
    public static Problem of(ProblemType type, int status, String detail) {
        return new Problem(type, status, detail, List.of(), List.of());
    }

    /** What Spring or the server refused with an HTTP status and no more words. */
    public static Problem ofStatus(int status) {
        ProblemType type = ProblemType.ofStatus(status);
        return switch (type) {
            // The server says 501 or 505 to an unknown transfer coding or protocol, which is a fault of the request.
            case UNREADABLE -> of(type, UNREADABLE_BY_SERVER);
            case INTERNAL -> of(type, type.explanation());
            default -> of(type, status, type.explanation());
        };
    }

    /**
     * Inputs that could not be read, or were read and refused.
     *
     * @param holder JSON pointer of the object that holds the inputs; null if they are not in a JSON body
     */
    public static Problem of(List<Fault> faults, @Nullable String holder) {
        boolean unreadable = faults.stream().map(Fault::code).anyMatch(FaultCode::unreadable);
        ProblemType type = unreadable ? ProblemType.UNREADABLE : ProblemType.INVALID;
        String detail = faults.size() == 1
                ? faults.get(0).detail()
                : faults.size() + " faults: "
                        + faults.stream()
                                .map(fault -> fault.field() + " " + fault.code().code())
                                .limit(20)
                                .collect(Collectors.joining(", "))
                        + ".";
        List<String> pointers = holder == null
                ? List.of()
                : faults.stream()
                        .map(fault -> holder + "/"
                                + fault.field()
                                        .replace("~", "~0")
                                        .replace("/", "~1")
                                        .replace('.', '/'))
                        .toList();
        return new Problem(type, type.status(), detail, faults, pointers);
    }
}
