package freshet.http.media;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.nio.charset.StandardCharsets;

/**
 * Numbers as answers print them: the exact value of the double rounded half-even to 6 significant digits; plain
 * decimals, no exponent, no trailing zeros; below 1e-12 in size 0.
 */
public final class SixDigits {

    /** Results of this size and above are not printed. */
    public static final double TOO_LARGE = 1e15;

    private static final double TOO_SMALL = 1e-12;
    private static final MathContext ROUNDING = new MathContext(6, RoundingMode.HALF_EVEN);
    private static final double TIE_MARGIN = 1e-8;
    private static final double[] POWERS = new double[23];
    private static final int LEAST_BINARY_EXPONENT = Math.getExponent(TOO_SMALL);
    /** Largest e with 10^e not above 2^k, for each binary exponent k. */
    private static final int[] EXPONENTS = new int[Math.getExponent(TOO_LARGE) - LEAST_BINARY_EXPONENT + 1];

    static {
        for (int i = 0; i < EXPONENTS.length; i++) {
            EXPONENTS[i] = (int) Math.floor((i + LEAST_BINARY_EXPONENT) * StrictMath.log10(2));
        }
        for (int i = 0; i < POWERS.length; i++) {
            POWERS[i] = Double.parseDouble("1e" + i);
        }
    }

    private SixDigits() {}

    /** {@code value} as text for a sentence; one that answers do not print is told by its size. */
    public static String text(double value) {
        if (!(Math.abs(value) < TOO_LARGE)) {
            return Double.isNaN(value) ? "unknown" : value < 0 ? "-1e15 or less" : "1e15 or more";
        }
        Bytes bytes = new Bytes(24);
        write(value, bytes);
        return new String(bytes.array(), 0, bytes.length(), StandardCharsets.US_ASCII);
    }

    /** The number that the text of {@code value} denotes. */
    public static double rounded(double value) {
        return Double.parseDouble(text(value));
    }

    /** Appends {@code value}, which must be smaller than 1e15 in size. */
    static void write(double value, Bytes out) {
        double size = Math.abs(value);
        if (size < TOO_SMALL) {
            out.put('0');
            return;
        }
        if (value < 0) {
            out.put('-');
        }
        int exponent = EXPONENTS[Math.getExponent(size) - LEAST_BINARY_EXPONENT];
        double scaled = scaled(size, exponent);
        if (scaled >= 1e6) {
            exponent++;
            scaled = scaled(size, exponent);
        }
        int digits = (int) scaled;
        double rest = scaled - digits;
        if (Math.abs(rest - 0.5) < TIE_MARGIN) {
            // Scaling is off by at most half a unit in the last place: near a tie only the exact value decides.
            digits = new BigDecimal(size)
                    .round(ROUNDING)
                    .movePointRight(5 - exponent)
                    .intValueExact();
        } else if (rest > 0.5) {
            digits++;
        }
        print(digits, exponent, out);
    }

    private static double scaled(double size, int exponent) {
        int power = 5 - exponent;
        return power >= 0 ? size * POWERS[power] : size / POWERS[-power];
    }

    /** Prints digits x 10^(exponent - 5), digits having six places or being 1000000. */
    private static void print(int digits, int exponent, Bytes out) {
        boolean carried = digits == 1_000_000;
        int six = carried ? 100_000 : digits;
        int significant = 6;
        for (int left = six; left % 10 == 0; left /= 10) {
            significant--;
        }
        out.putDecimal(six, significant, carried ? exponent + 2 : exponent + 1);
    }
}
