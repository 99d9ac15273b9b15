package freshet.http.binding;

import freshet.quantity.Choice;
import freshet.quantity.Default;
import freshet.quantity.Flag;
import org.jspecify.annotations.Nullable;

/**
 * How an answer is wanted; always in the query, never in a body.
 *
 * @param format media of the answer; null leaves it to the Accept header
 * @param view how much the answer says
 * @param strict whether inputs outside the range the method's source states are refused
 */
public record Controls(
        @Choice("Media of the answer; beats the Accept header") @Nullable
        Format format,

        @Default("full") @Choice("compact drops reference and links and turns notices into the one string notice_codes")
        View view,

        @Default("false") @Flag("Refuse inputs outside the range that the method's source states")
        Boolean strict) {

    /** Media of an answer. */
    public enum Format implements Medium {
        /** One JSON object. */
        JSON("application/json"),
        /** A table after RFC 4180. */
        CSV("text/csv"),
        /** One CBOR map (RFC 8949); flat answers only. */
        CBOR("application/cbor"),
        /** A C99 header; limit tables only. */
        C("text/x-c");

        private final String mediaType;

        Format(String mediaType) {
            this.mediaType = mediaType;
        }

        @Override
        public String mediaType() {
            return mediaType;
        }
    }

    /** How much an answer says. */
    public enum View {
        /** Everything. */
        FULL,
        /** What a controller with little memory needs. */
        COMPACT
    }

    /** What they are called, and what they take. */
    public static final Shape<Controls> SHAPE = Shape.of(Controls.class);

    /** Whether the compact view is wanted. */
    public boolean compact() {
        return view == View.COMPACT;
    }

    /** Whether a query that may be faulty asks for the compact view. */
    public static boolean compactAsked(@Nullable String query) {
        return query != null && ("&" + query + "&").contains("&view=compact&");
    }
}
