package freshet.ammonia;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import freshet.acidity.PhScale;
import freshet.ammonia.LimitTable.Grid;
import freshet.ammonia.LimitTable.SaltWater;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class LimitTableTest {

    private static final Grid DEFAULT = new Grid(6.5, 0.1, 26, 0, 2, 19);
    private static final AmmoniaDissociation FRESH = AmmoniaMethod.EMERSON_1975.dissociation();

    private static LimitTable table(Grid grid, double salinity) {
        return new LimitTable(
                0.02, grid, AmmoniaMethod.defaultFor(salinity).dissociation(), new SaltWater(salinity, PhScale.NBS));
    }

    /** Worked example of the normative definitions, section 10. */
    @Test
    void theNodesAreThoseOfTheDefinitions() {
        double[][] nodes = table(DEFAULT, 0).nodes();
        assertThat(nodes[15][12]).isCloseTo(0.3950, within(0.0001001));
        assertThat(nodes[16][12]).isCloseTo(0.3179, within(0.0001001));
        assertThat(nodes[15][13]).isCloseTo(0.3456, within(0.0001001));
        assertThat(nodes[16][13]).isCloseTo(0.2786, within(0.0001001));
        assertThat((nodes[15][12] + nodes[16][12] + nodes[15][13] + nodes[16][13]) / 4)
                .isCloseTo(0.334275, within(0.0001));
    }

    @ParameterizedTest
    @CsvSource({"0, 1000000", "35, 200000", "8, 200000"})
    void interpolatedItIsNowhereAboveTheLimitAndNotFarBelow(double salinity, int points) {
        LimitTable table = table(DEFAULT, salinity);
        double[][] nodes = table.nodes();
        AmmoniaDissociation dissociation = AmmoniaMethod.defaultFor(salinity).dissociation();
        Random random = new Random(20261201);
        double loss = 0;
        for (int i = 0; i < points; i++) {
            double ph = 6.5 + 2.5 * random.nextDouble();
            double t = 36 * random.nextDouble();
            double exact = 0.02 / dissociation.fraction(ph, t, salinity, PhScale.NBS);
            double interpolated = interpolated(nodes, (ph - 6.5) / 0.1, t / 2);
            assertThat(interpolated).isLessThanOrEqualTo(exact);
            loss = Math.max(loss, 100 * (1 - interpolated / exact));
        }
        assertThat(loss).isLessThanOrEqualTo(table.lossPercent()).isLessThanOrEqualTo(1.2);
        assertThat(table.lossPercent()).isBetween(1.0, 1.2);
    }

    private static double interpolated(double[][] nodes, double y, double x) {
        int row = Math.min((int) y, nodes.length - 2);
        int column = Math.min((int) x, nodes[0].length - 2);
        double low = nodes[row][column] + (x - column) * (nodes[row][column + 1] - nodes[row][column]);
        double high = nodes[row + 1][column] + (x - column) * (nodes[row + 1][column + 1] - nodes[row + 1][column]);
        return low + (y - row) * (high - low);
    }

    @Test
    void aCoarseTableIsSafeToo() {
        Grid grid = new Grid(0, 7, 3, -2, 31, 3);
        double[][] nodes = table(grid, 0).nodes();
        for (double ph = 0; ph <= 14; ph += 0.1) {
            for (double t = -2; t <= 60; t += 0.5) {
                assertThat(interpolated(nodes, ph / 7, (t + 2) / 31))
                        .isLessThanOrEqualTo(0.02 / FRESH.fraction(ph, t, 0, PhScale.NBS));
            }
        }
    }
}
