package freshet.nitrification.web;

import freshet.answer.Answer;
import freshet.answer.Notice;
import freshet.method.Validity;
import freshet.nitrification.AlkalinityStock;
import freshet.nitrification.Meals;
import freshet.nitrification.NitrificationDemand;
import freshet.nitrification.Ration;
import freshet.nitrification.TanLoad;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** Puts together the answer on what nitrification consumes. */
final class DemandAnswer {

    private static final double DEFAULT_MINIMUM = 70;

    private final NitrificationDemandRequest request;
    private final TanLoad load;
    private final NitrificationDemand demand;
    private final List<Notice> notices = new ArrayList<>();

    private DemandAnswer(NitrificationDemandRequest request) {
        this.request = request;
        load = load(request);
        demand = NitrificationDemand.of(load.tanGPerDay(), request.stoichiometry());
    }

    static Answer<NitrificationDemandResponse> to(NitrificationDemandRequest request) {
        return new DemandAnswer(request).answer();
    }

    private static TanLoad load(NitrificationDemandRequest request) {
        Double tan = request.tanOxidizedGPerDay();
        if (tan != null) {
            return TanLoad.given(tan);
        }
        Double feed = request.feedKgPerDay();
        Double protein = request.proteinPercent();
        return TanLoad.of(new Ration(feed == null ? 0 : feed, protein == null ? 0 : protein), Meals.SEVERAL);
    }

    private Answer<NitrificationDemandResponse> answer() {
        OptionalDouble days = days();
        notices.add(new Notice(
                "dose-net-not-gross",
                "net_sodium_bicarbonate_g_per_day",
                "Start dosing from the net figure, less what make-up water and denitrification bring; correct it by"
                        + " measured alkalinity."));
        notices.addAll(notUsed().notices());
        Validity validity = load.validity();
        return new Answer<>(
                NitrificationDemandResponse.of(demand, days),
                request.stoichiometry().method(),
                validity,
                notices);
    }

    private OptionalDouble days() {
        Double volume = request.volumeL();
        Double alkalinity = request.alkalinityMgPerLAsCaco3();
        if (volume == null || alkalinity == null) {
            return OptionalDouble.empty();
        }
        AlkalinityStock stock = new AlkalinityStock(volume, alkalinity, request.alkalinityMinimumMgPerLAsCaco3());
        OptionalDouble days = demand.daysUntilExhausted(stock);
        if (stock.exhausted()) {
            notices.add(new Notice(
                    "alkalinity-at-minimum",
                    "days_to_alkalinity_minimum",
                    "Alkalinity is at or below the minimum already: raise it before ammonia is oxidized more slowly."));
        } else if (days.isEmpty()) {
            notices.add(new Notice(
                    "alkalinity-not-consumed",
                    "days_to_alkalinity_minimum",
                    "No ammonia is oxidized, so alkalinity never falls to the minimum."));
        }
        return days;
    }

    private InputNotUsed notUsed() {
        boolean noDays = request.volumeL() == null || request.alkalinityMgPerLAsCaco3() == null;
        Double minimum = request.alkalinityMinimumMgPerLAsCaco3();
        InputNotUsed notUsed = new InputNotUsed();
        if (noDays) {
            String reason = "days need both volume_l and alkalinity_mg_per_l_as_caco3";
            notUsed.because(reason, "volume_l", request.volumeL())
                    .because(reason, "alkalinity_mg_per_l_as_caco3", request.alkalinityMgPerLAsCaco3())
                    .because(
                            reason,
                            "alkalinity_minimum_mg_per_l_as_caco3",
                            minimum == DEFAULT_MINIMUM ? null : minimum);
        }
        if (load.ration().isEmpty()) {
            notUsed.because(
                    "the ammonia oxidized was given, not the feed", "protein_percent", request.proteinPercent());
        }
        return notUsed;
    }
}
