package freshet.nitrification.web;

import freshet.answer.Answer;
import freshet.answer.Notice;
import freshet.http.media.SixDigits;
import freshet.method.Validity;
import freshet.nitrification.BiofilterCapacity;
import freshet.nitrification.FilterWater;
import freshet.nitrification.LoadedBiofilter;
import freshet.nitrification.Rate;
import java.util.List;
import java.util.Optional;

/** Puts together the answer on what a biofilter oxidizes. */
final class CapacityAnswer {

    private final NitrificationCapacityRequest request;
    private final CapacityInputs inputs;
    private final FilterWater water;
    private final BiofilterCapacity capacity;
    private final Optional<LoadedBiofilter> loaded;

    private CapacityAnswer(NitrificationCapacityRequest request) {
        this.request = request;
        inputs = new CapacityInputs(request);
        water = request.conditions().water();
        capacity = BiofilterCapacity.of(
                inputs.filter(), water, request.conditions().temperatureMethod());
        loaded = request.inflow().load().map(load -> new LoadedBiofilter(capacity, load, water));
    }

    static Answer<NitrificationCapacityResponse> to(NitrificationCapacityRequest request) {
        return new CapacityAnswer(request).answer();
    }

    private Answer<NitrificationCapacityResponse> answer() {
        Validity validity = BiofilterCapacity.validity(water);
        if (loaded.isPresent()) {
            validity = validity.and(loaded.get().load().validity());
        }
        return new Answer<>(
                NitrificationCapacityResponse.of(capacity, loaded), BiofilterCapacity.METHOD, validity, notices());
    }

    private List<Notice> notices() {
        Rate rate = capacity.rate();
        boolean measured = request.reference().measured();
        BiofilterNotices notices = new BiofilterNotices().oxygen(water);
        loaded.ifPresent(filter -> addLoadNotices(filter, notices));
        notices.spread(rate, measured, "capacity_tan_g_per_day")
                .measured(rate, measured)
                .lowPh(water)
                .inputs(inputs.notUsed());
        loaded.ifPresent(filter -> addEquilibriumNotices(filter, notices));
        return notices.inOrder();
    }

    private static void addLoadNotices(LoadedBiofilter filter, BiofilterNotices notices) {
        notices.when(!filter.carried(), "load-exceeds-capacity", "load_carried", excess(filter))
                .when(
                        filter.utilizationPercent().isEmpty(),
                        "no-capacity",
                        "utilization_percent",
                        "Nothing is oxidized at present, so there is no utilization: see limiting_factor.");
    }

    private static String excess(LoadedBiofilter filter) {
        String media = "Total ammonia keeps rising: the media oxidize at most "
                + SixDigits.text(filter.ultimateTanGPerDay()) + " g/day";
        return filter.bearableTanGPerDay() < filter.ultimateTanGPerDay()
                ? media + ", and the water through them allows " + SixDigits.text(filter.bearableTanGPerDay()) + "."
                : media + " at this oxygen, pH, temperature and salinity.";
    }

    private static void addEquilibriumNotices(LoadedBiofilter filter, BiofilterNotices notices) {
        boolean fromFeed = filter.load().ration().isPresent();
        notices.when(
                        filter.saline() && filter.carried(),
                        "nbs-in-saline-water",
                        "ph",
                        "NH3 from an NBS pH in saline water reads high: up to 30 % at salinity 2 to 20, about 10 % in sea"
                                + " water.")
                .when(
                        fromFeed && filter.feedCarriedKgPerDay().isEmpty(),
                        "feed-without-protein",
                        "feed_carried_kg_per_day",
                        "Feed without protein gives no ammonia: no amount of it is too much for the filter.")
                .when(
                        filter.atFloor(),
                        "tan-floor",
                        "equilibrium_tan_mg_per_l",
                        "No film lives on less: a filter cannot hold total ammonia below 0.088 mg/L.");
    }
}
