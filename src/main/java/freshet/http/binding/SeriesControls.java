package freshet.http.binding;

import freshet.quantity.Choice;
import freshet.quantity.Default;
import freshet.quantity.Flag;
import org.jspecify.annotations.Nullable;

/**
 * How the answers of a series are wanted; always in the query.
 *
 * @param format media of the answer; null leaves it to the Accept header, and that to the body's own
 * @param view how much an answer says
 * @param strict whether a row outside the range the method's source states is refused
 * @param atomic whether one bad row refuses all of them
 * @param csv how a table is written
 */
public record SeriesControls(
        @Choice("Media of the answer; beats the Accept header; by default that of the body") @Nullable
        Format format,

        @Default("full") @Choice("compact drops reference and turns notices into the one string notice_codes")
        Controls.View view,

        @Default("false") @Flag("Refuse rows outside the range that the method's source states")
        Boolean strict,

        @Default("false") @Flag("Refuse all rows if one is bad; JSON bodies only")
        Boolean atomic,

        @Choice("How tables are read and written; semicolon implies the decimal comma; by default comma") @Nullable
        Separator csv) {

    /** Media of a series. */
    public enum Format implements Medium {
        /** One JSON object that holds the rows as items. */
        JSON("application/json"),
        /** A table after RFC 4180. */
        CSV("text/csv"),
        /** One JSON object on each line. */
        NDJSON("application/x-ndjson");

        private final String mediaType;

        Format(String mediaType) {
            this.mediaType = mediaType;
        }

        @Override
        public String mediaType() {
            return mediaType;
        }
    }

    /** What stands between the cells of a table. */
    public enum Separator {
        /** Commas; numbers have a decimal point. */
        COMMA,
        /** Semicolons; numbers have a decimal comma. */
        SEMICOLON
    }

    /** What they are called, and what they take. */
    public static final Shape<SeriesControls> SHAPE = Shape.of(SeriesControls.class);

    /** Whether the compact view is wanted. */
    public boolean compact() {
        return view == Controls.View.COMPACT;
    }

    /** Whether semicolons separate the cells of tables and numbers have a decimal comma. */
    public boolean decimalComma() {
        return csv == Separator.SEMICOLON;
    }
}
