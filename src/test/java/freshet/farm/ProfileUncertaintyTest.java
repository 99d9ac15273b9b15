package freshet.farm;

import static org.assertj.core.api.Assertions.assertThat;

import freshet.acidity.PhScale;
import freshet.ammonia.AmmoniaDissociation;
import freshet.ammonia.AmmoniaMethod;
import freshet.ammonia.AmmoniaUncertainty;
import freshet.ammonia.AmmoniaUncertainty.Sensors;
import freshet.ammonia.Water;
import java.util.Arrays;
import java.util.SplittableRandom;
import java.util.stream.DoubleStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/**
 * The 95 % bounds of un-ionized ammonia by first order against the propagation of distributions (JCGM 101:2008), over the
 * ranges of the alarm profiles and with the default uncertainties, each error normal. The drawing noise of a quantile is taken
 * out with the linearised model, drawn with the same numbers, whose quantiles are known.
 */
class ProfileUncertaintyTest {

    private static final int DRAWS = 200_000;
    private static final Sensors DEFAULT = new Sensors(0.1, 0.1, 0.5);
    private static final double Z = 1.959964;
    private static final double LN_10 = Math.log(10);
    private static final double[][] NORMAL = new double[4][DRAWS];

    static {
        SplittableRandom random = new SplittableRandom(101);
        for (double[] row : NORMAL) {
            Arrays.setAll(row, i -> random.nextGaussian());
        }
    }

    /** How far the bounds by first order lie from those by Monte Carlo; 0.01 is 1 %. */
    private record Deviation(double lower, double upper) {}

    @ParameterizedTest
    @EnumSource
    void firstOrderAgreesWithMonteCarlo(AlarmProfile profile) {
        double salinity = profile == AlarmProfile.MARINE ? 33 : 0;
        for (double t : range(profile.temperatureLower(), profile.temperatureUpper())) {
            double[] pKa = drawn(t, salinity);
            for (double ph : range(profile.phLower(), profile.phUpper())) {
                Deviation found = deviation(new Water(ph, t, salinity, PhScale.NBS), pKa);
                String where = "pH " + ph + ", " + t + " °C: " + found;
                assertThat(Math.abs(found.lower())).as(where).isLessThan(0.02);
                assertThat(Math.abs(found.upper())).as(where).isLessThan(0.02);
            }
        }
    }

    /** From one critical limit to the other, by way of both limits of caution and the middle. */
    private static double[] range(LimitPair lower, LimitPair upper) {
        double low = lower.caution().orElseThrow();
        double high = upper.caution().orElseThrow();
        return DoubleStream.of(
                        lower.critical().orElseThrow(),
                        low,
                        (low + high) / 2,
                        high,
                        upper.critical().orElseThrow())
                .toArray();
    }

    /** The constant at drawn temperatures, with its own uncertainty. */
    private static double[] drawn(double temperatureC, double salinity) {
        AmmoniaDissociation dissociation = AmmoniaMethod.defaultFor(salinity).dissociation();
        double[] drawn = new double[DRAWS];
        Arrays.setAll(
                drawn,
                i -> dissociation.pKa(temperatureC + DEFAULT.temperatureC() * NORMAL[2][i], salinity, PhScale.NBS)
                        + AmmoniaUncertainty.pKa(salinity) * NORMAL[3][i]);
        return drawn;
    }

    private static Deviation deviation(Water water, double[] pKa) {
        AmmoniaDissociation dissociation =
                AmmoniaMethod.defaultFor(water.salinity()).dissociation();
        double fraction = dissociation.fraction(water.ph(), water.temperatureC(), water.salinity(), water.scale());
        double k = LN_10 * (1 - fraction);
        double slope = (dissociation.pKa(water.temperatureC() + 0.1, water.salinity(), water.scale())
                        - dissociation.pKa(water.temperatureC() - 0.1, water.salinity(), water.scale()))
                / 0.2;
        double[] nh3 = new double[DRAWS];
        double[] linear = new double[DRAWS];
        for (int i = 0; i < DRAWS; i++) {
            nh3[i] = (1 + DEFAULT.tan() * NORMAL[0][i])
                    / (1 + Math.exp(LN_10 * (pKa[i] - water.ph() - DEFAULT.ph() * NORMAL[1][i])));
            linear[i] = DEFAULT.tan() * NORMAL[0][i]
                    + k
                            * (DEFAULT.ph() * NORMAL[1][i]
                                    - slope * DEFAULT.temperatureC() * NORMAL[2][i]
                                    - AmmoniaUncertainty.pKa(water.salinity()) * NORMAL[3][i]);
        }
        Arrays.sort(nh3);
        Arrays.sort(linear);
        double u = AmmoniaUncertainty.relative(water, dissociation, DEFAULT);
        AmmoniaUncertainty.Bounds bounds = AmmoniaUncertainty.bounds(u, DEFAULT.tan());
        return new Deviation(
                fraction * bounds.lower() / (quantile(nh3, 0.025) * Math.exp(-Z * u - quantile(linear, 0.025))) - 1,
                fraction * bounds.upper() / (quantile(nh3, 0.975) * Math.exp(Z * u - quantile(linear, 0.975))) - 1);
    }

    private static double quantile(double[] sorted, double probability) {
        return sorted[(int) (probability * sorted.length)];
    }
}
