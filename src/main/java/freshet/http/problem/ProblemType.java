package freshet.http.problem;

import freshet.http.binding.Names;

/** The kinds of problems, each with a page of its own at {@code /problems/<id>}. */
public enum ProblemType {
    /** Something in the request could not be read. */
    UNREADABLE(
            400,
            "The request could not be read",
            "JSON that is not well-formed, a number that is not spelled as RFC 8259 does (write 0.5, not .5 or 0,5), or an"
                    + " input that is unknown or given twice. Each entry of errors names the input and, where there is"
                    + " one, the nearest known name."),
    /** The request was read but cannot be answered. */
    INVALID(
            422,
            "The request was read but cannot be answered",
            "An input is missing, out of bounds, not one of the allowed values, contradicts another, or asks for what"
                    + " cannot be reached. A missing number is never taken for 0. errors holds every fault at once,"
                    + " with bounds and UCUM units."),
    /** There is nothing at this path. */
    NOT_FOUND(404, "There is nothing at this path", "GET / lists every calculation with a line to try."),
    /** The path does not take this HTTP method. */
    METHOD_NOT_ALLOWED(
            405,
            "The path does not take this HTTP method",
            "The Allow header of the answer lists the methods it takes."),
    /** None of the media types asked for can be given. */
    NOT_ACCEPTABLE(
            406,
            "None of the media types asked for can be given",
            "Leave the Accept header out, or ask for application/json, text/csv or application/cbor, of a series for application/x-ndjson."),
    /** The request is too large. */
    TOO_LARGE(
            413,
            "The request is too large",
            "A body may hold 64 KiB (otherwise 413), the path with its query 8 KiB (414), the header fields 24 KiB"
                    + " (431). A series in JSON may hold 10000 rows and 16 MiB (413); as CSV or NDJSON it has no limit, but"
                    + " a row may have no more than 16 KiB."),
    /** The media type of the body is not one that can be read. */
    UNSUPPORTED_MEDIA(
            415,
            "The media type of the body cannot be read",
            "Send Content-Type: application/json, in UTF-8; to a series also text/csv or application/x-ndjson."),
    /** The service is busy. */
    BUSY(503, "The service is busy", "Nothing was computed. Send the same request again after a second."),
    /** The service failed. */
    INTERNAL(
            500,
            "The service failed",
            "This is a fault of the service, not of the request; the X-Request-Id header of the answer finds it in the"
                    + " log.");

    private final int status;
    private final String title;
    private final String explanation;

    ProblemType(int status, String title, String explanation) {
        this.status = status;
        this.title = title;
        this.explanation = explanation;
    }

    /** The last part of its address. */
    public String id() {
        return Names.kebab(this);
    }

    /** The usual HTTP status. */
    public int status() {
        return status;
    }

    /** One line. */
    public String title() {
        return title;
    }

    /** What leads to it and how to mend it. */
    public String explanation() {
        return explanation;
    }

    /** The kind for an HTTP status that Spring or the server chose. */
    public static ProblemType ofStatus(int status) {
        return switch (status) {
            case 404 -> NOT_FOUND;
            case 405 -> METHOD_NOT_ALLOWED;
            case 406 -> NOT_ACCEPTABLE;
            case 413, 414, 431 -> TOO_LARGE;
            case 415 -> UNSUPPORTED_MEDIA;
            case 422 -> INVALID;
            case 503 -> BUSY;
            case 500 -> INTERNAL;
            default -> UNREADABLE;
        };
    }
}
