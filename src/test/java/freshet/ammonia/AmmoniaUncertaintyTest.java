package freshet.ammonia;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import freshet.acidity.PhScale;
import freshet.ammonia.AmmoniaUncertainty.Sensors;
import java.util.Arrays;
import java.util.Random;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class AmmoniaUncertaintyTest {

    private static final int TRIALS = 200_000;
    private static final Sensors DEFAULT = new Sensors(0.1, 0.1, 0.5);

    /** Computed example of the methods page, section 10, with u(pKa) 0.01: 12.6 % of NH3, of which pKa 2.2 %. */
    @Test
    void theContributionsAddInSquares() {
        Water water = new Water(8, 25, 0, PhScale.NBS);
        double u = AmmoniaUncertainty.relative(
                water, AmmoniaMethod.EMERSON_1975.dissociation(), new Sensors(0.05, 0.05, 0.5));
        double k = Math.log(10) * (1 - 0.05366);
        double withOther = Math.sqrt(u * u + k * k * (0.01 * 0.01 - 0.005 * 0.005));
        assertThat(withOther).isCloseTo(0.126, within(0.0005));
    }

    /**
     * JCGM 101:2008, seeded; over the profiles' ranges of pH and temperature. The error of a kit is taken as a share of its
     * reading; with a normal one the upper bound at pH 9 and 34 °C differs by 3.14 %.
     */
    @ParameterizedTest
    @CsvSource({
        "6, 2, 0",
        "6.5, 5, 0",
        "7.2, 15, 0",
        "8, 26, 0",
        "8.5, 31, 0",
        "9, 21.5, 0",
        "9, 34, 0",
        "7, 4, 33",
        "8, 18, 35",
        "8.5, 26, 35",
        "8.9, 30, 33"
    })
    void firstOrderAgreesWithMonteCarlo(double ph, double t, double salinity) {
        AmmoniaDissociation dissociation = AmmoniaMethod.defaultFor(salinity).dissociation();
        Random random = new Random(20261201);
        double[] nh3 = new double[TRIALS];
        for (int i = 0; i < TRIALS; i++) {
            double pKa = dissociation.pKa(t + DEFAULT.temperatureC() * random.nextGaussian(), salinity, PhScale.NBS)
                    + AmmoniaUncertainty.pKa(salinity) * random.nextGaussian();
            nh3[i] = Math.exp(DEFAULT.tan() * random.nextGaussian())
                    * AmmoniaDissociation.fraction(pKa, ph + DEFAULT.ph() * random.nextGaussian());
        }
        Arrays.sort(nh3);
        double fraction = dissociation.fraction(ph, t, salinity, PhScale.NBS);
        double factor = AmmoniaUncertainty.factor(
                AmmoniaUncertainty.relative(new Water(ph, t, salinity, PhScale.NBS), dissociation, DEFAULT));
        assertThat(fraction * factor).isCloseTo(nh3[(int) (0.975 * TRIALS)], Percentage.withPercentage(3));
        assertThat(fraction / factor).isCloseTo(nh3[(int) (0.025 * TRIALS)], Percentage.withPercentage(3));
    }
}
