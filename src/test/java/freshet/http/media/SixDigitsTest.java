package freshet.http.media;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.SplittableRandom;
import java.util.stream.DoubleStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Printed numbers against exact decimal arithmetic. */
class SixDigitsTest {

    private static final MathContext ROUNDING = new MathContext(6, RoundingMode.HALF_EVEN);

    @ParameterizedTest
    @CsvSource({
        "0, 0",
        "-0.0, 0",
        "1, 1",
        "-2.5, -2.5",
        "0.1, 0.1",
        "1234567, 1234570",
        "0.00000123456789, 0.00000123457",
        "999999.5, 1000000",
        "99999.96, 100000",
        "1e-12, 0.000000000001",
        "9.99e-13, 0",
        "4.9e-324, 0",
        "999999499999999, 999999000000000",
        "0.3, 0.3",
        "100, 100",
        "1e14, 100000000000000",
    })
    void numbersAreWrittenPlainly(double value, String text) {
        assertThat(SixDigits.text(value)).isEqualTo(text);
    }

    @ParameterizedTest
    @CsvSource({"1e15, 1e15 or more", "Infinity, 1e15 or more", "-1e300, -1e15 or less", "NaN, unknown"})
    void whatIsNotPrintedIsToldByItsSize(double value, String text) {
        assertThat(SixDigits.text(value)).isEqualTo(text);
    }

    @Test
    void aMillionRandomValuesAgreeWithExactArithmetic() {
        SplittableRandom random = new SplittableRandom(6);
        for (int i = 0; i < 1_000_000; i++) {
            double size = Math.pow(10, random.nextDouble(-12, 14));
            check(random.nextBoolean() ? size : -size);
        }
    }

    @Test
    void tiesAndTheirNeighboursAgreeWithExactArithmetic() {
        SplittableRandom random = new SplittableRandom(7);
        for (int i = 0; i < 100_000; i++) {
            double tie = (random.nextInt(100_000, 1_000_000) + 0.5) * Math.pow(10, random.nextInt(-17, 9));
            around(tie).forEach(SixDigitsTest::check);
            double binaryTie = (random.nextInt(100_000, 1_000_000) * 2 + 1) / 2.0;
            around(binaryTie).forEach(SixDigitsTest::check);
            check(random.nextInt(1_000_000) / 1024.0);
        }
    }

    @Test
    void powersOfTenAndTheirNeighboursAgreeWithExactArithmetic() {
        for (int exponent = -13; exponent < 15; exponent++) {
            for (double factor : new double[] {1, 0.9999995, 0.99999949999, 9.999995, 5}) {
                around(factor * Double.parseDouble("1e" + exponent)).forEach(SixDigitsTest::check);
            }
        }
    }

    private static DoubleStream around(double value) {
        return DoubleStream.of(Math.nextDown(value), value, Math.nextUp(value))
                .filter(number -> Math.abs(number) < SixDigits.TOO_LARGE);
    }

    private static void check(double value) {
        String exact = Math.abs(value) < 1e-12
                ? "0"
                : new BigDecimal(value).round(ROUNDING).stripTrailingZeros().toPlainString();
        if (!SixDigits.text(value).equals(exact)) {
            assertThat(SixDigits.text(value)).as("%s", new BigDecimal(value)).isEqualTo(exact);
        }
    }
}
