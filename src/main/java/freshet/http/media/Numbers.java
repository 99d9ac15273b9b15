package freshet.http.media;

import java.lang.invoke.MethodHandle;
import java.lang.invoke.MethodHandles;
import java.lang.invoke.MethodType;
import java.util.Arrays;
import java.util.OptionalDouble;

/**
 * Takes all numbers of a response record at once. The whole way is one method handle, which the JVM compiles as one.
 */
final class Numbers {

    /** Stands for a number that does not exist: a NaN of bits that no computation gives. */
    static final double ABSENT = Double.longBitsToDouble(0x7FF8_0000_ABBE_5E47L);

    /** From an optional number to it or {@link #ABSENT}. */
    static final MethodHandle OR_ABSENT;

    static {
        try {
            MethodType orElse = MethodType.methodType(double.class, double.class);
            OR_ABSENT = MethodHandles.insertArguments(
                    MethodHandles.lookup().findVirtual(OptionalDouble.class, "orElse", orElse), 1, ABSENT);
        } catch (ReflectiveOperationException impossible) {
            throw new ExceptionInInitializerError(impossible);
        }
    }

    private final MethodHandle handle;

    /** Of the columns those that are numbers, in their order. */
    Numbers(Column[] columns) {
        MethodHandle[] accessors = Arrays.stream(columns)
                .filter(column -> column.kind() == Column.Kind.NUMBER)
                .map(Column::accessor)
                .toArray(MethodHandle[]::new);
        MethodHandle collector = MethodHandles.identity(double[].class).asCollector(double[].class, accessors.length);
        handle = MethodHandles.permuteArguments(
                MethodHandles.filterArguments(collector, 0, accessors),
                MethodType.methodType(double[].class, Record.class),
                new int[accessors.length]);
    }

    static boolean isAbsent(double value) {
        return Double.doubleToRawLongBits(value) == Double.doubleToRawLongBits(ABSENT);
    }

    double[] of(Record result) {
        try {
            return (double[]) handle.invokeExact(result);
        } catch (RuntimeException | Error unchecked) {
            throw unchecked;
        } catch (Throwable checked) {
            throw new IllegalStateException(checked);
        }
    }
}
