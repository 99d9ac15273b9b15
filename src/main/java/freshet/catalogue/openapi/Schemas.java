package freshet.catalogue.openapi;

import freshet.http.binding.Input;
import freshet.http.binding.Spelling;
import freshet.http.media.Column;
import freshet.http.media.SixDigits;
import io.swagger.v3.oas.models.SpecVersion;
import io.swagger.v3.oas.models.media.Schema;
import java.math.BigDecimal;
import java.util.List;
import java.util.Set;

/** Schemas of single inputs and outputs. */
final class Schemas {

    private Schemas() {}

    static Schema<Object> ofType(String type) {
        Schema<Object> schema = new Schema<>(SpecVersion.V31);
        schema.setTypes(Set.of(type));
        return schema;
    }

    static Schema<Object> text(String description) {
        return describe(ofType("string"), description);
    }

    static Schema<Object> reference(String name) {
        Schema<Object> schema = new Schema<>(SpecVersion.V31);
        schema.set$ref("#/components/schemas/" + name);
        return schema;
    }

    static Schema<Object> listOf(String name) {
        return items(ofType("array"), reference(name));
    }

    static Schema<Object> items(Schema<Object> array, Schema<Object> item) {
        array.setItems(item);
        return array;
    }

    static Schema<Object> describe(Schema<Object> schema, String description) {
        schema.setDescription(description);
        return schema;
    }

    static Schema<Object> choice(List<String> values) {
        Schema<Object> schema = ofType("string");
        schema.setEnum(List.copyOf(values));
        return schema;
    }

    /** The value of an input under one of its names. */
    static Schema<Object> of(Input input, Spelling spelling) {
        Schema<Object> schema = switch (input.kind()) {
            case NUMBER -> bounded(ofType("number"), input, spelling);
            case WHOLE -> bounded(ofType("integer"), input, spelling);
            case FLAG -> ofType("boolean");
            case CHOICE -> choice(input.allowed());
            case LIST -> text("");
        };
        schema.setDescription(description(input, spelling));
        if (spelling.name().equals(input.name())) {
            input.defaultText().ifPresent(text -> schema.setDefault(value(input, text)));
        } else {
            schema.addExtension("x-alternative-to", input.name());
        }
        return schema;
    }

    /** An output of an answer. */
    static Schema<Object> of(Column column) {
        Schema<Object> schema = switch (column.kind()) {
            case NUMBER -> ofType("number");
            case WHOLE -> ofType("integer");
            case FLAG -> ofType("boolean");
            case TEXT -> choice(column.choices());
            case ROWS -> ofType("array");
            case NUMBERS -> items(ofType("array"), ofType("number"));
            case MATRIX -> items(ofType("array"), items(ofType("array"), ofType("number")));
        };
        if (column.kind() == Column.Kind.NUMBER || column.kind() == Column.Kind.WHOLE) {
            schema.addExtension("x-unit", column.unit().ucum());
        }
        return describe(schema, column.meaning());
    }

    /** {@code text} as the value that the schema of {@code input} describes. */
    static Object value(Input input, String text) {
        return switch (input.kind()) {
            case NUMBER, WHOLE -> new BigDecimal(text);
            case FLAG -> Boolean.valueOf(text);
            case CHOICE, LIST -> text;
        };
    }

    private static Schema<Object> bounded(Schema<Object> schema, Input input, Spelling spelling) {
        schema.setMinimum(decimal(spelling.given(input.minimum())));
        schema.setMaximum(decimal(spelling.given(input.maximum())));
        schema.addExtension("x-unit", spelling.unit().ucum());
        return schema;
    }

    private static String description(Input input, Spelling spelling) {
        String unit = input.numeric() ? spelling.unit().with("").strip() : "";
        if (!spelling.name().equals(input.name())) {
            return "Instead of " + input.name() + ", in the basis and the unit that this name states"
                    + (unit.isEmpty() ? "" : "; " + unit);
        }
        return input.meaning()
                + (input.kind() == Input.Kind.LIST ? ": " + String.join(", ", input.allowed()) : "")
                + (unit.isEmpty() ? "" : "; " + unit);
    }

    private static BigDecimal decimal(double value) {
        return new BigDecimal(SixDigits.text(value));
    }
}
