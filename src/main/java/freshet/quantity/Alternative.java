package freshet.quantity;

import java.lang.annotation.ElementType;
import java.lang.annotation.Repeatable;
import java.lang.annotation.Retention;
import java.lang.annotation.RetentionPolicy;
import java.lang.annotation.Target;

/**
 * Another input by which a quantity may be given, in another unit or on another basis. Its name is that of the canonical
 * input with {@link #replacing} replaced by {@link #by}; canonical value = (given value + offset) x factor.
 */
@Target(ElementType.ANNOTATION_TYPE)
@Retention(RetentionPolicy.RUNTIME)
@Repeatable(Alternative.List.class)
public @interface Alternative {

    /** The part of the canonical name that differs. */
    String replacing();

    /** What stands there instead. */
    String by();

    /** Unit of the given value. */
    Unit unit();

    /** Canonical units per given unit. */
    double factor();

    /** Added to the given value first, in the given unit. */
    double offset() default 0;

    /** Several alternatives of one quantity. */
    @Target(ElementType.ANNOTATION_TYPE)
    @Retention(RetentionPolicy.RUNTIME)
    @interface List {

        /** The alternatives. */
        Alternative[] value();
    }
}
