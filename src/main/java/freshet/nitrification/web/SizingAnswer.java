package freshet.nitrification.web;

import freshet.answer.Answer;
import freshet.answer.Fault;
import freshet.answer.Notice;
import freshet.answer.Refusal;
import freshet.nitrification.BiofilterCapacity;
import freshet.nitrification.BiofilterSizing;
import freshet.nitrification.FilterFlow;
import freshet.nitrification.FilterWater;
import freshet.nitrification.ReferenceRate;
import freshet.nitrification.SizingGoal;
import freshet.nitrification.TanLoad;
import java.util.List;
import java.util.OptionalDouble;

/** Puts together the answer on how large a biofilter must be. */
final class SizingAnswer {

    private final NitrificationSizingRequest request;
    private final ReferenceInputs reference;
    private final ReferenceRate rate;
    private final FilterWater water;
    private final SizingGoal goal;
    private final BiofilterSizing sizing;

    private SizingAnswer(NitrificationSizingRequest request) {
        this.request = request;
        reference = request.reference();
        rate = reference.rate();
        water = request.conditions().water();
        List<Fault> faults = reference.faults(water, !reference.perVolume());
        if (!faults.isEmpty()) {
            throw new Refusal(faults);
        }
        goal = new SizingGoal(
                request.inflow().load().orElseGet(() -> TanLoad.given(0)),
                Optionals.of(request.safetyFactor()),
                new FilterFlow(Optionals.share(request.removalPerPassPercent()), inflowOxygen()),
                reference.specificSurface());
        sizing = BiofilterSizing.of(goal, rate, water, request.conditions().temperatureMethod());
    }

    static Answer<NitrificationSizingResponse> to(NitrificationSizingRequest request) {
        return new SizingAnswer(request).answer();
    }

    private OptionalDouble inflowOxygen() {
        return rate.aerated() ? OptionalDouble.empty() : Optionals.of(request.inflowDissolvedOxygenMgPerL());
    }

    private Answer<NitrificationSizingResponse> answer() {
        return new Answer<>(
                NitrificationSizingResponse.of(sizing),
                BiofilterSizing.METHOD,
                BiofilterCapacity.validity(water).and(goal.load().validity()),
                notices());
    }

    private List<Notice> notices() {
        boolean measured = reference.measured();
        return new BiofilterNotices()
                .oxygen(water)
                .when(
                        goal.safetyBelowPeak(),
                        "safety-below-peak",
                        "safety_factor",
                        "The daily peak of the meals is higher than this safety_factor and was used in its place.")
                .spread(sizing.rate(), measured, reference.perVolume() ? "media_volume_m3" : "media_area_m2")
                .measured(sizing.rate(), measured)
                .lowPh(water)
                .when(
                        sizing.volumeM3(sizing.amount()).isEmpty(),
                        "no-specific-surface",
                        "media_volume_m3",
                        "Without specific_surface_m2_per_m3 the surface of the media has no volume.")
                .inputs(notUsed())
                .inOrder();
    }

    private InputNotUsed notUsed() {
        InputNotUsed notUsed = new InputNotUsed();
        reference.noteUnused(notUsed, request.conditions().carbonToNitrogen());
        request.inflow().noteUnused(notUsed);
        if (reference.perVolume()) {
            notUsed.because(
                    "these media are rated by bulk volume",
                    "specific_surface_m2_per_m3",
                    reference.specificSurfaceM2PerM3());
        }
        if (rate.aerated()) {
            notUsed.because(
                    "air brings the oxygen of these media",
                    "inflow_dissolved_oxygen_mg_per_l",
                    request.inflowDissolvedOxygenMgPerL());
        }
        return notUsed;
    }
}
