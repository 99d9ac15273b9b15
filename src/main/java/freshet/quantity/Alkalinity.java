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

/** Total alkalinity as CaCO3: 0 to 50000 mg/L as CaCO3. */
@Quantity(unit = Unit.MG_PER_L, wording = "Total alkalinity as CaCO3", example = "120")
@Alternative(
        replacing = "mg_per_l_as_caco3",
        by = "meq_per_l",
        unit = Unit.MEQ_PER_L,
        factor = MolarMass.CALCIUM_CARBONATE_EQUIVALENT)
@Alternative(
        replacing = "mg_per_l_as_caco3",
        by = "dkh",
        unit = Unit.DKH,
        factor = MolarMass.CALCIUM_CARBONATE_EQUIVALENT / 2.8)
@DecimalMin("0")
@DecimalMax("50000")
@Constraint(validatedBy = {})
@Target({ElementType.FIELD, ElementType.RECORD_COMPONENT})
@Retention(RetentionPolicy.RUNTIME)
public @interface Alkalinity {

    /** What this input is, where the wording of the quantity does not say enough. */
    String value() default "";

    /** Not used: faults are worded from the quantity. */
    String message() default "";

    /** Jakarta Validation groups; none. */
    Class<?>[] groups() default {};

    /** Jakarta Validation payload; none. */
    Class<? extends Payload>[] payload() default {};
}
