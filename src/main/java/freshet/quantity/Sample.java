package freshet.quantity;

import freshet.acidity.PhScale;
import jakarta.validation.constraints.NotNull;
import org.jspecify.annotations.Nullable;

/**
 * A sample of water.
 *
 * @param ph pH on the given scale
 * @param temperatureC temperature, °C
 * @param salinity practical salinity
 * @param phScale scale of the pH; null where the caller did not say
 */
public record Sample(
        @NotNull @Ph Double ph,
        @NotNull @Temperature Double temperatureC,
        @Default("0") @Salinity Double salinity,

        @Choice("Scale of the pH: nbs for a probe calibrated on ordinary buffers (the default), or free or total")
        @Nullable
        PhScale phScale) {

    /** The scale, NBS where the caller did not say. */
    public PhScale scale() {
        return phScale == null ? PhScale.NBS : phScale;
    }
}
