package freshet.dilution.web;

import freshet.acidity.PhScale;
import freshet.quantity.Choice;
import freshet.quantity.Concentration;
import freshet.quantity.Default;
import freshet.quantity.Drained;
import freshet.quantity.Group;
import freshet.quantity.PhLimit;
import freshet.quantity.TemperatureChange;
import org.jspecify.annotations.Nullable;

record DilutionBlendRequest(
        @Group("Water of the tank that is mixed: what is left of it where it is drained first")
        WaterSample tank,

        @Group("Water that is added") WaterSample source,

        @Choice("Scale of every pH: nbs for a probe calibrated on ordinary buffers (the default), or free or total")
        @Nullable
        PhScale phScale,

        @Default("0") @Drained("Water let out of the tank first, taken off its volume")
        Double drainedL,

        @Concentration("Dissolved carbon dioxide to which the mixture settles; by default that of the tank before")
        @Nullable
        Double settledCo2MgPerL,

        @Concentration("Own limit of un-ionized ammonia as N; without it that of the tank before must not be passed")
        @Nullable
        Double nh3NLimitMgPerL,

        @Default("0.3") @PhLimit Double phChangeLimit,

        @Default("2") @TemperatureChange Double temperatureChangeLimitC) {

    PhScale scale() {
        return phScale == null ? PhScale.NBS : phScale;
    }
}
