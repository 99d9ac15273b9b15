package freshet.catalogue.openapi;

import freshet.http.Calculation;
import freshet.http.binding.Input;
import freshet.http.binding.Rule;
import freshet.http.binding.Shape;
import freshet.http.binding.Spelling;
import freshet.http.media.Column;
import freshet.http.media.Table;
import io.swagger.v3.oas.models.media.Schema;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** The request and response schemas of a calculation, and the rules between its inputs. */
final class CalculationSchemas {

    private CalculationSchemas() {}

    static Map<String, Schema<?>> of(Calculation<?, ?> calculation) {
        Map<String, Schema<?>> schemas = new LinkedHashMap<>();
        addGroups(calculation, schemas);
        schemas.put(calculation.noun() + "Request", request(calculation));
        schemas.put(calculation.noun() + "Response", response(calculation, schemas));
        return schemas;
    }

    static Schema<Object> request(Calculation<?, ?> calculation) {
        Schema<Object> schema = Schemas.describe(
                Schemas.ofType("object"), calculation.summary() + ". " + rulesInWords(calculation.inputs()));
        schema.setAdditionalProperties(false);
        calculation.inputs().groups().forEach((group, meaning) -> {
            Schema<Object> reference = Schemas.reference(calculation.noun() + capitalized(group));
            schema.addProperty(group, Schemas.describe(reference, meaning));
            schema.addRequiredItem(group);
        });
        addInputs(schema, calculation, "");
        rules(calculation.inputs()).forEach(schema::addExtension);
        return schema;
    }

    /** The inputs whose names begin with {@code prefix} and hold no further point. */
    private static void addInputs(Schema<Object> schema, Calculation<?, ?> calculation, String prefix) {
        for (Input input : calculation.inputs().inputs()) {
            for (Spelling spelling : input.spellings()) {
                if (spelling.name().startsWith(prefix) && spelling.name().indexOf('.', prefix.length()) < 0) {
                    schema.addProperty(spelling.name().substring(prefix.length()), Schemas.of(input, spelling));
                    if (alwaysRequired(input)) {
                        schema.addRequiredItem(input.name().substring(prefix.length()));
                    }
                }
            }
        }
    }

    private static void addGroups(Calculation<?, ?> calculation, Map<String, Schema<?>> schemas) {
        calculation.inputs().groups().forEach((group, meaning) -> {
            Schema<Object> schema = Schemas.describe(Schemas.ofType("object"), meaning);
            schema.setAdditionalProperties(false);
            addInputs(schema, calculation, group + ".");
            schemas.put(calculation.noun() + capitalized(group), schema);
        });
    }

    private static String capitalized(String group) {
        return Character.toUpperCase(group.charAt(0)) + group.substring(1);
    }

    static Schema<Object> response(Calculation<?, ?> calculation, Map<String, Schema<?>> schemas) {
        Schema<Object> schema = Schemas.describe(Schemas.ofType("object"), calculation.summary());
        addColumns(schema, calculation.outputs(), calculation.noun(), schemas);
        schema.addProperty("method", Schemas.text("Id of the method, an entry of /v1/methods"));
        schema.addProperty("method_version", Schemas.text("Rises when any reported digit could change"));
        schema.addProperty("reference", Schemas.text("Published reference; not in the compact view"));
        Schema<Object> validity = Schemas.choice(List.of("within", "outside"));
        schema.addProperty(
                "validity",
                Schemas.describe(validity, "Whether the inputs lie within the range the method's source states"));
        schema.addProperty(
                "notices",
                Schemas.describe(Schemas.listOf("Notice"), "What the reader must know; absent if there is nothing"));
        schema.addProperty(
                "notice_codes",
                Schemas.text(
                        "Compact view only: the codes of the notices, joined by semicolons; outside-validity is left to validity"));
        List.of("method", "method_version", "validity").forEach(schema::addRequiredItem);
        return schema;
    }

    private static void addColumns(Schema<Object> schema, Table table, String noun, Map<String, Schema<?>> schemas) {
        for (Column column : table.columns()) {
            Schema<Object> property = Schemas.of(column);
            column.rows().ifPresent(rows -> {
                Schema<Object> row = Schemas.ofType("object");
                addColumns(row, rows, noun, schemas);
                schemas.put(noun + "Row", row);
                Schemas.items(property, Schemas.reference(noun + "Row"));
            });
            schema.addProperty(column.name(), property);
            if (!column.optional()) {
                schema.addRequiredItem(column.name());
            }
        }
    }

    /** Whether the input must be there under its canonical name. */
    static boolean alwaysRequired(Input input) {
        return input.required() && input.spellings().size() == 1;
    }

    /** The rules as extensions; an input that may be given by several names is one of them too. */
    static Map<String, Object> rules(Shape<?> shape) {
        List<List<String>> exactlyOne = new ArrayList<>();
        List<List<String>> atMostOne = new ArrayList<>();
        shape.inputs().stream()
                .filter(input -> input.spellings().size() > 1)
                .forEach(input -> (input.required() ? exactlyOne : atMostOne)
                        .add(input.spellings().stream().map(Spelling::name).toList()));
        List<List<String>> exactlyTwo = new ArrayList<>();
        List<List<String>> together = new ArrayList<>();
        for (Rule rule : shape.rules()) {
            switch (rule.kind()) {
                case EXACTLY_ONE -> exactlyOne.add(rule.names());
                case EXACTLY_TWO -> exactlyTwo.add(rule.names());
                case AT_MOST_ONE -> atMostOne.add(rule.names());
                case TOGETHER -> together.add(rule.names());
            }
        }
        Map<String, Object> extensions = new LinkedHashMap<>();
        put("x-exactly-one-of", exactlyOne, extensions);
        put("x-exactly-two-of", exactlyTwo, extensions);
        put("x-at-most-one-of", atMostOne, extensions);
        put("x-needs", together, extensions);
        return extensions;
    }

    /** The rules as sentences. */
    static String rulesInWords(Shape<?> shape) {
        StringBuilder words = new StringBuilder();
        rules(shape).forEach((name, groups) -> {
            for (Object group : (List<?>) groups) {
                String names = String.join(
                        ", ", ((List<?>) group).stream().map(n -> "`" + n + "`").toList());
                words.append(
                        switch (name) {
                            case "x-exactly-one-of" -> "Exactly one of " + names + ". ";
                            case "x-exactly-two-of" -> "Exactly two of " + names + ". ";
                            case "x-at-most-one-of" -> "At most one of " + names + ". ";
                            default -> "The first needs the second: " + names + ". ";
                        });
            }
        });
        return words.toString().strip();
    }

    private static void put(String name, List<List<String>> groups, Map<String, Object> extensions) {
        if (!groups.isEmpty()) {
            extensions.put(name, groups);
        }
    }
}
