package freshet.nitrification.web;

import freshet.answer.Notice;
import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;

/** Collects inputs that were given and have no influence on the answer; none passes in silence. */
final class InputNotUsed {

    private final List<Notice> notices = new ArrayList<>(0);

    /** Notes that {@code field}, if it was given at all, has no influence, and why. */
    InputNotUsed because(String reason, String field, @Nullable Object given) {
        if (given != null) {
            notices.add(new Notice("input-not-used", field, field + " was not used: " + reason + "."));
        }
        return this;
    }

    /** The notices, in the order in which the inputs were noted. */
    List<Notice> notices() {
        return notices;
    }
}
