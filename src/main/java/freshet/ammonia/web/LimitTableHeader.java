package freshet.ammonia.web;

import freshet.answer.Answer;
import freshet.http.media.Bytes;
import freshet.http.media.SixDigits;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.stream.Collectors;

/** A table of limits as a table, and as a C99 header that includes nothing and is the same every day. */
final class LimitTableHeader {

    private static final String HEADER = """
            /* Limits of total ammonia as N, mg/L, by pH and temperature, for days without a network.
             * Limit of un-ionized ammonia as N: %s mg/L. Interpolated linearly it lies nowhere above the exact limit
             * and at most %s %% below. A table never replaces a reading; it holds for one salinity.
             * Method: %s, version %s. %s
             */
            #ifdef FRESHET_TAN_LIMIT_H
            #error "Two tables of limits in one file: the second would be taken for the first"
            #endif
            #define FRESHET_TAN_LIMIT_H

            #ifdef __FAST_MATH__
            #error "With -ffast-math a reading that is not a number would pass for a safe one"
            #endif

            #define FRESHET_PH_COUNT %d
            #define FRESHET_TEMPERATURE_COUNT %d

            static const float freshet_ph_min = %s;
            static const float freshet_ph_max = %s;
            static const float freshet_ph_step = %s;
            static const float freshet_temperature_min_c = %s;
            static const float freshet_temperature_max_c = %s;
            static const float freshet_temperature_step_c = %s;

            /* A row for each pH, in it a value for each temperature. */
            static const float freshet_tan_limit[FRESHET_PH_COUNT][FRESHET_TEMPERATURE_COUNT] = {
            %s
            };

            /* Limit of total ammonia as N, mg/L. Below the first node the edge holds; above the last, or for what is not a
             * number, it is 0, so that every comparison raises an alarm. A reading that no water has, as 0 or -127, comes
             * from a broken sensor: look for that before. */
            static inline float freshet_tan_limit_mg_per_l(float ph, float temperature_c) {
                float y, x, low, high;
                int row, column;
                if (!(ph <= freshet_ph_max) || !(temperature_c <= freshet_temperature_max_c)) {
                    return 0.0f;
                }
                y = ph > freshet_ph_min ? (ph - freshet_ph_min) / freshet_ph_step : 0.0f;
                x = temperature_c > freshet_temperature_min_c
                    ? (temperature_c - freshet_temperature_min_c) / freshet_temperature_step_c : 0.0f;
                row = (int)y < FRESHET_PH_COUNT - 2 ? (int)y : FRESHET_PH_COUNT - 2;
                column = (int)x < FRESHET_TEMPERATURE_COUNT - 2 ? (int)x : FRESHET_TEMPERATURE_COUNT - 2;
                y -= (float)row;
                x -= (float)column;
                y = y > 1.0f ? 1.0f : y;
                x = x > 1.0f ? 1.0f : x;
                low = freshet_tan_limit[row][column]
                    + x * (freshet_tan_limit[row][column + 1] - freshet_tan_limit[row][column]);
                high = freshet_tan_limit[row + 1][column]
                    + x * (freshet_tan_limit[row + 1][column + 1] - freshet_tan_limit[row + 1][column]);
                return low + y * (high - low);
            }
            """;

    private LimitTableHeader() {}

    static Bytes of(Answer<AmmoniaLimitTableResponse> answer) {
        AmmoniaLimitTableResponse table = answer.result();
        List<Double> ph = table.ph();
        List<Double> temperature = table.temperatureC();
        String rows = table.tanLimitMgPerL().stream()
                .map(row -> row.stream().map(LimitTableHeader::literal).collect(Collectors.joining(", ", "    {", "}")))
                .collect(Collectors.joining(",\n"));
        byte[] text = HEADER.formatted(
                        SixDigits.text(table.nh3NLimitMgPerL()),
                        SixDigits.text(table.interpolationLossPercent()),
                        answer.method().id(),
                        answer.method().version(),
                        answer.method().citation().reference(),
                        ph.size(),
                        temperature.size(),
                        literal(ph.get(0)),
                        literal(ph.get(ph.size() - 1)),
                        literal(ph.get(1) - ph.get(0)),
                        literal(temperature.get(0)),
                        literal(temperature.get(temperature.size() - 1)),
                        literal(temperature.get(1) - temperature.get(0)),
                        rows)
                .getBytes(StandardCharsets.US_ASCII);
        Bytes bytes = new Bytes(text.length);
        bytes.put(text);
        return bytes;
    }

    /** The same as a table: a row for each pH, a column for each temperature. */
    static Bytes csv(Answer<AmmoniaLimitTableResponse> answer) {
        AmmoniaLimitTableResponse table = answer.result();
        StringBuilder text = new StringBuilder("ph");
        table.temperatureC().forEach(t -> text.append(",").append(SixDigits.text(t)));
        for (int row = 0; row < table.ph().size(); row++) {
            text.append("\r\n").append(SixDigits.text(table.ph().get(row)));
            table.tanLimitMgPerL().get(row).forEach(limit -> text.append(",").append(SixDigits.text(limit)));
        }
        byte[] bytes = text.append("\r\n").toString().getBytes(StandardCharsets.US_ASCII);
        Bytes out = new Bytes(bytes.length);
        out.put(bytes);
        return out;
    }

    private static String literal(double value) {
        String text = SixDigits.text(value);
        return text + (text.indexOf('.') < 0 ? ".0f" : "f");
    }
}
