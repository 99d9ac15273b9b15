package freshet.http.media;

import freshet.http.binding.SeriesControls.Format;

/** Writes numbers the way answers do, in rows that look like answers of a speciation, without computing any. */
public final class SameBytes {

    private static final String[] NAMES = {
        "nh3_n_mg_per_l", "nh3_mg_per_l", "nh4_n_mg_per_l", "nh4_mg_per_l", "nh3_fraction", "pka"
    };
    private static final String REST = "\"method\":\"emerson-1975\",\"method_version\":\"1\","
            + "\"reference\":\"Emerson et al. 1975, doi:10.1139/f75-274\",\"validity\":\"within\"}\n";

    private final boolean csv;
    private final Bytes[] keys = new Bytes[NAMES.length];
    private final byte[] rest;

    /** Writes rows of the given medium. */
    public SameBytes(Format format) {
        csv = format == Format.CSV;
        rest = (csv ? "within,,\r\n" : REST).getBytes(java.nio.charset.StandardCharsets.US_ASCII);
        for (int i = 0; i < NAMES.length; i++) {
            keys[i] = new Bytes(32);
            JsonText.key(NAMES[i], keys[i]);
        }
    }

    /** Appends a row; {@code values} are what was read. */
    public void row(double[] values, Bytes out) {
        for (int i = 0; csv && i < values.length; i++) {
            SixDigits.write(values[i], out);
            out.put(',');
        }
        for (int i = 0; i < NAMES.length; i++) {
            if (!csv) {
                out.put(keys[i].array(), 0, keys[i].length());
            }
            // A third has as many digits as a result.
            SixDigits.write(values[i % values.length] / 3, out);
            out.put(',');
        }
        out.put(rest);
    }
}
