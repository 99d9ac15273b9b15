package freshet.http.binding;

import tools.jackson.core.JacksonException;
import tools.jackson.core.TokenStreamLocation;

/** Thrown when a body is not what its media type promises. */
public final class UnreadableBody extends RuntimeException {

    private static final long serialVersionUID = 1L;

    UnreadableBody(String detail) {
        super(detail, null, false, false);
    }

    /** Text that is not JSON; {@code whole} is what the text is to the caller. */
    static UnreadableBody at(JacksonException malformed, String whole) {
        TokenStreamLocation location = malformed.getLocation();
        String where =
                location == null ? "" : " at line " + location.getLineNr() + ", column " + location.getColumnNr();
        return new UnreadableBody("The " + whole + " is not well-formed JSON" + where
                + "; numbers are written like 7.5, names and texts in double quotes.");
    }
}
