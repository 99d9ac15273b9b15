package freshet.nitrification.web;

import static org.assertj.core.api.Assertions.assertThat;

import freshet.http.Calculation;
import org.junit.jupiter.api.Test;

class DemandAnswerTest {

    private static final Calculation<?, ?> DEMAND = new NitrificationCalculations().nitrificationDemand();

    @Test
    void workedExampleWithoutGrowth() {
        Asked.of(DEMAND, "{'tan_oxidized_g_per_day':100}")
                .gives("{'oxygen_g_per_day':456.886,'alkalinity_g_per_day_as_caco3':714.543,"
                        + "'sodium_bicarbonate_g_per_day':1199.49,'carbon_dioxide_g_per_day':628.386,"
                        + "'no3_n_g_per_day':100,'biomass_g_per_day':0,"
                        + "'net_alkalinity_g_per_day_as_caco3':357.271,'net_sodium_bicarbonate_g_per_day':599.743,"
                        + "'method':'catabolic','validity':'within'}")
                .notes("dose-net-not-gross")
                .leavesOut("days_to_alkalinity_minimum");
    }

    @Test
    void workedExampleWithGrowth() {
        Asked.of(DEMAND, "{'tan_oxidized_g_per_day':100,'stoichiometry':'ebeling-2006'}")
                .gives("{'oxygen_g_per_day':418.051,'alkalinity_g_per_day_as_caco3':703.825,"
                        + "'sodium_bicarbonate_g_per_day':1181.49,'carbon_dioxide_g_per_day':584.399,"
                        + "'no3_n_g_per_day':97.56,'biomass_g_per_day':19.7047,"
                        + "'net_alkalinity_g_per_day_as_caco3':346.553,'method':'ebeling-2006'}");
    }

    @Test
    void feedGivesTheAmmoniaOfTheProteinCoefficient() {
        Asked.of(DEMAND, "{'feed_kg_per_day':1,'protein_percent':35}")
                .gives("{'no3_n_g_per_day':32.2,'oxygen_g_per_day':147.117}");
    }

    @Test
    void alkalinityLastsUntilTheNetConsumptionHasUsedItUp() {
        // 10 m3 x 50 mg/L = 500 g, less 357.271 g/day
        Asked.of(DEMAND, "{'tan_oxidized_g_per_day':100,'volume_l':10000,'alkalinity_mg_per_l_as_caco3':120}")
                .gives("{'days_to_alkalinity_minimum':1.39950}");
        Asked.of(DEMAND, "{'tan_oxidized_g_per_day':100,'volume_l':10000,'alkalinity_mg_per_l_as_caco3':60}")
                .gives("{'days_to_alkalinity_minimum':0}")
                .notes("alkalinity-at-minimum");
        Asked.of(DEMAND, "{'tan_oxidized_g_per_day':0,'volume_l':10000,'alkalinity_mg_per_l_as_caco3':120}")
                .leavesOut("days_to_alkalinity_minimum")
                .notes("alkalinity-not-consumed");
    }

    @Test
    void inputsWithoutInfluenceAreNamed() {
        Asked.of(DEMAND, "{'tan_oxidized_g_per_day':100,'volume_l':10000}").notes("input-not-used");
        Asked.of(DEMAND, "{'tan_oxidized_g_per_day':100,'alkalinity_minimum_mg_per_l_as_caco3':80}")
                .notes("input-not-used");
        Asked.of(DEMAND, "{'tan_oxidized_g_per_day':100,'protein_percent':40}").notes("input-not-used");
    }

    @Test
    void exactlyOneLoadIsTaken() {
        assertThat(Asked.refused(DEMAND, "{}")).containsExactly("tan_oxidized_g_per_day one-required");
        assertThat(Asked.refused(DEMAND, "{'feed_kg_per_day':1}")).containsExactly("protein_percent missing");
        assertThat(Asked.refused(DEMAND, "{'feed_kg_per_day':1,'protein_percent':35,'tan_oxidized_g_per_day':1}"))
                .containsExactly("feed_kg_per_day conflict");
    }
}
