package freshet.nitrification.web;

import static freshet.nitrification.web.CapacityQuestions.A;
import static freshet.nitrification.web.CapacityQuestions.B;
import static freshet.nitrification.web.CapacityQuestions.C;
import static freshet.nitrification.web.CapacityQuestions.D;
import static freshet.nitrification.web.CapacityQuestions.E;
import static freshet.nitrification.web.CapacityQuestions.ask;
import static freshet.nitrification.web.CapacityQuestions.with;
import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class CapacityAnswerTest {

    @Test
    void feedGivesTheLoadItsPeakAndTheFeedCarried() {
        // load 0.092 x 2000 x 0.40 = 73.6; ultimate 1000 x 0.35 = 350, so 9.51087 kg of this feed
        ask(with(A, "'feed_kg_per_day':2,'protein_percent':40,'meals':'one'"))
                .gives("{'load_carried':true,'tan_load_g_per_day':73.6,'utilization_percent':24.2817,"
                        + "'peak_utilization_percent':58.2760,'ultimate_tan_g_per_day':350,"
                        + "'feed_carried_kg_per_day':9.51087}");
    }

    @Test
    void littleOxygenIsCutAndCritical() {
        ask(A.replace("'dissolved_oxygen_mg_per_l':7", "'dissolved_oxygen_mg_per_l':1"))
                .gives("{'limiting_factor':'oxygen','capacity_tan_g_per_day':67.1097}")
                .notes("oxygen-critical");
    }

    @Test
    void oxygenOfTheWaterCanBeLeastAndAnAeratedFilterIgnoresIt() {
        ask(E.replace("'inflow_dissolved_oxygen_mg_per_l':5.5", "'inflow_dissolved_oxygen_mg_per_l':3"))
                .gives("{'limiting_factor':'oxygen-supply','oxygen_transport_tan_g_per_day':131.324,"
                        + "'capacity_tan_g_per_day':131.324}");
        ask(with(
                        E.replace("'inflow_dissolved_oxygen_mg_per_l':5.5", "'inflow_dissolved_oxygen_mg_per_l':3"),
                        "'tan_load_g_per_day':150"))
                .gives("{'load_carried':false}")
                .notes("load-exceeds-capacity");
        ask(with(B, "'inflow_dissolved_oxygen_mg_per_l':3"))
                .leavesOut("oxygen_transport_tan_g_per_day")
                .notes("input-not-used");
        ask(with(D, "'biofilter_flow_l_per_hour':10000,'inflow_dissolved_oxygen_mg_per_l':3"))
                .gives("{'oxygen_transport_tan_g_per_day':52.5296,'limiting_factor':'oxygen-supply'}");
    }

    @Test
    void aGivenRemovalHoldsAtAllCorners() {
        ask(with(C, "'removal_per_pass_percent':50"))
                .gives("{'capacity_tan_g_per_day':75,'capacity_upper_tan_g_per_day':75}");
        ask(with(C, "'removal_per_pass_percent':0"))
                .gives("{'load_carried':false,'capacity_tan_g_per_day':0,'limiting_factor':'flow'}")
                .leavesOut("utilization_percent")
                .notes("load-exceeds-capacity", "no-capacity");
    }

    @Test
    void bulkVolumeCountsByItsSpecificSurface() {
        ask(A.replace("'media_area_m2':1000", "'media_volume_m3':2")).gives("{'media_tan_g_per_day':303.109}");
        ask(A.replace("'media_area_m2':1000", "'media_volume_m3':2,'specific_surface_m2_per_m3':250"))
                .gives("{'media_tan_g_per_day':151.554}");
        ask(with(A, "'specific_surface_m2_per_m3':250"))
                .gives("{'media_tan_g_per_day':303.109}")
                .notes("input-not-used");
    }

    @Test
    void aLightLoadRestsOnTheFloor() {
        ask(with(A, "'tan_load_g_per_day':5"))
                .gives("{'equilibrium_tan_mg_per_l':0.088}")
                .notes("tan-floor");
        ask(with(A, "'tan_load_g_per_day':0"))
                .gives("{'equilibrium_tan_mg_per_l':0.088,'utilization_percent':0,'load_carried':true}");
    }

    @Test
    void acidAndHeatAreOutsideTheStatedRange() {
        ask(A.replace("'ph':7.4", "'ph':6.5")).gives("{'validity':'within'}").notes("acclimated-film");
        ask(A.replace("'ph':7.4", "'ph':5.9"))
                .gives("{'validity':'outside','capacity_tan_g_per_day':0,'limiting_factor':'ph'}");
        ask(A.replace("'temperature_c':20", "'temperature_c':36")).gives("{'validity':'outside'}");
        ask(A.replace("'temperature_c':20", "'temperature_c':3.9"))
                .gives("{'validity':'outside','temperature_factor':0}");
    }

    @Test
    void inputsWithoutInfluenceAreNamed() {
        ask(with(A, "'removal_per_pass_percent':40")).notes("input-not-used");
        ask(with(A, "'reference_ph':7")).notes("input-not-used");
        ask(with(B, "'meals':'one'")).notes("input-not-used");
        ask(with(B, "'protein_percent':40")).notes("input-not-used");
    }

    @Test
    void feedWithoutProteinIsNeverTooMuch() {
        ask(with(A, "'feed_kg_per_day':2,'protein_percent':0"))
                .leavesOut("feed_carried_kg_per_day")
                .notes("feed-without-protein");
    }

    @Test
    void theLongestCompactAnswerFitsIntoAKibibyte() {
        Asked longest = ask("{'media':'fluidized-sand','media_volume_m3':1234.56,'temperature_c':35.123,"
                + "'tan_mg_per_l':0.00123456,'dissolved_oxygen_mg_per_l':1.23456,'inflow_dissolved_oxygen_mg_per_l':5.5,"
                + "'ph':6.12345,'salinity':33.333,'carbon_to_nitrogen':0.777,"
                + "'alkalinity_mg_per_l_as_caco3':12.3456,'biofilter_flow_l_per_hour':2500000,"
                + "'feed_kg_per_day':0.0123456,'protein_percent':60,'specific_surface_m2_per_m3':777}");
        assertThat(longest.text().length()).isLessThanOrEqualTo(1024);
    }
}
