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

/** The worked examples of capacity. */
class CapacityExampleTest {

    @Test
    void workedExampleA() {
        ask(A).gives("{'capacity_tan_g_per_day':303.109,'capacity_lower_tan_g_per_day':86.6025,"
                        + "'capacity_upper_tan_g_per_day':519.615,'rate_g_per_m2_per_day':0.303109,"
                        + "'temperature_factor':1,'tan_factor':0.866025,'oxygen_factor':1,'ph_factor':1,"
                        + "'alkalinity_factor':1,'salinity_factor':1,'carbon_factor':1,'limiting_factor':'tan',"
                        + "'method':'biofilter-capacity','validity':'within'}")
                .notes("published-spread")
                .leavesOut("load_carried", "equilibrium_tan_mg_per_l", "tan_load_g_per_day", "rate_g_per_m3_per_day");
    }

    @Test
    void workedExampleB() {
        ask(B).gives("{'load_carried':false,'temperature_factor':0.596267,'tan_factor':0.866025,"
                        + "'oxygen_factor':0.939336,'ph_factor':0.7501,'alkalinity_factor':0.8,'salinity_factor':1,"
                        + "'carbon_factor':0.684168,'rate_g_per_m2_per_day':0.0697000,"
                        + "'capacity_tan_g_per_day':69.7000,'capacity_lower_tan_g_per_day':18.9197,"
                        + "'capacity_upper_tan_g_per_day':119.486,'transport_tan_g_per_day':288,"
                        + "'limiting_factor':'temperature','utilization_percent':129.125,"
                        + "'headroom_tan_g_per_day':-20.3000,'ultimate_tan_g_per_day':69.7000}")
                .notes("load-exceeds-capacity")
                .leavesOut("equilibrium_tan_mg_per_l", "equilibrium_nh3_n_mg_per_l", "peak_utilization_percent");
    }

    @Test
    void workedExampleB2() {
        ask(B.replace(
                        "'alkalinity_mg_per_l_as_caco3':40,'carbon_to_nitrogen':0.5",
                        "'alkalinity_mg_per_l_as_caco3':80"))
                .gives("{'load_carried':true,'capacity_tan_g_per_day':127.344,'utilization_percent':70.6745,"
                        + "'headroom_tan_g_per_day':37.3445,'equilibrium_tan_mg_per_l':0.661087}")
                .notesNothingOf("load-exceeds-capacity", "tan-floor");
    }

    @Test
    void workedExampleC() {
        Asked asked = ask(C).gives("{'load_carried':true,'temperature_factor':1.16986,'tan_factor':0.707107,"
                        + "'oxygen_factor':1,'salinity_factor':0.64,'rate_g_per_m2_per_day':0.185296,"
                        + "'media_tan_g_per_day':185.296,'transport_tan_g_per_day':75,'capacity_tan_g_per_day':75,"
                        + "'capacity_lower_tan_g_per_day':38.0519,'capacity_upper_tan_g_per_day':90,"
                        + "'limiting_factor':'flow','utilization_percent':160,'headroom_tan_g_per_day':-45,"
                        + "'equilibrium_tan_mg_per_l':1.6,'ultimate_tan_g_per_day':256.203}")
                .notes("nbs-in-saline-water");
        assertThat(asked.body().has("equilibrium_nh3_n_mg_per_l")).isTrue();
    }

    @Test
    void workedExampleD() {
        ask(D).gives("{'temperature_factor':1.26532,'tan_factor':0.632456,'oxygen_factor':1,'ph_factor':0.9167,"
                        + "'carbon_factor':1,'rate_g_per_m2_per_day':0.161391,'capacity_tan_g_per_day':96.8347,"
                        + "'utilization_percent':61.9612,'equilibrium_tan_mg_per_l':0.307136}")
                .notesNothingOf("above-measured-rate");
    }

    @Test
    void workedExampleD2() {
        ask(with(D, "'reference_tan_mg_per_l':0.5"))
                .gives("{'tan_factor':1.26491,'rate_g_per_m2_per_day':0.322782,'capacity_tan_g_per_day':193.669}")
                .notes("above-measured-rate");
    }

    @Test
    void workedExampleE() {
        ask(E).gives("{'temperature_factor':1.26532,'tan_factor':0.707107,'oxygen_factor':1,"
                        + "'rate_g_per_m3_per_day':223.679,'media_tan_g_per_day':447.358,"
                        + "'transport_tan_g_per_day':300,'oxygen_transport_tan_g_per_day':459.633,"
                        + "'capacity_tan_g_per_day':300,'capacity_lower_tan_g_per_day':180,"
                        + "'capacity_upper_tan_g_per_day':360,'limiting_factor':'flow'}")
                .leavesOut("rate_g_per_m2_per_day");
    }
}
