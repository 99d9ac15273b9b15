package freshet.nitrification.web;

import freshet.answer.Fault;
import freshet.answer.FaultCode;
import freshet.answer.Refusal;
import freshet.nitrification.Biofilter;
import freshet.nitrification.FilterFlow;
import freshet.nitrification.FilterWater;
import freshet.nitrification.MediaAmount;
import freshet.nitrification.ReferenceRate;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** The filter that a request for its capacity describes, and what in the request does not fit together. */
final class CapacityInputs {

    private final NitrificationCapacityRequest request;
    private final ReferenceInputs reference;
    private final MediaAmount amount;
    private final ReferenceRate rate;

    CapacityInputs(NitrificationCapacityRequest request) {
        this.request = request;
        reference = request.reference();
        amount = amount(request);
        rate = reference.rate();
    }

    private static MediaAmount amount(NitrificationCapacityRequest request) {
        Double area = request.mediaAreaM2();
        Double volume = request.mediaVolumeM3();
        return area != null ? new MediaAmount(area, false) : new MediaAmount(volume == null ? 0 : volume, true);
    }

    /**
     * The filter.
     *
     * @throws Refusal with everything in the request that does not fit together
     */
    Biofilter filter() {
        List<Fault> faults = faults();
        if (!faults.isEmpty()) {
            throw new Refusal(faults);
        }
        return new Biofilter(
                rate,
                amount.in(reference.perVolume(), reference.specificSurface()).orElseThrow(),
                Optionals.of(request.biofilterFlowLPerHour()),
                new FilterFlow(Optionals.share(request.removalPerPassPercent()), inflowOxygen()));
    }

    private OptionalDouble inflowOxygen() {
        return rate.aerated() ? OptionalDouble.empty() : Optionals.of(request.inflowDissolvedOxygenMgPerL());
    }

    private boolean surfaceNeeded() {
        return amount.needsSurface(reference.perVolume());
    }

    private List<Fault> faults() {
        FilterWater water = request.conditions().water();
        List<Fault> faults = new ArrayList<>(reference.faults(water, surfaceNeeded()));
        if (!reference.measured() && reference.perVolume() && !amount.byVolume()) {
            faults.add(new Fault(
                    "media_area_m2",
                    FaultCode.CONFLICT,
                    "These media are rated by bulk volume: give media_volume_m3 in place of media_area_m2."));
        } else if (amount.in(reference.perVolume(), reference.specificSurface()).isEmpty()) {
            faults.add(new Fault(
                    "specific_surface_m2_per_m3",
                    FaultCode.MISSING,
                    "specific_surface_m2_per_m3 is missing: the measured rate and the amount of media have different"
                            + " units."));
        }
        if (request.inflow().proteinAlone()) {
            faults.add(new Fault(
                    "feed_kg_per_day",
                    FaultCode.MISSING,
                    "feed_kg_per_day is missing: protein_percent alone is no load."));
        }
        return faults;
    }

    InputNotUsed notUsed() {
        InputNotUsed notUsed = new InputNotUsed();
        reference.noteUnused(notUsed, request.conditions().carbonToNitrogen());
        request.inflow().noteUnused(notUsed);
        if (!surfaceNeeded()) {
            notUsed.because(
                    "the media are given in the unit of the rate",
                    "specific_surface_m2_per_m3",
                    reference.specificSurfaceM2PerM3());
        }
        Double oxygen = request.inflowDissolvedOxygenMgPerL();
        if (request.biofilterFlowLPerHour() == null) {
            String reason = "it needs biofilter_flow_l_per_hour";
            notUsed.because(reason, "removal_per_pass_percent", request.removalPerPassPercent())
                    .because(reason, "inflow_dissolved_oxygen_mg_per_l", oxygen);
        } else if (rate.aerated()) {
            notUsed.because("air brings the oxygen of these media", "inflow_dissolved_oxygen_mg_per_l", oxygen);
        }
        return notUsed;
    }
}
