package freshet.http.binding;

import java.math.BigDecimal;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Numbers as RFC 8259 writes them, at most 32 characters. */
final class NumberText {

    private static final int LONGEST = 32;
    private static final int SHORT = 15;
    private static final double[] POWERS = {
        1, 1e1, 1e2, 1e3, 1e4, 1e5, 1e6, 1e7, 1e8, 1e9, 1e10, 1e11, 1e12, 1e13, 1e14, 1e15
    };
    private static final Pattern MEANT = Pattern.compile(
            "[\\s\"']*([+-]?)0*(?=[.,]?[0-9])([0-9]*)(?:[.,]([0-9]*))?(?:[eE]([+-]?[0-9]{1,3}))?[fFdD]?[\\s\"']*");

    private NumberText() {}

    /** The double nearest to the number; NaN if the text is none. */
    static double read(String text) {
        double plain = plain(text.toCharArray(), 0, text.length());
        return !Double.isNaN(plain) || !isNumber(text) ? plain : Double.parseDouble(text);
    }

    /**
     * The value of a decimal that is short enough for its digits and its power of ten to be exact doubles, so that their
     * quotient is the nearest double (Clinger 1990); NaN for every other text.
     */
    static double plain(char[] text, int offset, int length) {
        int end = offset + length;
        int start = length > 0 && text[offset] == '-' ? offset + 1 : offset;
        if (start == end || end - start > SHORT || text[start] == '0' && start + 1 < end && text[start + 1] != '.') {
            return Double.NaN;
        }
        long digits = 0;
        int point = end;
        for (int i = start; i < end; i++) {
            int digit = text[i] - '0';
            if (digit >= 0 && digit <= 9) {
                digits = 10 * digits + digit;
            } else if (digit == '.' - '0' && point == end && i > start && i + 1 < end) {
                point = i + 1;
            } else {
                return Double.NaN;
            }
        }
        double value = digits / POWERS[end - point];
        return start == offset ? value : -value;
    }

    /** Whether the text is a number in the grammar of RFC 8259 and not too long. */
    static boolean isNumber(String text) {
        int length = text.length();
        if (length == 0 || length > LONGEST) {
            return false;
        }
        int i = text.charAt(0) == '-' ? 1 : 0;
        int whole = digits(text, i);
        if (whole == i || (text.charAt(i) == '0' && whole > i + 1)) {
            return false;
        }
        i = whole;
        if (i < length && text.charAt(i) == '.') {
            int fraction = digits(text, i + 1);
            if (fraction == i + 1) {
                return false;
            }
            i = fraction;
        }
        return i == length || isExponent(text, i);
    }

    /** How a text that is not a number was probably meant, spelled as RFC 8259 does. */
    static Optional<String> corrected(String text) {
        Matcher matcher = MEANT.matcher(text.length() > 2 * LONGEST ? "" : text);
        if (!matcher.matches()) {
            return Optional.empty();
        }
        String whole = matcher.group(2).isEmpty() ? "0" : matcher.group(2);
        String fraction = matcher.group(3) == null || matcher.group(3).isEmpty() ? "" : "." + matcher.group(3);
        String exponent = matcher.group(4) == null ? "" : "e" + matcher.group(4);
        String sign = "-".equals(matcher.group(1)) ? "-" : "";
        String spelling = sign + whole + fraction + exponent;
        return isNumber(spelling) ? Optional.of(spelling) : shortest(spelling);
    }

    private static Optional<String> shortest(String spelling) {
        String rounded = Double.toString(new BigDecimal(spelling).doubleValue());
        return isNumber(rounded) ? Optional.of(rounded) : Optional.empty();
    }

    private static boolean isExponent(String text, int from) {
        int i = from;
        if (text.charAt(i) != 'e' && text.charAt(i) != 'E') {
            return false;
        }
        i++;
        if (i < text.length() && (text.charAt(i) == '+' || text.charAt(i) == '-')) {
            i++;
        }
        return i < text.length() && digits(text, i) == text.length();
    }

    private static int digits(String text, int from) {
        int i = from;
        while (i < text.length() && text.charAt(i) >= '0' && text.charAt(i) <= '9') {
            i++;
        }
        return i;
    }
}
