package freshet.quantity;

import static org.assertj.core.api.Assertions.assertThat;

import freshet.http.Calculation;
import freshet.http.Calculations;
import freshet.http.HttpTest;
import freshet.http.binding.Input;
import freshet.http.binding.Spelling;
import freshet.http.media.Column;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.springframework.beans.factory.annotation.Autowired;

/** Names tell units, and examples are allowed values. */
@HttpTest
class QuantityContractTest {

    /** Numbers whose names end in no unit because they have none. */
    private static final List<String> DIMENSIONLESS = List.of(
            "salinity",
            "nh3_fraction",
            "hno2_fraction",
            "chloride_to_no2_n_mass_ratio",
            "present_mass_ratio",
            "stages",
            "steps",
            "points",
            "safety_factor",
            "carbon_to_nitrogen",
            "feed_conversion_ratio",
            "reference_salinity",
            "calcite_saturation_index",
            "acute_quotient",
            "chronic_quotient");

    @Autowired
    private Calculations calculations;

    @Test
    void everyInputEndsInItsUnit() {
        for (Calculation<?, ?> calculation : calculations.all()) {
            for (Input input : calculation.inputs().inputs()) {
                for (Spelling spelling : input.spellings()) {
                    assertThat(Unit.ofName(spelling.name())).as(spelling.name()).isEqualTo(spelling.unit());
                    if (input.numeric() && spelling.unit() == Unit.ONE) {
                        assertThat(DIMENSIONLESS).contains(spelling.name().replaceFirst(".*\\.", ""));
                    }
                }
            }
        }
    }

    @Test
    void everyOutputEndsInItsUnitOrHasNone() {
        for (Calculation<?, ?> calculation : calculations.all()) {
            for (Column column : calculation.outputs().columns()) {
                if (column.kind() == Column.Kind.NUMBER
                        && column.unit() == Unit.ONE
                        && !column.name().endsWith("_factor")) {
                    assertThat(DIMENSIONLESS).contains(column.name());
                }
            }
        }
    }

    @Test
    void everyExampleIsAnAllowedValue() {
        for (Calculation<?, ?> calculation : calculations.all()) {
            for (Input input : calculation.inputs().inputs()) {
                if (input.numeric()) {
                    assertThat(Double.parseDouble(input.example()))
                            .as(input.name())
                            .isBetween(input.minimum(), input.maximum());
                }
                assertThat(input.meaning()).as(input.name()).isNotBlank().doesNotEndWith(".");
            }
        }
    }
}
