package freshet.quantity;

import java.lang.annotation.ElementType;
import java.lang.annotation.Retention;
import java.lang.annotation.RetentionPolicy;
import java.lang.annotation.Target;

/**
 * Makes an annotation the declaration of a physical quantity. Its bounds are the Jakarta constraints beside this one; an
 * input may replace the wording by the annotation's own value.
 */
@Target(ElementType.ANNOTATION_TYPE)
@Retention(RetentionPolicy.RUNTIME)
public @interface Quantity {

    /** Unit of every value of the quantity. */
    Unit unit();

    /** What it is, with its basis, as documents say it. */
    String wording();

    /** A typical value. */
    String example();
}
