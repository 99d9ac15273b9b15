package freshet.quantity;

import jakarta.validation.Constraint;
import jakarta.validation.Payload;
import jakarta.validation.constraints.DecimalMax;
import jakarta.validation.constraints.DecimalMin;
import java.lang.annotation.ElementType;
import java.lang.annotation.Retention;
import java.lang.annotation.RetentionPolicy;
import java.lang.annotation.Target;

/** Water temperature: -2 to 60 °C. */
@Quantity(unit = Unit.CELSIUS, wording = "Water temperature", example = "24")
@Alternative(replacing = "temperature_c", by = "temperature_f", unit = Unit.FAHRENHEIT, factor = 5.0 / 9, offset = -32)
@DecimalMin("-2")
@DecimalMax("60")
@Constraint(validatedBy = {})
@Target({ElementType.FIELD, ElementType.RECORD_COMPONENT})
@Retention(RetentionPolicy.RUNTIME)
public @interface Temperature {

    /** What this input is, where the wording of the quantity does not say enough. */
    String value() default "";

    /** Not used: faults are worded from the quantity. */
    String message() default "";

    /** Jakarta Validation groups; none. */
    Class<?>[] groups() default {};

    /** Jakarta Validation payload; none. */
    Class<? extends Payload>[] payload() default {};
}
