package freshet.http.binding;

import java.lang.invoke.MethodHandle;
import java.lang.invoke.MethodHandles;
import java.lang.invoke.MethodType;
import java.lang.reflect.Constructor;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * Makes a record from the values of all inputs of a request, each component taking its own. The whole way is one method
 * handle, which the JVM compiles as one.
 */
final class RecordMaker<T extends Record> {

    private static final MethodType FROM_VALUES = MethodType.methodType(Object.class, Object[].class);
    private static final MethodHandle ELEMENT = MethodHandles.arrayElementGetter(Object[].class);

    private final Class<T> type;
    private final MethodHandle handle;

    /**
     * A maker.
     *
     * @param parts for each component what takes it from the values: {@link #value} or the handle of a nested record
     */
    RecordMaker(Class<T> type, List<MethodHandle> parts) {
        this.type = type;
        try {
            Constructor<?> canonical = type.getDeclaredConstructors()[0];
            canonical.setAccessible(true);
            MethodHandle constructor = MethodHandles.lookup().unreflectConstructor(canonical);
            MethodHandle filtered = MethodHandles.filterArguments(
                    constructor.asType(constructor.type().generic()), 0, parts.toArray(MethodHandle[]::new));
            handle = MethodHandles.permuteArguments(filtered, FROM_VALUES, new int[parts.size()]);
        } catch (IllegalAccessException inaccessible) {
            throw new IllegalStateException(inaccessible);
        }
    }

    /** Takes one of the values. */
    static MethodHandle value(int index) {
        return MethodHandles.insertArguments(ELEMENT, 1, index);
    }

    /** From the values to the record. */
    MethodHandle handle() {
        return handle;
    }

    T create(@Nullable Object[] values) {
        try {
            return type.cast((Object) handle.invokeExact(values));
        } catch (RuntimeException | Error unchecked) {
            throw unchecked;
        } catch (Throwable checked) {
            throw new IllegalStateException(checked);
        }
    }
}
