package freshet.catalogue.openapi;

import freshet.answer.Answer;
import freshet.http.Calculation;
import freshet.http.binding.Controls.Format;
import freshet.http.binding.Input;
import freshet.http.binding.Request;
import freshet.http.media.AnswerWriter;
import freshet.http.media.Bytes;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.Map;
import tools.jackson.databind.DeserializationFeature;
import tools.jackson.databind.json.JsonMapper;

/**
 * The example of a calculation with its real answer, computed when the document is made.
 *
 * @param inputs the inputs by name
 * @param answer the answer
 */
public record Example(Map<String, Object> inputs, Object answer) {

    private static final JsonMapper MAPPER = JsonMapper.builder()
            .enable(DeserializationFeature.USE_BIG_DECIMAL_FOR_FLOATS)
            .build();

    static <I extends Record, O extends Record> Example of(Calculation<I, O> calculation) {
        Request<I> request = Request.fromQuery(calculation.inputs(), calculation.example());
        Answer<O> answer = calculation.function().apply(request.inputs());
        Bytes json = AnswerWriter.of(Format.JSON, calculation.outputs()).write(answer, false);
        return new Example(
                inputs(calculation),
                MAPPER.readValue(new String(json.array(), 0, json.length(), StandardCharsets.UTF_8), Object.class));
    }

    /** The inputs of the example, those of a group in a map of their own. */
    static Map<String, Object> inputs(Calculation<?, ?> calculation) {
        Map<String, Object> inputs = new LinkedHashMap<>();
        for (String pair : calculation.example().split("&", -1)) {
            String[] parts = pair.split("=", 2);
            Input input = calculation.inputs().input(parts[0]);
            put(inputs, parts[0], Schemas.value(input, parts[1]));
        }
        return inputs;
    }

    @SuppressWarnings("unchecked")
    private static void put(Map<String, Object> inputs, String name, Object value) {
        int point = name.indexOf('.');
        if (point < 0) {
            inputs.put(name, value);
        } else {
            Object group = inputs.computeIfAbsent(name.substring(0, point), added -> new LinkedHashMap<>());
            put((Map<String, Object>) group, name.substring(point + 1), value);
        }
    }

    /** The inputs of the example as a JSON object. */
    public static String json(Calculation<?, ?> calculation) {
        return MAPPER.writeValueAsString(inputs(calculation));
    }
}
