package freshet.dilution;

import static org.assertj.core.api.Assertions.assertThat;

import freshet.answer.FaultCode;
import freshet.answer.Refusal;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Counts and volumes at the edges of what a double can tell and of what the service accepts. */
class ConcentrationChangeExtremesTest {

    private static final double[] CONCENTRATIONS = {
        0, 4.9e-324, 1e-300, 1e-12, 5, Math.nextUp(5.0), 9999.9999, Math.nextDown(10_000.0), 10_000
    };
    private static final double[] PERCENTS = {
        4.9e-324, 1e-300, 0.001, 0.1, 20, 50, Math.nextDown(100.0), 100,
    };

    @ParameterizedTest
    @ValueSource(doubles = {1, 5, 10, 20, 25, 50, 75})
    void aTargetThatWholeStagesHitTakesNoStageMore(double percent) {
        double target = 10_000;
        for (int stages = 1; stages <= 60 && target > 1e-6; stages++) {
            target *= 1 - percent / 100;
            assertThat(new ConcentrationChange(1000, 10_000, target, 0).stages(percent))
                    .isEqualTo(stages);
        }
    }

    @Test
    void aTargetJustBeyondWholeStagesTakesOneMore() {
        assertThat(new ConcentrationChange(1000, 100, 25 - 1e-9, 0).stages(50)).isEqualTo(3);
        assertThat(new ConcentrationChange(1000, 100, 25 + 1e-9, 0).stages(50)).isEqualTo(2);
    }

    @Test
    void theSmallestStepIsOneStage() {
        ConcentrationChange step = new ConcentrationChange(1000, 10_000, Math.nextDown(10_000.0), 0);
        assertThat(step.alreadyMet()).isFalse();
        assertThat(step.singleL()).isPositive();
        for (double percent : new double[] {0.001, 50, Math.nextDown(100.0)}) {
            assertThat(step.stages(percent)).isEqualTo(1);
        }
        assertThat(step.continuousL() / step.singleL()).isBetween(1 - 1e-12, 1 + 1e-12);
    }

    @Test
    void stagesLieBetweenTheSingleAndTheContinuousExchange() {
        for (ConcentrationChange change : reachable()) {
            for (double percent : PERCENTS) {
                try {
                    int stages = change.stages(percent);
                    double stageL = change.stageL(stages);
                    assertThat(stages).isBetween(1, 1_000_000);
                    assertThat(stageL / change.volumeL())
                            .as("%s at %s %%", change, percent)
                            .isPositive()
                            .isLessThanOrEqualTo(percent / 100 * (1 + 1e-9));
                    assertThat(stages * stageL).isGreaterThanOrEqualTo(change.singleL() * (1 - 1e-9));
                    if (percent < 100) {
                        assertThat(stages * stageL).isLessThanOrEqualTo(change.continuousL() * (1 + 1e-9));
                    }
                } catch (Refusal refused) {
                    assertThat(refused.faults().get(0).code()).isIn(FaultCode.BELOW_MINIMUM, FaultCode.UNREACHABLE);
                }
            }
        }
    }

    @Test
    void theWaterGrowsWithTheVolumeAndWithNothingElse() {
        for (ConcentrationChange change : reachable()) {
            ConcentrationChange doubled = new ConcentrationChange(
                    2 * change.volumeL(), change.nowMgPerL(), change.targetMgPerL(), change.sourceMgPerL());
            assertThat(doubled.singleL()).isEqualTo(2 * change.singleL());
        }
    }

    private static List<ConcentrationChange> reachable() {
        List<ConcentrationChange> changes = new ArrayList<>();
        for (double volume : new double[] {0.001, 1e10}) {
            for (double now : CONCENTRATIONS) {
                for (double target : CONCENTRATIONS) {
                    for (double source : CONCENTRATIONS) {
                        ConcentrationChange change = new ConcentrationChange(volume, now, target, source);
                        if (!change.alreadyMet() && isReachable(change)) {
                            changes.add(change);
                        }
                    }
                }
            }
        }
        assertThat(changes).hasSizeGreaterThan(100);
        return changes;
    }

    private static boolean isReachable(ConcentrationChange change) {
        try {
            return change.reachableRemainder() < 1;
        } catch (Refusal beyond) {
            return false;
        }
    }
}
