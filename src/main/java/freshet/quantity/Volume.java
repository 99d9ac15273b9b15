package freshet.quantity;

import jakarta.validation.Constraint;
import jakarta.validation.Payload;
import jakarta.validation.constraints.DecimalMax;
import jakarta.validation.constraints.DecimalMin;
import java.lang.annotation.ElementType;
import java.lang.annotation.Retention;
import java.lang.annotation.RetentionPolicy;
import java.lang.annotation.Target;

/** Volume of water: 0.001 to 1e10 L. */
@Quantity(unit = Unit.L, wording = "Volume of water", example = "50000")
@Alternative(replacing = "volume_l", by = "volume_m3", unit = Unit.M3, factor = 1000)
@Alternative(replacing = "volume_l", by = "volume_us_gal", unit = Unit.US_GAL, factor = 3.785411784)
@DecimalMin("0.001")
@DecimalMax("1e10")
@Constraint(validatedBy = {})
@Target({ElementType.FIELD, ElementType.RECORD_COMPONENT})
@Retention(RetentionPolicy.RUNTIME)
public @interface Volume {

    /** What this input is, where the wording of the quantity does not say enough. */
    String value() default "";

    /** Not used: faults are worded from the quantity. */
    String message() default "";

    /** Jakarta Validation groups; none. */
    Class<?>[] groups() default {};

    /** Jakarta Validation payload; none. */
    Class<? extends Payload>[] payload() default {};
}
