package freshet.nitrification.web;

import static org.assertj.core.api.Assertions.assertThat;

import freshet.http.Calculation;
import org.junit.jupiter.api.Test;

class SizingAnswerTest {

    private static final Calculation<?, ?> SIZING = new NitrificationCalculations().nitrificationSizing();

    private static final String WATER = "'temperature_c':16,'tan_mg_per_l':1,'dissolved_oxygen_mg_per_l':6,'ph':7.2,"
            + "'alkalinity_mg_per_l_as_caco3':80}";
    private static final String TAN = "{'media':'moving-bed','tan_load_g_per_day':386.4," + WATER;
    private static final String FEED = "{'media':'moving-bed','feed_kg_per_day':10,'protein_percent':42," + WATER;

    private static Asked ask(String body) {
        return Asked.of(SIZING, body);
    }

    private static String with(String body, String more) {
        return body.substring(0, body.length() - 1) + "," + more + "}";
    }

    @Test
    void workedExampleWithATanLoad() {
        ask(TAN).gives("{'media_area_m2':3305.84,'media_area_lower_m2':1928.40,'media_area_upper_m2':11570.4,"
                        + "'media_volume_m3':6.61167,'media_volume_lower_m3':3.85680,'media_volume_upper_m3':23.1408,"
                        + "'biofilter_flow_l_per_hour':48300,'method':'biofilter-sizing','validity':'within'}")
                .notes("published-spread");
    }

    @Test
    void workedExampleWithFeed() {
        ask(with(FEED, "'meals':'several'"))
                .gives("{'media_area_m2':3746.61,'media_area_lower_m2':2185.52,'media_area_upper_m2':13113.1,"
                        + "'media_volume_m3':7.49323,'biofilter_flow_l_per_hour':54740}")
                .notesNothingOf("safety-below-peak");
    }

    @Test
    void theHigherOfSafetyAndPeakCounts() {
        ask(with(FEED, "'safety_factor':2")).gives("{'biofilter_flow_l_per_hour':64400}");
        ask(with(FEED, "'safety_factor':1.2"))
                .gives("{'biofilter_flow_l_per_hour':54740}")
                .notes("safety-below-peak");
        ask(with(TAN, "'safety_factor':1,'meals':'one'"))
                .gives("{'biofilter_flow_l_per_hour':32200}")
                .notes("input-not-used");
    }

    @Test
    void volumetricMediaHaveNoArea() {
        ask(TAN.replace("moving-bed", "floating-bead"))
                .gives("{'media_volume_m3':4.62817}")
                .leavesOut("media_area_m2", "media_area_lower_m2", "media_area_upper_m2");
    }

    @Test
    void waterThatMustBringOxygenNeedsMoreOfIt() {
        // 1000 x 579.6 x 4.56886/(24 x 0.5)
        ask(with(TAN.replace("moving-bed", "submerged"), "'inflow_dissolved_oxygen_mg_per_l':2.5"))
                .gives("{'biofilter_flow_l_per_hour':220676}");
        ask(with(TAN.replace("moving-bed", "submerged"), "'inflow_dissolved_oxygen_mg_per_l':9"))
                .gives("{'biofilter_flow_l_per_hour':48300}");
        ask(with(TAN, "'inflow_dissolved_oxygen_mg_per_l':2"))
                .gives("{'biofilter_flow_l_per_hour':48300}")
                .notes("input-not-used");
        assertThat(Asked.refused(
                        SIZING, with(TAN.replace("moving-bed", "submerged"), "'inflow_dissolved_oxygen_mg_per_l':2")))
                .containsExactly("inflow_dissolved_oxygen_mg_per_l unreachable");
    }

    @Test
    void whereNothingGrowsNoSizeSuffices() {
        assertThat(Asked.refused(SIZING, TAN.replace("'ph':7.2", "'ph':6"))).containsExactly("ph unreachable");
        assertThat(Asked.refused(
                        SIZING,
                        "{'media':'moving-bed','tan_load_g_per_day':1,'temperature_c':2,'tan_mg_per_l':0,"
                                + "'dissolved_oxygen_mg_per_l':0,'ph':11,'alkalinity_mg_per_l_as_caco3':0}"))
                .containsExactly(
                        "dissolved_oxygen_mg_per_l unreachable",
                        "alkalinity_mg_per_l_as_caco3 unreachable",
                        "ph unreachable",
                        "temperature_c unreachable",
                        "tan_mg_per_l unreachable");
        assertThat(Asked.refused(SIZING, with(TAN, "'removal_per_pass_percent':0")))
                .containsExactly("removal_per_pass_percent unreachable");
        assertThat(Asked.refused(
                        SIZING,
                        "{'reference_rate_g_per_m2_per_day':0,'reference_temperature_c':16,'tan_load_g_per_day':1,"
                                + WATER))
                .containsExactly("reference_rate_g_per_m2_per_day unreachable");
    }

    @Test
    void aMeasuredRateSizesToo() {
        String measured =
                "{'reference_rate_g_per_m2_per_day':0.3,'reference_temperature_c':16,'tan_load_g_per_day':386.4,"
                        + WATER;
        // 579.6/(0.3 x 0.707107)
        ask(measured)
                .gives("{'media_area_m2':2732.26}")
                .leavesOut("media_area_lower_m2", "media_volume_m3")
                .notes("no-published-spread", "no-specific-surface");
        ask(with(measured, "'media':'moving-bed'")).gives("{'media_area_m2':2732.26,'media_volume_m3':5.46452}");
        ask(with(measured, "'specific_surface_m2_per_m3':250")).gives("{'media_volume_m3':10.9290}");
        assertThat(Asked.refused(SIZING, with(measured, "'specific_surface_m2_per_m3':250,'media':'moving-bed'")))
                .containsExactly("media conflict");
        String perVolume =
                measured.replace("reference_rate_g_per_m2_per_day':0.3", "reference_rate_g_per_m3_per_day':300");
        ask(with(perVolume, "'specific_surface_m2_per_m3':250"))
                .gives("{'media_volume_m3':2.73226}")
                .leavesOut("media_area_m2")
                .notes("input-not-used");
        assertThat(Asked.refused(SIZING, with(perVolume, "'media':'moving-bed'")))
                .containsExactly("media conflict");
    }

    @Test
    void noLoadNeedsNothing() {
        ask(TAN.replace("386.4", "0")).gives("{'media_area_m2':0,'biofilter_flow_l_per_hour':0}");
    }

    @Test
    void exactlyOneLoadIsTaken() {
        assertThat(Asked.refused(SIZING, "{'media':'moving-bed'," + WATER))
                .containsExactly("tan_load_g_per_day one-required");
        assertThat(Asked.refused(SIZING, with(TAN, "'feed_kg_per_day':1,'protein_percent':40")))
                .containsExactly("feed_kg_per_day conflict");
        ask(with(TAN, "'protein_percent':40")).notes("input-not-used");
    }

    @Test
    void littleOxygenAndAcidAreNoted() {
        ask(TAN.replace("'dissolved_oxygen_mg_per_l':6,'ph':7.2", "'dissolved_oxygen_mg_per_l':1.5,'ph':6.7"))
                .notes("oxygen-critical", "acclimated-film");
    }
}
