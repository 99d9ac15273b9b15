package freshet.quantity;

import java.lang.annotation.ElementType;
import java.lang.annotation.Repeatable;
import java.lang.annotation.Retention;
import java.lang.annotation.RetentionPolicy;
import java.lang.annotation.Target;

/** An input that needs another one. */
@Target(ElementType.TYPE)
@Retention(RetentionPolicy.RUNTIME)
@Repeatable(Together.List.class)
public @interface Together {

    /** Name of the input that has the need. */
    String given();

    /** Name of the input it needs. */
    String needs();

    /** Several needs of one request. */
    @Target(ElementType.TYPE)
    @Retention(RetentionPolicy.RUNTIME)
    @interface List {

        /** The needs. */
        Together[] value();
    }
}
