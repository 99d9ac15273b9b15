package freshet.quantity;

import jakarta.validation.Constraint;
import jakarta.validation.Payload;
import jakarta.validation.constraints.DecimalMax;
import jakarta.validation.constraints.DecimalMin;
import java.lang.annotation.ElementType;
import java.lang.annotation.Retention;
import java.lang.annotation.RetentionPolicy;
import java.lang.annotation.Target;

/** Practical salinity (PSS-78): 0 to 45. */
@Quantity(unit = Unit.ONE, wording = "Practical salinity (PSS-78)", example = "0")
@DecimalMin("0")
@DecimalMax("45")
@Constraint(validatedBy = {})
@Target({ElementType.FIELD, ElementType.RECORD_COMPONENT})
@Retention(RetentionPolicy.RUNTIME)
public @interface Salinity {

    /** What this input is, where the wording of the quantity does not say enough. */
    String value() default "";

    /** Not used: faults are worded from the quantity. */
    String message() default "";

    /** Jakarta Validation groups; none. */
    Class<?>[] groups() default {};

    /** Jakarta Validation payload; none. */
    Class<? extends Payload>[] payload() default {};
}
