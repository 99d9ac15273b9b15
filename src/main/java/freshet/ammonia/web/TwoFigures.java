package freshet.ammonia.web;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/** Criteria as regulations print and compare them, for sentences only: two significant figures, half up. */
final class TwoFigures {

    private static final MathContext ROUNDING = new MathContext(2, RoundingMode.HALF_UP);

    private TwoFigures() {}

    static String text(double value) {
        return new BigDecimal(value).round(ROUNDING).toPlainString();
    }
}
