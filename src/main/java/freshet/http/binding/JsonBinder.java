package freshet.http.binding;

import freshet.answer.Fault;
import java.util.List;
import tools.jackson.core.JacksonException;
import tools.jackson.core.JsonParser;
import tools.jackson.core.JsonToken;
import tools.jackson.core.ObjectReadContext;
import tools.jackson.core.StreamReadConstraints;
import tools.jackson.core.json.JsonFactory;
import tools.jackson.core.json.JsonReadFeature;

/** Reads one JSON object in one pass. */
final class JsonBinder {

    /** Lenient towards numbers only, so that a wrong spelling can be named; {@link NumberText} then refuses it. */
    private static final JsonFactory FACTORY = JsonFactory.builder()
            .enable(JsonReadFeature.ALLOW_NON_NUMERIC_NUMBERS)
            .enable(JsonReadFeature.ALLOW_LEADING_PLUS_SIGN_FOR_NUMBERS)
            .enable(JsonReadFeature.ALLOW_LEADING_DECIMAL_POINT_FOR_NUMBERS)
            .enable(JsonReadFeature.ALLOW_TRAILING_DECIMAL_POINT_FOR_NUMBERS)
            .enable(JsonReadFeature.ALLOW_LEADING_ZEROS_FOR_NUMBERS)
            .streamReadConstraints(StreamReadConstraints.builder()
                    .maxNestingDepth(100)
                    .maxNumberLength(70_000)
                    .build())
            .build();

    private JsonBinder() {}

    static void read(byte[] body, Draft<?> inputs, List<Fault> faults) {
        try (JsonParser parser = FACTORY.createParser(ObjectReadContext.empty(), body)) {
            if (parser.nextToken() != JsonToken.START_OBJECT) {
                throw new UnreadableBody("The body must be one JSON object that holds the inputs.");
            }
            while (parser.nextToken() == JsonToken.PROPERTY_NAME) {
                member(parser, inputs, faults);
            }
            if (parser.nextToken() != null) {
                throw new UnreadableBody("The body must end after one JSON object.");
            }
        } catch (JacksonException malformed) {
            throw UnreadableBody.at(malformed);
        }
    }

    private static void member(JsonParser parser, Draft<?> inputs, List<Fault> faults) {
        String name = parser.currentName();
        Shape.Entry entry = inputs.entry(name);
        JsonToken token = parser.nextToken();
        if (entry == null) {
            parser.skipChildren();
            faults.add(
                    Controls.SHAPE.entry(name) == null
                            ? Wording.unknown(name, inputs.names())
                            : Wording.belongsInQuery(name));
        } else {
            value(parser, token, entry, inputs);
        }
    }

    private static void value(JsonParser parser, JsonToken token, Shape.Entry entry, Draft<?> inputs) {
        Input input = entry.input();
        boolean fits = switch (token) {
            case VALUE_NUMBER_INT, VALUE_NUMBER_FLOAT -> input.numeric();
            case VALUE_STRING -> input.kind() == Input.Kind.CHOICE;
            case VALUE_TRUE, VALUE_FALSE -> input.kind() == Input.Kind.FLAG;
            default -> false;
        };
        if (token == JsonToken.VALUE_NULL) {
            inputs.nothing(entry);
        } else if (fits) {
            inputs.text(entry, parser.getString());
        } else {
            String text = token.isStructStart() ? token.asString() + "…" : parser.getString();
            inputs.misfit(entry, text);
            parser.skipChildren();
        }
    }
}
