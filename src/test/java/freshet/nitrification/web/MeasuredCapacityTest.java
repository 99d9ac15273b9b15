package freshet.nitrification.web;

import static freshet.nitrification.web.CapacityQuestions.A;
import static freshet.nitrification.web.CapacityQuestions.B;
import static freshet.nitrification.web.CapacityQuestions.CAPACITY;
import static freshet.nitrification.web.CapacityQuestions.D;
import static freshet.nitrification.web.CapacityQuestions.E;
import static freshet.nitrification.web.CapacityQuestions.ask;
import static freshet.nitrification.web.CapacityQuestions.with;
import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

/** Capacity from a measured rate, and what does not fit together. */
class MeasuredCapacityTest {

    @Test
    void mediaStandBesideAMeasuredRateOnlyForTheirSurface() {
        ask(D.replace("'media_area_m2':600", "'media_volume_m3':1.2,'media':'moving-bed'"))
                .gives("{'capacity_tan_g_per_day':96.8347}");
        ask(D.replace("'media_area_m2':600", "'media_volume_m3':2,'specific_surface_m2_per_m3':300"))
                .gives("{'capacity_tan_g_per_day':96.8347}");
        ask(D.replace("reference_rate_g_per_m2_per_day':0.22", "reference_rate_g_per_m3_per_day':110")
                        .replace("'media_area_m2':600", "'media_area_m2':600,'media':'moving-bed'"))
                .gives("{'capacity_tan_g_per_day':96.8347,'rate_g_per_m3_per_day':80.6955}");
        assertThat(Asked.refused(CAPACITY, with(D, "'media':'moving-bed'"))).containsExactly("media conflict");
        assertThat(Asked.refused(
                        CAPACITY,
                        D.replace(
                                "'media_area_m2':600",
                                "'media_volume_m3':2,'specific_surface_m2_per_m3':300,'media':'moving-bed'")))
                .containsExactly("media conflict");
        assertThat(Asked.refused(CAPACITY, D.replace("'media_area_m2':600", "'media_volume_m3':2")))
                .containsExactly("specific_surface_m2_per_m3 missing");
        assertThat(Asked.refused(
                        CAPACITY, D.replace("'media_area_m2':600", "'media_volume_m3':2,'media':'floating-bead'")))
                .containsExactly("specific_surface_m2_per_m3 missing");
    }

    @Test
    void whatDoesNotFitTogetherIsRefused() {
        assertThat(Asked.refused(CAPACITY, E.replace("'media_volume_m3':2", "'media_area_m2':2")))
                .containsExactly("media_area_m2 conflict");
        assertThat(Asked.refused(CAPACITY, with(A, "'media_volume_m3':2"))).containsExactly("media_volume_m3 conflict");
        assertThat(Asked.refused(CAPACITY, A.replace("'media':'moving-bed',", "")))
                .containsExactly("media one-required");
        assertThat(Asked.refused(CAPACITY, A.replace("'media_area_m2':1000,", "")))
                .containsExactly("media_area_m2 one-required");
        assertThat(Asked.refused(CAPACITY, D.replace("'reference_temperature_c':12,", "")))
                .containsExactly("reference_temperature_c missing");
        assertThat(Asked.refused(CAPACITY, with(D, "'reference_rate_g_per_m3_per_day':100")))
                .containsExactly("reference_rate_g_per_m3_per_day conflict");
        assertThat(Asked.refused(CAPACITY, with(A, "'protein_percent':40"))).containsExactly("feed_kg_per_day missing");
        assertThat(Asked.refused(CAPACITY, with(A, "'feed_kg_per_day':40"))).containsExactly("protein_percent missing");
        assertThat(Asked.refused(CAPACITY, with(B, "'feed_kg_per_day':40,'protein_percent':40")))
                .containsExactly("feed_kg_per_day conflict");
    }

    @Test
    void aMeasurementWhereNothingGrowsIsInconsistentAndAllFaultsAreTold() {
        assertThat(Asked.refused(
                        CAPACITY,
                        with(
                                D,
                                "'reference_ph':5.9,'reference_tan_mg_per_l':0,'reference_dissolved_oxygen_mg_per_l':0,"
                                        + "'reference_alkalinity_mg_per_l_as_caco3':0,'salinity':6")))
                .containsExactly(
                        "reference_tan_mg_per_l inconsistent",
                        "reference_dissolved_oxygen_mg_per_l inconsistent",
                        "reference_ph inconsistent",
                        "reference_alkalinity_mg_per_l_as_caco3 inconsistent",
                        "reference_salinity missing");
    }

    @Test
    void aMeasuredRateMovesByTheRatioOfEachFactor() {
        ask(with(
                        D,
                        "'reference_ph':7.1,'reference_alkalinity_mg_per_l_as_caco3':25,'reference_tan_mg_per_l':3,"
                                + "'reference_dissolved_oxygen_mg_per_l':3.4,'salinity':35,'reference_salinity':35"))
                .gives("{'ph_factor':1,'alkalinity_factor':2,'salinity_factor':1,'tan_factor':0.632456,"
                        + "'oxygen_factor':1.41421}");
    }

    @Test
    void aMeasuredRateComesBackAtItsOwnConditionsWithoutAWarning() {
        ask(with(
                        D.replace("'temperature_c':18", "'temperature_c':12"),
                        "'reference_ph':7.1,'reference_tan_mg_per_l':0.8,'reference_dissolved_oxygen_mg_per_l':7,"
                                + "'reference_alkalinity_mg_per_l_as_caco3':90"))
                .gives("{'rate_g_per_m2_per_day':0.22,'capacity_tan_g_per_day':132}")
                .notesNothingOf("above-measured-rate");
    }

    @Test
    void aMeasuredRateSpreadsWithTemperatureOnly() {
        ask(D).gives("{'capacity_lower_tan_g_per_day':76.5300,'capacity_upper_tan_g_per_day':128.348}")
                .notes("published-spread");
        ask(D.replace("'temperature_c':18", "'temperature_c':12"))
                .leavesOut("capacity_lower_tan_g_per_day", "capacity_upper_tan_g_per_day")
                .notes("no-published-spread")
                .notesNothingOf("published-spread");
        ask(with(D, "'temperature_method':'usepa-1993'")).notes("above-published-spread");
        ask(with(D, "'carbon_to_nitrogen':1")).gives("{'carbon_factor':1}").notes("input-not-used");
    }
}
