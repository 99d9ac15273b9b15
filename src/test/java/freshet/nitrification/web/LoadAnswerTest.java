package freshet.nitrification.web;

import static org.assertj.core.api.Assertions.assertThat;

import freshet.http.Calculation;
import org.junit.jupiter.api.Test;

class LoadAnswerTest {

    private static final Calculation<?, ?> LOAD = new NitrificationCalculations().nitrificationLoad();

    @Test
    void workedExampleOfTheProteinCoefficient() {
        Asked.of(LOAD, "{'feed_kg_per_day':10,'protein_percent':42}")
                .gives("{'tan_g_per_day':386.4,'tan_lower_g_per_day':294,'tan_upper_g_per_day':470.4,"
                        + "'peak_tan_g_per_day':656.88,'feed_nitrogen_g_per_day':672,"
                        + "'method':'protein-coefficient','validity':'within'}")
                .notes("published-spread");
    }

    @Test
    void workedExampleOfTheNitrogenBalance() {
        Asked.of(LOAD, "{'feed_kg_per_day':10,'protein_percent':42,'method':'nitrogen-balance'}")
                .gives("{'tan_g_per_day':324.670,'tan_lower_g_per_day':148.176,'tan_upper_g_per_day':510.72,"
                        + "'method':'nitrogen-balance'}");
    }

    @Test
    void noFeedGivesNothingAndNeedsNoNotice() {
        Asked none = Asked.of(LOAD, "{'feed_kg_per_day':0,'protein_percent':42,'method':'nitrogen-balance'}")
                .gives("{'tan_g_per_day':0,'tan_lower_g_per_day':0,'tan_upper_g_per_day':0,"
                        + "'peak_tan_g_per_day':0,'feed_nitrogen_g_per_day':0}");
        assertThat(none.notices()).isEmpty();
    }

    @Test
    void aShareThatIsGivenHoldsAtAllCorners() {
        Asked.of(
                        LOAD,
                        "{'feed_kg_per_day':10,'protein_percent':42,'method':'nitrogen-balance','feed_eaten_percent':98,"
                                + "'protein_digestibility_percent':88,'nitrogen_retained_percent':30,"
                                + "'ammonia_share_percent':85}")
                .gives("{'tan_g_per_day':324.670,'tan_lower_g_per_day':324.670,'tan_upper_g_per_day':324.670}");
    }

    @Test
    void mealsSetThePeak() {
        Asked.of(LOAD, "{'feed_kg_per_day':10,'protein_percent':42,'meals':'one'}")
                .gives("{'peak_tan_g_per_day':927.36}");
        Asked.of(LOAD, "{'feed_kg_per_day':10,'protein_percent':42,'meals':'continuous'}")
                .gives("{'peak_tan_g_per_day':463.68}");
    }

    @Test
    void solidsThatStayGiveMore() {
        Asked.of(LOAD, "{'feed_kg_per_day':1,'protein_percent':35,'solids_retained':true}")
                .gives("{'tan_g_per_day':50.4,'tan_lower_g_per_day':39.2,'tan_upper_g_per_day':56}");
    }

    @Test
    void inputsOfTheOtherMethodAreNamed() {
        Asked.of(LOAD, "{'feed_kg_per_day':1,'protein_percent':35,'feed_eaten_percent':90}")
                .gives("{'tan_g_per_day':32.2}")
                .notes("input-not-used");
        Asked.of(
                        LOAD,
                        "{'feed_kg_per_day':1,'protein_percent':35,'method':'nitrogen-balance','solids_retained':false,"
                                + "'fish_nitrogen_g_per_g':0.03}")
                .notes("input-not-used");
    }

    @Test
    void whatContradictsItselfIsRefused() {
        assertThat(Asked.refused(
                        LOAD,
                        "{'feed_kg_per_day':1,'protein_percent':35,'method':'nitrogen-balance',"
                                + "'nitrogen_retained_percent':88}"))
                .containsExactly("nitrogen_retained_percent inconsistent");
        assertThat(Asked.refused(
                        LOAD,
                        "{'feed_kg_per_day':1,'protein_percent':35,'method':'nitrogen-balance',"
                                + "'nitrogen_retained_percent':30,'feed_conversion_ratio':1.2}"))
                .containsExactly("feed_conversion_ratio conflict");
        assertThat(Asked.refused(
                        LOAD,
                        "{'feed_kg_per_day':1,'protein_percent':0,'method':'nitrogen-balance',"
                                + "'feed_conversion_ratio':1.2}"))
                .containsExactly("feed_conversion_ratio inconsistent");
    }

    @Test
    void unusualProteinIsOutsideTheStatedRange() {
        Asked.of(LOAD, "{'feed_kg_per_day':1,'protein_percent':60}").gives("{'validity':'outside'}");
    }
}
