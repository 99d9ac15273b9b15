package freshet.http.binding;

import java.lang.invoke.MethodHandle;
import java.lang.invoke.MethodHandles;
import java.lang.invoke.MethodType;
import java.lang.reflect.Constructor;
import java.util.List;
import org.jspecify.annotations.Nullable;

/** Makes a record from the values of all inputs of a request, each component picking its own. */
final class RecordMaker<T extends Record> {

    /** What one component takes from the values. */
    interface Part {
        @Nullable
        Object from(@Nullable Object[] values);
    }

    private final Class<T> type;
    private final MethodHandle constructor;
    private final Part[] parts;

    RecordMaker(Class<T> type, List<Part> parts) {
        this.type = type;
        this.parts = parts.toArray(Part[]::new);
        try {
            Constructor<?> canonical = type.getDeclaredConstructors()[0];
            canonical.setAccessible(true);
            constructor = MethodHandles.lookup()
                    .unreflectConstructor(canonical)
                    .asSpreader(Object[].class, parts.size())
                    .asType(MethodType.methodType(Object.class, Object[].class));
        } catch (IllegalAccessException inaccessible) {
            throw new IllegalStateException(inaccessible);
        }
    }

    T create(@Nullable Object[] values) {
        @Nullable Object[] arguments = new @Nullable Object[parts.length];
        for (int i = 0; i < parts.length; i++) {
            arguments[i] = parts[i].from(values);
        }
        try {
            return type.cast(constructor.invokeExact(arguments));
        } catch (RuntimeException | Error unchecked) {
            throw unchecked;
        } catch (Throwable checked) {
            throw new IllegalStateException(checked);
        }
    }
}
