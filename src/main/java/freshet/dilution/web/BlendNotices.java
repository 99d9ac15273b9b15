package freshet.dilution.web;

import freshet.acidity.PhScale;
import freshet.ammonia.AmmoniaMethod;
import freshet.answer.Notice;
import freshet.carbonate.CarbonateWater;
import freshet.carbonate.Weiss1974;
import freshet.dilution.Blend;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import org.jspecify.annotations.Nullable;

/** What the reader of a blend must know, most serious first. */
final class BlendNotices {

    private static final double CHLORINE_MG_PER_L = 0.003;
    private static final double HARD_PH_LIMIT = 0.5;
    private static final double HARD_TEMPERATURE_LIMIT_C = 5;
    private static final double HARD_WATER_MG_PER_L = 100;
    private static final double ROUNDING = 1e-9;

    private final DilutionBlendRequest request;
    private final Blend blend;
    private final Blend.Mixture mixture;
    private final DilutionBlendResponse response;
    private final List<Notice> notices = new ArrayList<>();

    BlendNotices(DilutionBlendRequest request, Blend blend, Blend.Mixture mixture, DilutionBlendResponse response) {
        this.request = request;
        this.blend = blend;
        this.mixture = mixture;
        this.response = response;
    }

    List<Notice> all() {
        chlorine();
        ammonia();
        limit();
        shocks();
        air();
        notMixed();
        salt();
        return notices;
    }

    /** Whether a water kills fish by its chlorine. */
    static boolean chlorinated(WaterSample sample) {
        return sample.allChlorineMgPerL() > CHLORINE_MG_PER_L;
    }

    private void chlorine() {
        if (chlorinated(request.source())) {
            note(
                    "chlorine-in-source",
                    request.source().chlorineMgPerLAsCl2() == null
                            ? "source.chloramine_mg_per_l_as_cl2"
                            : "source.chlorine_mg_per_l_as_cl2",
                    "Kills fish, so no share is safe: dechlorinate the source water first, measure to zero, ask again.");
        }
        if (chlorinated(request.tank())) {
            note(
                    "chlorine-in-tank",
                    "tank.chlorine_mg_per_l_as_cl2",
                    "Kills fish: dechlorinate the tank at once; an exchange only thins it.");
        }
        if (WaterSample.zeroIfNone(request.source().chloramineMgPerLAsCl2()) > 0
                || WaterSample.zeroIfNone(request.tank().chloramineMgPerLAsCl2()) > 0) {
            note(
                    "chloramine-frees-ammonia",
                    "source.chloramine_mg_per_l_as_cl2",
                    "Dechlorination of chloramine sets ammonia free; it is counted in tan_mg_per_l where that is known.");
        }
    }

    private void ammonia() {
        if (response.nh3NBeforeMgPerL().isEmpty()) {
            return;
        }
        double before = response.nh3NBeforeMgPerL().getAsDouble() * (1 + ROUNDING);
        boolean atOnce = response.nh3NMgPerL().orElse(0) > before;
        boolean later = response.nh3NSettledMgPerL().orElse(0) > before;
        boolean tanFalls = mixture.water().tanMgPerL() < blend.tank().tanMgPerL();
        if (atOnce && tanFalls) {
            note(
                    "nh3-rises-although-tan-falls",
                    "nh3_n_mg_per_l",
                    "Total ammonia falls, toxic ammonia rises with pH: exchange less, slower, or water of lower pH.");
        } else if (atOnce) {
            note("nh3-rises", "nh3_n_mg_per_l", "The mixture holds more toxic ammonia than the tank does now.");
        }
        if (later && !atOnce) {
            note(
                    "nh3-rises-after-aeration",
                    "nh3_n_settled_mg_per_l",
                    "Toxic ammonia rises hours later, when carbon dioxide has gone and pH with it: exchange less.");
        }
    }

    private void limit() {
        Double limit = request.nh3NLimitMgPerL();
        double worse = Math.max(
                response.nh3NMgPerL().orElse(0), response.nh3NSettledMgPerL().orElse(0));
        if (limit != null && worse > limit * (1 + ROUNDING)) {
            note(
                    "nh3-above-limit",
                    "nh3_n_limit_mg_per_l",
                    "After this exchange toxic ammonia is above the limit given, at once or when CO2 has settled.");
        }
    }

    private void shocks() {
        double ph = Math.abs(response.phChange());
        if (ph > request.phChangeLimit()) {
            note(
                    "ph-shock",
                    "ph_change",
                    "pH changes by more than ph_change_limit"
                            + (ph > HARD_PH_LIMIT ? ", and beyond the hard limit of 0.5" : "")
                            + ": exchange in steps.");
        }
        double degrees = Math.abs(response.temperatureChangeC());
        if (degrees > request.temperatureChangeLimitC()) {
            note(
                    "thermal-shock",
                    "temperature_change_c",
                    "Temperature changes by more than temperature_change_limit_c"
                            + (degrees > HARD_TEMPERATURE_LIMIT_C ? ", and beyond the hard limit of 5 °C" : "")
                            + ": temper the water or go slower.");
        }
    }

    private void air() {
        CarbonateWater water = mixture.water().water();
        if (Weiss1974.farBelowAir(mixture.settled().co2(), water.temperatureC(), water.salinity())) {
            note(
                    "settled-co2-below-air",
                    "settled_co2_mg_per_l",
                    "Less than half of what outdoor air leaves in water: pH and NH3 will settle lower than shown.");
        }
    }

    private void notMixed() {
        List<String> missing = new ArrayList<>();
        if (response.tanMgPerL().isEmpty()) {
            missing.add("tan_mg_per_l");
        }
        oneOnly("no2_n_mg_per_l", WaterSample::no2NMgPerL, missing);
        oneOnly("no3_n_mg_per_l", WaterSample::no3NMgPerL, missing);
        oneOnly("calcium_mg_per_l", WaterSample::calciumMgPerL, missing);
        if (!missing.isEmpty()) {
            note(
                    "not-mixed",
                    missing.get(0),
                    "Not given for both waters, so not mixed"
                            + (response.tanMgPerL().isEmpty() ? ", and NH3 not judged" : "") + ": "
                            + String.join(", ", missing) + ".");
        }
    }

    private void oneOnly(String name, Function<WaterSample, @Nullable Double> quantity, List<String> missing) {
        if ((quantity.apply(request.tank()) == null) != (quantity.apply(request.source()) == null)) {
            missing.add(name);
        }
    }

    private void salt() {
        double most = Math.max(request.tank().salinity(), request.source().salinity());
        if (most > AmmoniaMethod.FRESH_SALINITY && request.phScale() == null) {
            note(
                    "ph-scale-assumed-nbs",
                    "ph_scale",
                    "Every ph was taken as a reading of a probe on NBS or IUPAC buffers.");
        }
        if (most > AmmoniaMethod.FRESH_SALINITY && request.scale() == PhScale.NBS) {
            note(
                    "nbs-in-saline-water",
                    "ph",
                    "In brackish water such a probe is uncertain by 0.1 in pH; NH3 from it reads high.");
        }
        if (hard(request.tank()) || hard(request.source())) {
            note(
                    "ionic-strength-unknown",
                    "salinity",
                    "Hard water at salinity 0 is solved as infinitely dilute: at 200 and 400 mg/L pH may be off by 0.02 and 0.05, NH3 by 4 and 10 %.");
        }
    }

    private static boolean hard(WaterSample sample) {
        return sample.salinity() < AmmoniaMethod.FRESH_SALINITY
                && sample.alkalinityMgPerLAsCaco3() > HARD_WATER_MG_PER_L;
    }

    private void note(String code, String field, String detail) {
        notices.add(new Notice(code, field, detail));
    }
}
