package freshet.quantity;

import freshet.substance.MolarMass;
import jakarta.validation.Constraint;
import jakarta.validation.Payload;
import jakarta.validation.constraints.DecimalMax;
import jakarta.validation.constraints.DecimalMin;
import java.lang.annotation.ElementType;
import java.lang.annotation.Retention;
import java.lang.annotation.RetentionPolicy;
import java.lang.annotation.Target;

/** Nitrite as N: 0 to 10000 mg/L as N. */
@Quantity(unit = Unit.MG_PER_L, wording = "Nitrite as N", example = "0.4")
@Alternative(replacing = "no2_n", by = "no2", unit = Unit.MG_PER_L, factor = MolarMass.NITROGEN / MolarMass.NITRITE)
@DecimalMin("0")
@DecimalMax("10000")
@Constraint(validatedBy = {})
@Target({ElementType.FIELD, ElementType.RECORD_COMPONENT})
@Retention(RetentionPolicy.RUNTIME)
public @interface Nitrite {

    /** What this input is, where the wording of the quantity does not say enough. */
    String value() default "";

    /** Not used: faults are worded from the quantity. */
    String message() default "";

    /** Jakarta Validation groups; none. */
    Class<?>[] groups() default {};

    /** Jakarta Validation payload; none. */
    Class<? extends Payload>[] payload() default {};
}
