package freshet.http.binding;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import freshet.quantity.Choice;
import freshet.quantity.Default;
import freshet.quantity.Flat;
import freshet.quantity.Ph;
import freshet.quantity.Points;
import freshet.quantity.Sample;
import jakarta.validation.constraints.NotNull;
import jakarta.validation.constraints.Positive;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;

/** The binder refuses at start whatever declaration it would not heed. */
class ShapeTest {

    record WithAForeignConstraint(@NotNull @Ph @Positive Double ph) {}

    record NeitherRequiredNorOptional(@Ph Double ph) {}

    record NeitherQuantityNorChoice(@Nullable Double ph) {}

    record AChoiceOfNothing(@Choice("x") @Nullable String ph) {}

    record Twice(@NotNull @Ph Double ph, @Flat Sample sample) {}

    record Whole(@Default("7") @Points Integer points) {}

    @Test
    void declarationsThatNoOneReadsAreRefused() {
        for (Class<? extends Record> type : List.of(
                WithAForeignConstraint.class,
                NeitherRequiredNorOptional.class,
                NeitherQuantityNorChoice.class,
                AChoiceOfNothing.class,
                Twice.class)) {
            assertThatThrownBy(() -> Shape.of(type)).as(type.getSimpleName()).isInstanceOf(IllegalStateException.class);
        }
    }

    @Test
    void aSampleIsReadAsItIsDeclared() {
        Shape<Sample> shape = Shape.of(Sample.class);
        assertThat(shape.names()).containsExactly("ph", "temperature_c", "temperature_f", "salinity", "ph_scale");
        assertThat(shape.input("ph").required()).isTrue();
        assertThat(shape.input("ph").maximum()).isEqualTo(14);
        assertThat(shape.input("salinity").required()).isFalse();
        assertThat(shape.input("salinity").defaultText()).contains("0");
        assertThat(shape.input("ph_scale").allowed()).containsExactly("nbs", "free", "total");
    }

    @Test
    void aWholeNumberMayBeWrittenAnyWayThatIsWhole() {
        assertThat(Request.fromQuery(Shape.of(Whole.class), "points=1e2")
                        .inputs()
                        .points())
                .isEqualTo(100);
        assertThat(Request.fromQuery(Shape.of(Whole.class), null).inputs().points())
                .isEqualTo(7);
        assertThatThrownBy(() -> Request.fromQuery(Shape.of(Whole.class), "points=2.5"))
                .hasMessageContaining("whole number");
    }

    @Test
    void theFingerprintTellsInputsApartAndNotTheirSpelling() {
        Shape<Sample> shape = Shape.of(Sample.class);
        long one = Request.fromQuery(shape, "ph=7.40&temperature_c=24").fingerprint();
        assertThat(Request.fromQuery(shape, "temperature_c=2.4e1&ph=7.4&salinity=-0")
                        .fingerprint())
                .isEqualTo(one);
        assertThat(Request.fromQuery(shape, "ph=7.41&temperature_c=24").fingerprint())
                .isNotEqualTo(one);
        assertThat(Request.fromQuery(shape, "ph=7.4&temperature_c=24&ph_scale=nbs")
                        .fingerprint())
                .isNotEqualTo(one);
    }
}
