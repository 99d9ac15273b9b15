package freshet.http.binding;

import freshet.answer.Fault;
import freshet.answer.FaultCode;
import freshet.http.media.Bytes;
import freshet.http.media.CsvCells;
import freshet.http.media.JsonText;
import java.util.List;
import org.jspecify.annotations.Nullable;
import tools.jackson.core.JsonParser;
import tools.jackson.core.JsonToken;

/** The member by which a caller knows his rows again. */
final class Tag {

    static final String NAME = "tag";

    private static final int LONGEST = 128;

    private @Nullable String value;

    void clear() {
        value = null;
    }

    void read(JsonParser parser, JsonToken token, List<Fault> faults) {
        String text = token == JsonToken.VALUE_STRING ? parser.getString() : null;
        parser.skipChildren();
        if (value != null) {
            faults.add(Wording.repeated(NAME));
        } else if (text == null || text.length() > LONGEST) {
            faults.add(new Fault(NAME, FaultCode.NOT_ALLOWED, "tag must be a text of at most 128 characters."));
        } else {
            value = text;
        }
    }

    void asCell(char separator, Bytes out) {
        if (value != null) {
            CsvCells.put(value, separator, out);
        }
    }

    boolean asText(Bytes out) {
        if (value == null) {
            return false;
        }
        JsonText.quoted(value, out);
        return true;
    }
}
