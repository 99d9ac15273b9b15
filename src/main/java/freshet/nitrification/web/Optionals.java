package freshet.nitrification.web;

import java.util.OptionalDouble;
import org.jspecify.annotations.Nullable;

/** Inputs that may be absent, as chemistry takes them. */
final class Optionals {

    private Optionals() {}

    static OptionalDouble of(@Nullable Double value) {
        return value == null ? OptionalDouble.empty() : OptionalDouble.of(value);
    }

    /** A percentage as a share. */
    static OptionalDouble share(@Nullable Double percent) {
        return percent == null ? OptionalDouble.empty() : OptionalDouble.of(percent / 100);
    }
}
