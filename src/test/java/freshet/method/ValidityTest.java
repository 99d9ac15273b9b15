package freshet.method;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class ValidityTest {

    private static final Range NARROW = new Range("temperature_c", -2, 35, "Cel");
    private static final Range WIDE = new Range("temperature_c", -2, 40, "Cel");
    private static final Range SHIFTED = new Range("temperature_c", 0, 50, "Cel");
    private static final Range SALINITY = new Range("salinity", -2, 35, "1");

    @Test
    void aRangeThatTwoMethodsShareIsToldOnce() {
        assertThat(outside(WIDE).and(outside(WIDE)).exceeded()).containsExactly(WIDE);
    }

    @Test
    void ofRangesWithinEachOtherTheNarrowestIsTold() {
        assertThat(outside(NARROW).and(outside(WIDE)).exceeded()).containsExactly(NARROW);
        assertThat(outside(WIDE).and(outside(NARROW)).exceeded()).containsExactly(NARROW);
        assertThat(outside(WIDE).and(outside(SALINITY)).and(outside(NARROW)).exceeded())
                .containsExactly(SALINITY, NARROW);
    }

    @Test
    void rangesThatOnlyOverlapOrAreOfOtherQuantitiesAreAllTold() {
        assertThat(outside(WIDE).and(outside(SHIFTED)).exceeded()).containsExactly(WIDE, SHIFTED);
        assertThat(outside(NARROW).and(outside(SALINITY)).exceeded()).containsExactly(NARROW, SALINITY);
    }

    @Test
    void whatLiesWithinChangesNothing() {
        assertThat(Validity.WITHIN.and(WIDE, 40).within()).isTrue();
        assertThat(Validity.WITHIN.and(WIDE, Math.nextUp(40.0)).within()).isFalse();
        assertThat(outside(WIDE).and(NARROW, 35).exceeded()).containsExactly(WIDE);
    }

    private static Validity outside(Range range) {
        return Validity.of(range, 1000);
    }
}
