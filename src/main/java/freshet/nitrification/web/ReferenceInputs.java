package freshet.nitrification.web;

import freshet.answer.Fault;
import freshet.answer.FaultCode;
import freshet.nitrification.FilterWater;
import freshet.nitrification.MeasuredRate;
import freshet.nitrification.Media;
import freshet.nitrification.PublishedRate;
import freshet.nitrification.ReferenceRate;
import freshet.nitrification.ReferenceState;
import freshet.quantity.Alkalinity;
import freshet.quantity.ArealRate;
import freshet.quantity.Choice;
import freshet.quantity.DissolvedOxygen;
import freshet.quantity.ExactlyOneOf;
import freshet.quantity.Ph;
import freshet.quantity.Salinity;
import freshet.quantity.SpecificSurface;
import freshet.quantity.Temperature;
import freshet.quantity.Together;
import freshet.quantity.TotalAmmonia;
import freshet.quantity.VolumetricRate;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.jspecify.annotations.Nullable;

/** The rate of the media: published for a kind of media, or measured. */
@ExactlyOneOf(
        value = {"media", ReferenceInputs.PER_AREA, ReferenceInputs.PER_VOLUME},
        beside = "media")
@Together(given = ReferenceInputs.PER_AREA, needs = "reference_temperature_c")
@Together(given = ReferenceInputs.PER_VOLUME, needs = "reference_temperature_c")
record ReferenceInputs(
        @Choice("Kind of media; beside a measured rate only where its usual specific surface is needed") @Nullable
        Media media,

        @ArealRate("Measured rate of total ammonia oxidized, as N, per media surface") @Nullable
        Double referenceRateGPerM2PerDay,

        @VolumetricRate("Measured rate of total ammonia oxidized, as N, per bulk volume of media") @Nullable
        Double referenceRateGPerM3PerDay,

        @Temperature("Water temperature when the rate was measured") @Nullable
        Double referenceTemperatureC,

        @TotalAmmonia("Total ammonia as N when the rate was measured; by default 2 mg/L or more") @Nullable
        Double referenceTanMgPerL,

        @DissolvedOxygen("Oxygen at the media when the rate was measured; by default not limiting") @Nullable
        Double referenceDissolvedOxygenMgPerL,

        @Ph("pH (NBS) when the rate was measured; by default 7.2 to 9") @Nullable
        Double referencePh,

        @Alkalinity("Alkalinity as CaCO3 when the rate was measured; by default 50 mg/L or more") @Nullable
        Double referenceAlkalinityMgPerLAsCaco3,

        @Salinity("Practical salinity when the rate was measured; needed above salinity 5") @Nullable
        Double referenceSalinity,

        @SpecificSurface("Usable surface per bulk volume of media; by default that of the kind of media") @Nullable
        Double specificSurfaceM2PerM3) {

    static final String PER_AREA = "reference_rate_g_per_m2_per_day";
    static final String PER_VOLUME = "reference_rate_g_per_m3_per_day";

    boolean measured() {
        return referenceRateGPerM2PerDay != null || referenceRateGPerM3PerDay != null;
    }

    /** Whether the rate is per m3 of media. */
    boolean perVolume() {
        return measured() ? referenceRateGPerM3PerDay != null : media != null && media.perVolume();
    }

    /** What does not fit together, and why a measured rate cannot be moved to {@code water}. */
    List<Fault> faults(FilterWater water, boolean surfaceNeeded) {
        List<Fault> faults = new ArrayList<>(0);
        if (measured() && media != null && !(surfaceNeeded && specificSurfaceM2PerM3 == null)) {
            faults.add(new Fault(
                    "media",
                    FaultCode.CONFLICT,
                    "The measured rate stands in place of media, whose specific surface is not needed here."));
        }
        if (rate() instanceof MeasuredRate measuredRate) {
            faults.addAll(measuredRate.faults(water));
        }
        return faults;
    }

    OptionalDouble specificSurface() {
        if (specificSurfaceM2PerM3 != null) {
            return OptionalDouble.of(specificSurfaceM2PerM3);
        }
        return media == null ? OptionalDouble.empty() : media.specificSurfaceM2PerM3();
    }

    ReferenceRate rate() {
        Double perArea = referenceRateGPerM2PerDay;
        Double perVolume = referenceRateGPerM3PerDay;
        boolean aerated = media != null && media.aerated();
        if (perArea != null) {
            return new MeasuredRate(perArea, false, aerated, state());
        }
        if (perVolume != null) {
            return new MeasuredRate(perVolume, true, aerated, state());
        }
        return new PublishedRate(media == null ? Media.MOVING_BED : media);
    }

    private ReferenceState state() {
        return new ReferenceState(
                referenceTemperatureC == null ? Double.NaN : referenceTemperatureC,
                Optionals.of(referenceTanMgPerL),
                Optionals.of(referenceDissolvedOxygenMgPerL),
                Optionals.of(referencePh),
                Optionals.of(referenceAlkalinityMgPerLAsCaco3),
                Optionals.of(referenceSalinity));
    }

    /** Notes what describes a measurement that was not given, or carbon that a measurement holds already. */
    void noteUnused(InputNotUsed notUsed, double carbonToNitrogen) {
        if (measured()) {
            notUsed.because(
                    "a measured rate has organic carbon in it already",
                    "carbon_to_nitrogen",
                    carbonToNitrogen > 0 ? carbonToNitrogen : null);
        } else {
            String reason = "it describes a measured rate, and none was given";
            notUsed.because(reason, "reference_temperature_c", referenceTemperatureC)
                    .because(reason, "reference_tan_mg_per_l", referenceTanMgPerL)
                    .because(reason, "reference_dissolved_oxygen_mg_per_l", referenceDissolvedOxygenMgPerL)
                    .because(reason, "reference_ph", referencePh)
                    .because(reason, "reference_alkalinity_mg_per_l_as_caco3", referenceAlkalinityMgPerLAsCaco3)
                    .because(reason, "reference_salinity", referenceSalinity);
        }
    }
}
