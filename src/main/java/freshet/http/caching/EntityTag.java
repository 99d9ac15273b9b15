package freshet.http.caching;

import freshet.http.binding.Controls.Format;
import freshet.method.Method;
import java.util.HexFormat;
import java.util.List;

/** Strong entity tags: equal for requests whose answers are equal byte for byte, whatever machine made them. */
public final class EntityTag {

    private static final long MIX = 0x9E3779B97F4A7C15L;

    private EntityTag() {}

    /** A number that differs between calculations, between versions of their methods, and between releases. */
    public static long seed(String path, List<Method> methods, String release) {
        long seed = mix(release.hashCode(), path.hashCode());
        for (Method method : methods) {
            seed = mix(mix(seed, method.id().hashCode()), method.version());
        }
        return seed;
    }

    /** The tag of an answer: quoted, as the header holds it. */
    public static String of(long seed, long fingerprint, Format format, boolean compact) {
        return "\"" + HexFormat.of().toHexDigits(mix(mix(seed, fingerprint), 2L * format.ordinal() + (compact ? 1 : 0)))
                + "\"";
    }

    /** Whether the value of an If-None-Match header names {@code tag}. */
    public static boolean matches(String header, String tag) {
        if (header.equals(tag) || header.strip().equals("*")) {
            return true;
        }
        for (String candidate : header.split(",", -1)) {
            String stripped = candidate.strip();
            if (stripped.equals(tag) || stripped.equals("W/" + tag)) {
                return true;
            }
        }
        return false;
    }

    private static long mix(long hash, long value) {
        long mixed = (hash ^ value) * MIX;
        return mixed ^ (mixed >>> 32);
    }
}
