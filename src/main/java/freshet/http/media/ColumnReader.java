package freshet.http.media;

import freshet.http.binding.Names;
import freshet.http.media.Column.Kind;
import freshet.quantity.Reported;
import java.lang.invoke.MethodHandle;
import java.lang.invoke.MethodHandles;
import java.lang.invoke.MethodType;
import java.lang.reflect.Method;
import java.lang.reflect.ParameterizedType;
import java.lang.reflect.RecordComponent;
import java.lang.reflect.Type;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** Reads the declaration of one output from a component of a response record. */
final class ColumnReader {

    private ColumnReader() {}

    /** The output that a component of a response record declares. */
    static Column read(RecordComponent component) {
        Reported reported = component.getAnnotation(Reported.class);
        if (reported == null) {
            throw new IllegalStateException("Output " + component + " does not say what it is");
        }
        String name = Names.snake(component.getName());
        boolean optional = component.getType() == Optional.class || component.getType() == OptionalDouble.class;
        Class<?> type = component.getType() == Optional.class ? argument(component) : component.getType();
        return new Column(
                name,
                type == List.class ? listKind(component) : kind(type),
                reported.value(),
                optional,
                type == List.class && listKind(component) == Kind.ROWS
                        ? Optional.of(Table.of(argument(component).asSubclass(Record.class)))
                        : Optional.empty(),
                choices(type),
                accessor(component),
                ("\"" + name + "\":").getBytes(StandardCharsets.US_ASCII));
    }

    private static Kind kind(Class<?> type) {
        if (type == double.class || type == OptionalDouble.class) {
            return Kind.NUMBER;
        }
        if (type == int.class || type == Integer.class) {
            return Kind.WHOLE;
        }
        if (type == boolean.class || type == Boolean.class) {
            return Kind.FLAG;
        }
        if (type.isEnum()) {
            return Kind.TEXT;
        }
        throw new IllegalStateException("No output can be a " + type);
    }

    private static Kind listKind(RecordComponent component) {
        Type element = ((ParameterizedType) component.getGenericType()).getActualTypeArguments()[0];
        return element == Double.class ? Kind.NUMBERS : element instanceof ParameterizedType ? Kind.MATRIX : Kind.ROWS;
    }

    private static List<String> choices(Class<?> type) {
        return type.isEnum()
                ? List.of(type.getEnumConstants()).stream()
                        .map(constant -> Names.kebab((Enum<?>) constant))
                        .toList()
                : List.of();
    }

    private static Class<?> argument(RecordComponent component) {
        return (Class<?>) ((ParameterizedType) component.getGenericType()).getActualTypeArguments()[0];
    }

    private static MethodHandle accessor(RecordComponent component) {
        try {
            Method method = component.getAccessor();
            method.setAccessible(true);
            MethodHandle accessor = MethodHandles.lookup().unreflect(method);
            if (component.getType() == OptionalDouble.class) {
                accessor = MethodHandles.filterReturnValue(accessor, Numbers.OR_ABSENT);
            }
            Class<?> type = accessor.type().returnType() == double.class ? double.class : Object.class;
            return accessor.asType(MethodType.methodType(type, Record.class));
        } catch (IllegalAccessException inaccessible) {
            throw new IllegalStateException(inaccessible);
        }
    }
}
