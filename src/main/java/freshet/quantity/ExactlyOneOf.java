package freshet.quantity;

import java.lang.annotation.ElementType;
import java.lang.annotation.Repeatable;
import java.lang.annotation.Retention;
import java.lang.annotation.RetentionPolicy;
import java.lang.annotation.Target;

/** Of these inputs exactly one must be given. */
@Target(ElementType.TYPE)
@Retention(RetentionPolicy.RUNTIME)
@Repeatable(ExactlyOneOf.List.class)
public @interface ExactlyOneOf {

    /** Names of the inputs. */
    String[] value();

    /** The one of them, if any, that may also stand beside another; the calculation judges where that makes sense. */
    String beside() default "";

    /** Several groups of one request. */
    @Target(ElementType.TYPE)
    @Retention(RetentionPolicy.RUNTIME)
    @interface List {

        /** The groups. */
        ExactlyOneOf[] value();
    }
}
