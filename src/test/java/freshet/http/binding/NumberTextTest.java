package freshet.http.binding;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.SplittableRandom;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class NumberTextTest {

    /** The grammar of RFC 8259, section 6, as a regular expression. */
    private static final Pattern RFC_8259 = Pattern.compile("-?(0|[1-9][0-9]*)(\\.[0-9]+)?([eE][+-]?[0-9]+)?");

    @ParameterizedTest
    @ValueSource(strings = {"0", "-0", "7", "7.5", "-0.001", "1e5", "1E+2", "2.5e-3", "1e999", "100"})
    void whatRfc8259AllowsIsANumber(String text) {
        assertThat(NumberText.isNumber(text)).isTrue();
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "",
                "-",
                "+5",
                ".5",
                "5.",
                "1.e3",
                "01",
                "-01",
                "7,5",
                "0x1p3",
                "NaN",
                "Infinity",
                "-Infinity",
                "1e",
                "1e+",
                "8.1d",
                " 5",
                "5 ",
                "1_000",
                "1 000",
                "٣",
                "1e1.5",
                "--1",
                "123456789012345678901234567890123"
            })
    void anythingElseIsNot(String text) {
        assertThat(NumberText.isNumber(text)).isFalse();
    }

    @Test
    void randomTextIsJudgedAsTheGrammarJudgesIt() {
        SplittableRandom random = new SplittableRandom(8259);
        String alphabet = "0123456789000+-..eE x,";
        for (int i = 0; i < 500_000; i++) {
            StringBuilder text = new StringBuilder();
            for (int n = random.nextInt(12); n > 0; n--) {
                text.append(alphabet.charAt(random.nextInt(alphabet.length())));
            }
            assertThat(NumberText.isNumber(text.toString()))
                    .as(text.toString())
                    .isEqualTo(RFC_8259.matcher(text).matches());
            NumberText.corrected(text.toString())
                    .ifPresent(spelling -> assertThat(NumberText.isNumber(spelling))
                            .as(spelling)
                            .isTrue());
        }
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                ".5|0.5",
                "+5|5",
                "7,5|7.5",
                " 8.1 |8.1",
                "8.1d|8.1",
                "007|7",
                "5.|5",
                "-.5|-0.5",
                "'25'|25",
                "00|0"
            })
    void theSpellingThatWasMeantIsShown(String text, String meant) {
        assertThat(NumberText.corrected(text)).contains(meant);
    }

    @ParameterizedTest
    @ValueSource(strings = {"NaN", "0x1p3", "five", "1,000.5", "-", "", ",", "1e9999"})
    void whereNothingWasSurelyMeantNothingIsShown(String text) {
        assertThat(NumberText.corrected(text)).isEmpty();
    }
}
