package freshet.http.binding;

import java.io.InputStream;
import java.util.Collection;
import org.jspecify.annotations.Nullable;
import tools.jackson.core.JacksonException;
import tools.jackson.core.JsonParser;
import tools.jackson.core.JsonToken;
import tools.jackson.core.ObjectReadContext;
import tools.jackson.core.StreamReadConstraints;
import tools.jackson.core.json.JsonFactory;
import tools.jackson.core.json.JsonReadFeature;
import tools.jackson.core.sym.PropertyNameMatcher;
import tools.jackson.core.util.Named;

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
                    .maxStringLength(70_000)
                    .build())
            .build();

    private static final int END = PropertyNameMatcher.MATCH_END_OBJECT;

    private JsonBinder() {}

    static PropertyNameMatcher matcher(Collection<String> names) {
        return FACTORY.constructNameMatcher(
                names.stream().map(Named::fromString).toList(), false);
    }

    /** A parser of a document that is too large to be held. */
    static JsonParser parser(InputStream body) {
        return FACTORY.createParser(ObjectReadContext.empty(), body);
    }

    /** Reads a body that is one object. */
    static void read(byte[] body, Draft<?> inputs) {
        try (JsonParser parser = FACTORY.createParser(ObjectReadContext.empty(), body)) {
            line(parser, inputs, null);
            if (parser.nextToken() != null) {
                throw notOneObject(null);
            }
        } catch (JacksonException malformed) {
            throw UnreadableBody.at(malformed, whole(null));
        }
    }

    /** Reads the one object of a line of a series, which has a tag, or of a body, which has none. */
    static void line(JsonParser parser, Draft<?> inputs, @Nullable Tag tag) {
        try {
            if (parser.nextToken() != JsonToken.START_OBJECT) {
                throw new UnreadableBody("The " + whole(tag) + " must be one JSON object that holds the inputs.");
            }
            members(parser, "", inputs, tag);
        } catch (JacksonException malformed) {
            throw UnreadableBody.at(malformed, whole(tag));
        }
    }

    static UnreadableBody notOneObject(@Nullable Tag tag) {
        return new UnreadableBody("The " + whole(tag) + " must end after one JSON object.");
    }

    /** Reads the rest of an object whose brace was read; its inputs have names that begin with {@code prefix}. */
    static void members(JsonParser parser, String prefix, Draft<?> inputs, @Nullable Tag tag) {
        for (int match = name(parser, prefix, inputs); match != END; match = name(parser, prefix, inputs)) {
            if (match >= 0) {
                value(parser, parser.nextToken(), inputs.shape().matched(match), inputs);
            } else {
                other(parser, prefix + parser.currentName(), inputs, tag);
            }
        }
    }

    /** Reads the next name; tells which input it is, if that is plain to see, or that the object ends. */
    private static int name(JsonParser parser, String prefix, Draft<?> inputs) {
        if (prefix.isEmpty()) {
            int match = parser.nextNameMatch(inputs.shape().matcher());
            return match == PropertyNameMatcher.MATCH_ODD_TOKEN ? END : match;
        }
        return parser.nextToken() == JsonToken.PROPERTY_NAME ? PropertyNameMatcher.MATCH_UNKNOWN_NAME : END;
    }

    private static void other(JsonParser parser, String name, Draft<?> inputs, @Nullable Tag tag) {
        Shape.Entry entry = inputs.entry(name);
        JsonToken token = parser.nextToken();
        if (entry != null) {
            value(parser, token, entry, inputs);
        } else if (tag != null && name.equals(Tag.NAME)) {
            tag.read(parser, token, inputs.faults());
        } else if (inputs.isGroup(name)) {
            group(parser, name, token, inputs);
        } else {
            parser.skipChildren();
            inputs.faults()
                    .add(
                            Controls.SHAPE.entry(name) == null
                                    ? Wording.unknown(name, inputs.names())
                                    : Wording.belongsInQuery(name));
        }
    }

    private static String whole(@Nullable Tag tag) {
        return tag == null ? "body" : "row";
    }

    private static void group(JsonParser parser, String name, JsonToken token, Draft<?> inputs) {
        if (token == JsonToken.START_OBJECT) {
            members(parser, name + ".", inputs, null);
        } else if (token != JsonToken.VALUE_NULL) {
            parser.skipChildren();
            inputs.faults().add(Wording.notAnObject(name));
        }
    }

    private static void value(JsonParser parser, JsonToken token, Shape.Entry entry, Draft<?> inputs) {
        Input input = entry.input();
        boolean fits = switch (token) {
            case VALUE_NUMBER_INT, VALUE_NUMBER_FLOAT -> input.numeric();
            case VALUE_STRING -> input.enumerated();
            case VALUE_TRUE, VALUE_FALSE -> input.kind() == Input.Kind.FLAG;
            default -> false;
        };
        if (token == JsonToken.VALUE_NULL) {
            inputs.nothing(entry);
        } else if (fits) {
            if (!token.isNumeric()
                    || !inputs.plain(
                            entry, parser.getStringCharacters(), parser.getStringOffset(), parser.getStringLength())) {
                inputs.text(entry, parser.getString());
            }
        } else {
            String text = token.isStructStart() ? token.asString() + "…" : parser.getString();
            inputs.misfit(entry, text);
            parser.skipChildren();
        }
    }
}
