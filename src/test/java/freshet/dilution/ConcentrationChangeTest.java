package freshet.dilution;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import freshet.PublishedTable;
import freshet.PublishedTable.Row;
import freshet.answer.FaultCode;
import freshet.answer.Refusal;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/** Published exchanges, and exchanges carried out step by step. */
class ConcentrationChangeTest {

    static List<Row> published() {
        return PublishedTable.of("dilution").rows();
    }

    @ParameterizedTest
    @MethodSource("published")
    void publishedValuesAreReproduced(Row row) {
        ConcentrationChange change =
                new ConcentrationChange(1, row.number("now"), row.number("target"), row.number("source"));
        double volumes = switch (row.output()) {
            case "single" -> change.singleL();
            case "continuous" -> change.continuousL();
            case "staged" -> {
                int stages = (int) row.number("stages");
                yield stages * change.stageL(stages);
            }
            case "stages" -> change.stages(row.number("max_percent"));
            default -> throw new IllegalArgumentException(row.output());
        };
        assertThat(volumes).isCloseTo(row.expected(), within(row.tolerance()));
    }

    @Test
    void stagesCarriedOutOneByOneHitTheTarget() {
        SplittableRandom random = new SplittableRandom(61);
        for (int i = 0; i < 5000; i++) {
            double source = random.nextDouble(0, 50);
            double now = random.nextDouble(0, 200);
            double target = source + (now - source) * random.nextDouble(0.01, 0.99);
            double most = random.nextDouble(1, 99);
            ConcentrationChange change = new ConcentrationChange(1000, now, target, source);
            int stages = change.stages(most);
            double share = change.stageL(stages) / 1000;
            assertThat(share).isLessThanOrEqualTo(most / 100 + 1e-12);
            double c = now;
            for (int n = 0; n < stages; n++) {
                c = source + (c - source) * (1 - share);
            }
            assertThat(c).isCloseTo(target, within(1e-9));
            if (stages > 1) {
                assertThat(change.stageL(stages - 1) / 1000)
                        .as("fewer stages would be too large")
                        .isGreaterThan(most / 100);
            }
        }
    }

    @Test
    void manySmallStagesTendToTheContinuousExchangeFromBelow() {
        ConcentrationChange change = new ConcentrationChange(1000, 100, 10, 0);
        double before = change.singleL();
        for (int stages = 2; stages <= 1024; stages *= 2) {
            double water = stages * change.stageL(stages);
            assertThat(water).isGreaterThan(before).isLessThan(change.continuousL());
            before = water;
        }
        assertThat(before).isCloseTo(change.continuousL(), within(5.0));
    }

    @ParameterizedTest
    @CsvSource({"50, 50, 5", "40, 50, 5", "120, 110, 130", "5, 5, 5", "0, 0, 0", "50, 60, 5", "10, 5, 20"})
    void aTargetThatIsMetAlreadyNeedsNothing(double now, double target, double source) {
        assertThat(new ConcentrationChange(100, now, target, source).alreadyMet())
                .isTrue();
    }

    @ParameterizedTest
    @CsvSource({"50, 3, 5", "5, 3, 5", "5, 7, 5", "10, 30, 20", "0, 1, 0"})
    void aTargetBeyondTheSourceIsUnreachable(double now, double target, double source) {
        ConcentrationChange change = new ConcentrationChange(100, now, target, source);
        assertThat(change.alreadyMet()).isFalse();
        assertThatThrownBy(change::singleL).isInstanceOfSatisfying(Refusal.class, refusal -> {
            assertThat(refusal.faults().get(0).code()).isEqualTo(FaultCode.UNREACHABLE);
            boolean richer = source > now;
            assertThat(refusal.faults().get(0).minimum().isPresent()).isEqualTo(!richer);
            assertThat(refusal.faults().get(0).maximum().isPresent()).isEqualTo(richer);
        });
    }

    @Test
    void theSourceItselfIsReachedOnlyByReplacingAllWater() {
        ConcentrationChange change = new ConcentrationChange(100, 50, 5, 5);
        assertThat(change.singleL()).isEqualTo(100);
        assertThat(change.stages(100)).isEqualTo(1);
        assertThatThrownBy(() -> change.stages(50)).isInstanceOf(Refusal.class);
        assertThatThrownBy(change::continuousL).isInstanceOf(Refusal.class);
    }

    @Test
    void stagesTooSmallToEverEndAreRefused() {
        ConcentrationChange change = new ConcentrationChange(100, 50, 10, 5);
        for (double most : new double[] {0, 1e-300, 1e-5}) {
            assertThatThrownBy(() -> change.stages(most)).isInstanceOf(Refusal.class);
        }
    }

    @Test
    void whateverTheInputsNoNumberIsLost() {
        double[] extremes = {0, 4.9e-324, 1e-300, 1e-12, 5, Math.nextUp(5.0), 9999.9999, 10_000};
        for (double now : extremes) {
            for (double target : extremes) {
                for (double source : extremes) {
                    ConcentrationChange change = new ConcentrationChange(0.001, now, target, source);
                    if (!change.alreadyMet()) {
                        try {
                            assertThat(change.singleL()).isBetween(0.0, 0.001);
                            assertThat(change.continuousL())
                                    .isGreaterThanOrEqualTo(0)
                                    .isFinite();
                            assertThat(change.stages(50)).isPositive();
                        } catch (Refusal refused) {
                            assertThat(refused.faults()).hasSize(1);
                        }
                    }
                }
            }
        }
    }
}
