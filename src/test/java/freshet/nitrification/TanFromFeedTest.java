package freshet.nitrification;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import freshet.PublishedTable;
import freshet.answer.FaultCode;
import freshet.answer.Refusal;
import java.util.OptionalDouble;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;

class TanFromFeedTest {

    private static final Ration WORKED = new Ration(10, 42);

    @Test
    void publishedFiguresOfTheProteinCoefficient() {
        checkCoefficient(ProteinCoefficient.METHOD.values());
    }

    @Test
    void everyProteinCoefficientMatters() {
        Nudge.everyConstantMatters(ProteinCoefficient.METHOD, TanFromFeedTest::checkCoefficient);
    }

    private static void checkCoefficient(double[] constants) {
        ProteinCoefficient coefficient = new ProteinCoefficient(constants);
        for (PublishedTable.Row row :
                PublishedTable.of(ProteinCoefficient.METHOD.id()).rows()) {
            Spread tan = coefficient.tanGPerDay(ration(row), row.number("solids_retained") == 1);
            assertThat(tan.estimate()).as(row.id()).isEqualTo(row.expected(), within(row.tolerance()));
        }
        assertSpread(coefficient.tanGPerDay(WORKED, false), 386.4, 294, 470.4);
        assertSpread(coefficient.tanGPerDay(WORKED, true), 604.8, 470.4, 672);
    }

    @Test
    void computedFiguresOfTheNitrogenBalance() {
        checkBalance(NitrogenBalance.METHOD.values());
    }

    @Test
    void everyShareOfTheNitrogenBalanceMatters() {
        Nudge.everyConstantMatters(NitrogenBalance.METHOD, TanFromFeedTest::checkBalance);
    }

    private static void checkBalance(double[] constants) {
        NitrogenBalance balance = new NitrogenBalance(constants);
        for (PublishedTable.Row row :
                PublishedTable.of(NitrogenBalance.METHOD.id()).rows()) {
            NitrogenFate fate = new NitrogenFate(
                    given(row, "eaten"),
                    given(row, "digestibility"),
                    given(row, "retained"),
                    OptionalDouble.empty(),
                    OptionalDouble.empty(),
                    given(row, "ammonia_share"),
                    given(row, "mineralized"));
            Spread tan = balance.tanGPerDay(ration(row), fate);
            assertThat(tan.estimate()).as(row.id()).isEqualTo(row.expected(), within(row.tolerance()));
            assertThat(tan.lower()).isEqualTo(tan.estimate());
            assertThat(tan.upper()).isEqualTo(tan.estimate());
        }
        assertSpread(balance.tanGPerDay(WORKED, NitrogenFate.UNKNOWN), 324.670, 148.176, 510.72);
        // R = 0.0275/(1.2 x 0.0672) = 0.341022
        assertThat(balance.tanGPerDay(WORKED, conversion(1.2)).estimate()).isCloseTo(301.7071, withinPercentage(0.002));
    }

    @Test
    void nitrogenOfProteinIsAsPublishedAndItsFactorMatters() {
        Nudge.everyConstantMatters(Ration.METHOD, constants -> {
            for (PublishedTable.Row row : PublishedTable.of(Ration.METHOD.id()).rows()) {
                assertThat(ration(row).nitrogenGPerDay(constants[0]))
                        .as(row.id())
                        .isEqualTo(row.expected(), within(row.tolerance()));
            }
        });
        assertThat(WORKED.nitrogenGPerDay()).isEqualTo(672, within(1e-9));
    }

    @Test
    void peaksAreThoseOfMeasuredDays() {
        for (PublishedTable.Row row : PublishedTable.of(Meals.METHOD.id()).rows()) {
            assertThat(Meals.values()[(int) row.number("meals")].peakFactor())
                    .as(row.id())
                    .isEqualTo(row.expected(), within(row.tolerance()));
        }
        assertThat(TanLoad.of(WORKED, Meals.SEVERAL).peakFactor()).hasValue(1.7);
        assertThat(Meals.CONTINUOUS.peakFactor()).isEqualTo(1.2);
        assertThat(Meals.ONE.peakFactor()).isEqualTo(2.4);
    }

    @Test
    void ammoniaNeverExceedsFeedNitrogenAndTheEstimateLiesWithinItsSpread() {
        SplittableRandom random = new SplittableRandom(7);
        for (int i = 0; i < 2000; i++) {
            Ration ration = new Ration(random.nextDouble(0, 1000), random.nextDouble(0, 100));
            for (Spread tan : new Spread[] {
                ProteinCoefficient.published().tanGPerDay(ration, false),
                ProteinCoefficient.published().tanGPerDay(ration, true),
                NitrogenBalance.published().tanGPerDay(ration, NitrogenFate.UNKNOWN)
            }) {
                assertThat(tan.estimate()).isBetween(tan.lower(), tan.upper());
                assertThat(tan.upper()).isLessThanOrEqualTo(ration.nitrogenGPerDay() * (1 + 1e-12));
                assertThat(tan.lower()).isNotNegative();
            }
        }
    }

    @Test
    void bothMethodsAgreeWithinTheirSpreads() {
        Spread coefficient = ProteinCoefficient.published().tanGPerDay(WORKED, false);
        Spread balance = NitrogenBalance.published().tanGPerDay(WORKED, NitrogenFate.UNKNOWN);
        assertThat(coefficient.estimate()).isBetween(balance.lower(), balance.upper());
        assertThat(balance.estimate()).isBetween(coefficient.lower(), coefficient.upper());
    }

    @Test
    void feedAndAmmoniaAreInverse() {
        SplittableRandom random = new SplittableRandom(8);
        for (int i = 0; i < 500; i++) {
            Ration ration = new Ration(random.nextDouble(0, 1000), random.nextDouble(1, 100));
            double tan = ProteinCoefficient.tanGPerDay(ration);
            assertThat(ProteinCoefficient.feedKgPerDay(tan, ration.proteinPercent()))
                    .isCloseTo(ration.feedKgPerDay(), withinPercentage(1e-10));
        }
    }

    @Test
    void aCornerThatWouldBeNegativeIsNothing() {
        NitrogenFate hungry = new NitrogenFate(
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                OptionalDouble.of(0.85),
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                OptionalDouble.empty());
        Spread tan = NitrogenBalance.published().tanGPerDay(WORKED, hungry);
        assertThat(tan.lower()).isZero();
        assertThat(tan.estimate()).isPositive();
    }

    @Test
    void fishCannotKeepMoreThanTheyDigest() {
        assertThatExceptionOfType(Refusal.class)
                .isThrownBy(() -> NitrogenBalance.published().tanGPerDay(WORKED, conversion(0.4)))
                .satisfies(refusal -> assertThat(refusal.faults())
                        .singleElement()
                        .satisfies(fault -> {
                            assertThat(fault.field()).isEqualTo("feed_conversion_ratio");
                            assertThat(fault.code()).isEqualTo(FaultCode.INCONSISTENT);
                        }));
    }

    private static NitrogenFate conversion(double ratio) {
        return new NitrogenFate(
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                OptionalDouble.of(ratio),
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                OptionalDouble.empty());
    }

    private static Ration ration(PublishedTable.Row row) {
        return new Ration(row.number("feed_kg_per_day"), row.number("protein_percent"));
    }

    private static OptionalDouble given(PublishedTable.Row row, String input) {
        return OptionalDouble.of(row.number(input));
    }

    private static void assertSpread(Spread actual, double estimate, double lower, double upper) {
        assertThat(actual.estimate()).isCloseTo(estimate, withinPercentage(0.002));
        assertThat(actual.lower()).isCloseTo(lower, withinPercentage(0.002));
        assertThat(actual.upper()).isCloseTo(upper, withinPercentage(0.002));
    }
}
