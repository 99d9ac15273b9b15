package freshet.quantity;

import jakarta.validation.Constraint;
import jakarta.validation.Payload;
import jakarta.validation.constraints.DecimalMax;
import jakarta.validation.constraints.DecimalMin;
import java.lang.annotation.ElementType;
import java.lang.annotation.Retention;
import java.lang.annotation.RetentionPolicy;
import java.lang.annotation.Target;

/** Usable surface per bulk volume of media: 1 to 100000 m2/m3. */
@Quantity(unit = Unit.M2_PER_M3, wording = "Usable surface per bulk volume of media", example = "500")
@DecimalMin("1")
@DecimalMax("100000")
@Constraint(validatedBy = {})
@Target({ElementType.FIELD, ElementType.RECORD_COMPONENT})
@Retention(RetentionPolicy.RUNTIME)
public @interface SpecificSurface {

    /** What this input is, where the wording of the quantity does not say enough. */
    String value() default "";

    /** Not used: faults are worded from the quantity. */
    String message() default "";

    /** Jakarta Validation groups; none. */
    Class<?>[] groups() default {};

    /** Jakarta Validation payload; none. */
    Class<? extends Payload>[] payload() default {};
}
