package freshet.http.binding;

import freshet.quantity.AtMostOneOf;
import freshet.quantity.ExactlyOneOf;
import freshet.quantity.ExactlyTwoOf;
import freshet.quantity.Flat;
import freshet.quantity.Group;
import freshet.quantity.Together;
import java.lang.invoke.MethodHandle;
import java.lang.reflect.RecordComponent;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Reads the declarations of a request record and of the records in it. */
final class ShapeReader {

    private final List<Input> inputs = new ArrayList<>();
    private final List<Rule> rules = new ArrayList<>();
    private final Map<String, String> groups = new LinkedHashMap<>();

    List<Input> inputs() {
        return inputs;
    }

    List<Rule> rules() {
        return rules;
    }

    /** What each group of inputs is, by its name. */
    Map<String, String> groups() {
        return groups;
    }

    <R extends Record> RecordMaker<R> read(Class<R> type) {
        return read(type, "");
    }

    /** Reads a record whose inputs have names that begin with {@code prefix}. */
    private <R extends Record> RecordMaker<R> read(Class<R> type, String prefix) {
        Arrays.stream(type.getAnnotationsByType(ExactlyOneOf.class))
                .forEach(group -> rules.add(
                        new Rule(Rule.Kind.EXACTLY_ONE, names(prefix, group.value()), prefix + group.beside())));
        Arrays.stream(type.getAnnotationsByType(ExactlyTwoOf.class))
                .forEach(group -> rules.add(new Rule(Rule.Kind.EXACTLY_TWO, names(prefix, group.value()))));
        Arrays.stream(type.getAnnotationsByType(AtMostOneOf.class))
                .forEach(group -> rules.add(new Rule(Rule.Kind.AT_MOST_ONE, names(prefix, group.value()))));
        Arrays.stream(type.getAnnotationsByType(Together.class))
                .forEach(pair -> rules.add(new Rule(Rule.Kind.TOGETHER, names(prefix, pair.given(), pair.needs()))));
        List<MethodHandle> parts = new ArrayList<>();
        for (RecordComponent component : type.getRecordComponents()) {
            parts.add(part(component, prefix));
        }
        return new RecordMaker<>(type, parts);
    }

    private MethodHandle part(RecordComponent component, String prefix) {
        if (component.isAnnotationPresent(Flat.class)) {
            return read(component.getType().asSubclass(Record.class), prefix).handle();
        }
        Group group = component.getAnnotation(Group.class);
        if (group != null) {
            String name = prefix + Names.snake(component.getName());
            groups.put(name, group.value());
            return read(component.getType().asSubclass(Record.class), name + ".")
                    .handle();
        }
        int index = inputs.size();
        inputs.add(InputReader.read(component, prefix, index));
        return RecordMaker.value(index);
    }

    private static List<String> names(String prefix, String... names) {
        return Arrays.stream(names).map(name -> prefix + name).toList();
    }
}
