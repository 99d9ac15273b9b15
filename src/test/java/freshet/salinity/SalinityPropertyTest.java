package freshet.salinity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.SplittableRandom;
import org.hipparchus.analysis.solvers.BracketingNthOrderBrentSolver;
import org.junit.jupiter.api.Test;

/** What must hold for salinity and density at any conductivity and temperature. */
class SalinityPropertyTest {

    private static final PracticalSalinity1978 SCALE = PracticalSalinity1978.published();
    private static final int WATERS = 5000;

    @Test
    void nothingButNumbersComesOutAnywhereWithinTheBounds() {
        SplittableRandom random = new SplittableRandom(1978);
        for (int i = 0; i < WATERS; i++) {
            double t = random.nextDouble(-2, Math.nextUp(60.0));
            double c =
                    i % 2 == 0 ? random.nextDouble(0, Math.nextUp(100.0)) : StrictMath.pow(10, random.nextInt(-300, 2));
            double salinity = SCALE.salinity(c, t);
            assertThat(salinity).as(c + " mS/cm, " + t).isBetween(0.0, 163.0);
            assertThat(MilleroPoisson1981.kgPerM3(t, salinity)).isBetween(980.0, 1140.0);
        }
    }

    @Test
    void withoutConductivityThereIsNoSalt() {
        for (double t = -2; t <= 60; t += 0.25) {
            assertThat(SCALE.salinity(0, t)).isCloseTo(0, within(1e-15));
            assertThat(SCALE.salinity(Double.MIN_VALUE, t)).isCloseTo(0, within(1e-15));
        }
    }

    @Test
    void theSameConductivityIsLessSaltInWarmerWater() {
        SplittableRandom random = new SplittableRandom(42914);
        for (int i = 0; i < WATERS; i++) {
            double t = random.nextDouble(-2, 59);
            double c = random.nextDouble(0.05, 100);
            assertThat(SCALE.salinity(c, t + 1)).as(c + " mS/cm, " + t).isLessThan(SCALE.salinity(c, t));
        }
    }

    /** The two formulas by themselves leave a jump of up to 0.0004 at 2. */
    @Test
    void theTwoFormulasMeetAtTwo() {
        for (double t = -2; t <= 60; t += 0.5) {
            double warm = t;
            double c = new BracketingNthOrderBrentSolver(1e-15, 1e-13, 0, 5)
                    .solve(200, x -> SCALE.salinity(x, warm) - 2, 1, 12);
            assertThat(SCALE.salinity(c * (1 - 1e-9), t)).isCloseTo(2, within(1e-8));
            assertThat(SCALE.salinity(c * (1 + 1e-9), t)).isCloseTo(2, within(1e-8));
        }
    }

    /** Sea water of 35 at 15 °C of 1968 defines the scale. */
    @Test
    void theScaleIsFixedAtStandardSeaWater() {
        assertThat(SCALE.salinity(42.914, 15 / 1.00024)).isCloseTo(35, within(1e-6));
        assertThat(SCALE.ofRatio(1, 15)).isCloseTo(35, within(1e-12));
    }

    /** Kell G.S. (1975) J. Chem. Eng. Data 20:97-105, as public copies print it. */
    @Test
    void freshWaterHasTheDensityThatKellMeasured() {
        for (double t = 0; t <= 40; t += 0.5) {
            assertThat(MilleroPoisson1981.kgPerM3(t, 0)).isCloseTo(kell(t, 16.879850e-3), within(0.005));
        }
    }

    /** Many copies print two digits of Kell's denominator in the wrong order. */
    @Test
    void theWidespreadMisprintOfKellIsFoundOut() {
        for (double t = 10; t <= 40; t += 5) {
            assertThat(MilleroPoisson1981.kgPerM3(t, 0) - kell(t, 16.897850e-3)).isGreaterThan(0.1);
        }
    }

    @Test
    void freshWaterIsDensestAtFourDegrees() {
        double densest = MilleroPoisson1981.kgPerM3(3.98, 0);
        for (double t = -2; t <= 60; t += 0.1) {
            assertThat(MilleroPoisson1981.kgPerM3(t, 0)).isLessThanOrEqualTo(densest + 1e-6);
        }
    }

    @Test
    void validityFollowsTheSources() {
        assertThat(PracticalSalinity1978.validity(35, 42).within()).isTrue();
        assertThat(PracticalSalinity1978.validity(35.1, 42).within()).isFalse();
        assertThat(PracticalSalinity1978.validity(35, 42.1).within()).isFalse();
        assertThat(MilleroPoisson1981.validity(40, 0).within()).isTrue();
        assertThat(MilleroPoisson1981.validity(40, 43).exceeded()).hasSize(1);
    }

    private static double kell(double t, double denominator) {
        double numerator = 999.83952
                + t * (16.945176 + t * (-7.9870401e-3 + t * (-46.170461e-6 + t * (105.56302e-9 + t * -280.54253e-12))));
        return numerator / (1 + denominator * t);
    }
}
