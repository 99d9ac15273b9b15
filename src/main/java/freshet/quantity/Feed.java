package freshet.quantity;

import jakarta.validation.Constraint;
import jakarta.validation.Payload;
import jakarta.validation.constraints.DecimalMax;
import jakarta.validation.constraints.DecimalMin;
import java.lang.annotation.ElementType;
import java.lang.annotation.Retention;
import java.lang.annotation.RetentionPolicy;
import java.lang.annotation.Target;

/** Feed given, as fed: 0 to 1e6 kg/day. */
@Quantity(unit = Unit.KG_PER_DAY, wording = "Feed given, as fed", example = "10")
@Alternative(replacing = "feed_kg_per_day", by = "feed_lb_per_day", unit = Unit.LB_PER_DAY, factor = 0.45359237)
@DecimalMin("0")
@DecimalMax("1e6")
@Constraint(validatedBy = {})
@Target({ElementType.FIELD, ElementType.RECORD_COMPONENT})
@Retention(RetentionPolicy.RUNTIME)
public @interface Feed {

    /** What this input is, where the wording of the quantity does not say enough. */
    String value() default "";

    /** Not used: faults are worded from the quantity. */
    String message() default "";

    /** Jakarta Validation groups; none. */
    Class<?>[] groups() default {};

    /** Jakarta Validation payload; none. */
    Class<? extends Payload>[] payload() default {};
}
