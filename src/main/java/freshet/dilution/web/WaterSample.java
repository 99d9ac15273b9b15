package freshet.dilution.web;

import freshet.quantity.Alkalinity;
import freshet.quantity.Concentration;
import freshet.quantity.Default;
import freshet.quantity.Mineral;
import freshet.quantity.Nitrate;
import freshet.quantity.Nitrite;
import freshet.quantity.Ph;
import freshet.quantity.Salinity;
import freshet.quantity.Temperature;
import freshet.quantity.TotalAmmonia;
import freshet.quantity.Volume;
import freshet.substance.MolarMass;
import jakarta.validation.constraints.NotNull;
import org.jspecify.annotations.Nullable;

record WaterSample(
        @NotNull @Volume("Volume of this water that is mixed")
        Double volumeL,

        @NotNull @Temperature Double temperatureC,
        @Default("0") @Salinity Double salinity,
        @NotNull @Ph Double ph,
        @NotNull @Alkalinity Double alkalinityMgPerLAsCaco3,
        @TotalAmmonia @Nullable Double tanMgPerL,
        @Nitrite @Nullable Double no2NMgPerL,
        @Nitrate @Nullable Double no3NMgPerL,

        @Mineral("Dissolved calcium") @Nullable Double calciumMgPerL,

        @Concentration("Free chlorine as Cl2") @Nullable Double chlorineMgPerLAsCl2,

        @Concentration("Chloramine, combined chlorine, as Cl2") @Nullable
        Double chloramineMgPerLAsCl2) {

    /** Ammonia as N that chloramine sets free, g for each g as Cl2: one N for each Cl2. */
    private static final double N_PER_CL2 = MolarMass.NITROGEN / 70.906;

    static double zeroIfNone(@Nullable Double value) {
        return value == null ? 0 : value;
    }

    /** Free and combined chlorine as Cl2, mg/L. */
    double allChlorineMgPerL() {
        return zeroIfNone(chlorineMgPerLAsCl2) + zeroIfNone(chloramineMgPerLAsCl2);
    }

    boolean namesChlorine() {
        return chlorineMgPerLAsCl2 != null || chloramineMgPerLAsCl2 != null;
    }

    /** Total ammonia as N with what chloramine sets free, mg/L; null if it was not given. */
    @Nullable
    Double freedTanMgPerL() {
        return tanMgPerL == null ? null : tanMgPerL + N_PER_CL2 * zeroIfNone(chloramineMgPerLAsCl2);
    }
}
