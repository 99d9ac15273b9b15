package freshet.ammonia;

import freshet.acidity.PhScale;
import freshet.method.Citation;
import freshet.method.Method;
import freshet.method.Seen;
import java.util.Arrays;

/**
 * Limits of total ammonia on a grid of pH and temperature, which interpolated linearly in both lie nowhere above the exact
 * limit.
 *
 * <p>The limit is convex, so that exact nodes would lie above it in between. Over one salinity it is {@code limit (1 + a(t)
 * b(pH))}, and so is what is interpolated between exact nodes, with a and b interpolated: that makes a dense scan cheap.
 */
public final class LimitTable {

    /** Its entry in the catalogue. */
    public static final Method METHOD = Method.of(
                    "ammonia-limit-table",
                    "Table of limits of total ammonia that is safe under bilinear interpolation",
                    Citation.withoutDoi(
                            "Freshet, limit table (own construction)",
                            "A construction of this project on a published dissociation constant: each node is the exact limit"
                                    + " lowered by the greatest overshoot of the cells it touches, then rounded down"),
                    Seen.SECONDARY)
            .equation(
                    "node = floor(exact/(1 + o), 4 digits); o = greatest of max(interpolated/exact - 1, 0) + 1e-6 over"
                            + " 31 x 31 points of each cell that the node touches; below the first node the edge holds, above the"
                            + " last, or for what is not a number, the limit is 0")
            .accuracy(
                    "nowhere above the exact limit; the loss is stated with each table, 1.1 % for steps of 0.1 and 2 °C")
            .uses(
                    AmmoniaMethod.EMERSON_1975.dissociation().method(),
                    AmmoniaMethod.CLEGG_WHITFIELD_1995.dissociation().method(),
                    AmmoniaMethod.YAO_MILLERO_1995.dissociation().method());

    private static final int POINTS = 30;
    private static final double MARGIN = 1e-6;
    private static final int DIGITS = 4;

    private final double nh3NLimitMgPerL;
    private final Grid grid;
    /** 10^pKa and 10^-pH at the nodes and between them, {@link #POINTS} steps to a cell. */
    private final double[] a;

    private final double[] b;
    private final double[][] nodes;

    /**
     * Evenly spaced nodes.
     *
     * @param phMin first pH
     * @param phStep step of pH
     * @param phCount number of pH, at least 2
     * @param temperatureMinC first temperature, °C
     * @param temperatureStepC step of temperature, °C
     * @param temperatureCount number of temperatures, at least 2
     */
    public record Grid(
            double phMin,
            double phStep,
            int phCount,
            double temperatureMinC,
            double temperatureStepC,
            int temperatureCount) {

        /** pH of a row. */
        public double ph(double row) {
            return rounded(phMin + row * phStep);
        }

        /** Temperature of a column, °C. */
        public double temperatureC(double column) {
            return rounded(temperatureMinC + column * temperatureStepC);
        }

        /** Without what binary fractions add to decimal steps. */
        private static double rounded(double value) {
            return StrictMath.rint(value * 1e9) / 1e9;
        }
    }

    /**
     * Makes a table.
     *
     * @param nh3NLimitMgPerL limit of un-ionized ammonia as N, mg/L
     * @param grid where the nodes stand
     * @param dissociation the constant to compute with
     * @param water salinity and pH scale that the table holds for
     */
    public LimitTable(double nh3NLimitMgPerL, Grid grid, AmmoniaDissociation dissociation, SaltWater water) {
        this.nh3NLimitMgPerL = nh3NLimitMgPerL;
        this.grid = grid;
        a = new double[(grid.temperatureCount() - 1) * POINTS + 1];
        b = new double[(grid.phCount() - 1) * POINTS + 1];
        Arrays.setAll(
                a,
                i -> StrictMath.pow(
                        10, dissociation.pKa(grid.temperatureC((double) i / POINTS), water.salinity(), water.scale())));
        Arrays.setAll(b, i -> StrictMath.pow(10, -grid.ph((double) i / POINTS)));
        nodes = lowered();
    }

    /**
     * What a table holds for.
     *
     * @param salinity practical salinity
     * @param scale scale of pH
     */
    public record SaltWater(double salinity, PhScale scale) {}

    /** The nodes, pH by row and temperature by column, mg/L of total ammonia as N. */
    public double[][] nodes() {
        return Arrays.stream(nodes).map(double[]::clone).toArray(double[][]::new);
    }

    /** The grid. */
    public Grid grid() {
        return grid;
    }

    /** The greatest share, in percent, by which what is interpolated lies below the exact limit; rounded up to 0.1. */
    public double lossPercent() {
        double greatest = 0;
        for (int i = 0; i < b.length; i++) {
            for (int j = 0; j < a.length; j++) {
                greatest = Math.max(greatest, 1 - interpolated(i, j) / exact(i, j));
            }
        }
        return StrictMath.ceil(1000 * greatest) / 10;
    }

    private double exact(int i, int j) {
        return nh3NLimitMgPerL * (1 + a[j] * b[i]);
    }

    private double interpolated(int i, int j) {
        int row = Math.min(i / POINTS, nodes.length - 2);
        int column = Math.min(j / POINTS, nodes[0].length - 2);
        double y = (double) (i - row * POINTS) / POINTS;
        double x = (double) (j - column * POINTS) / POINTS;
        double low = nodes[row][column] + x * (nodes[row][column + 1] - nodes[row][column]);
        double high = nodes[row + 1][column] + x * (nodes[row + 1][column + 1] - nodes[row + 1][column]);
        return low + y * (high - low);
    }

    private double[][] lowered() {
        int rows = grid.phCount();
        int columns = grid.temperatureCount();
        double[][] worst = new double[rows][columns];
        for (int row = 0; row < rows - 1; row++) {
            for (int column = 0; column < columns - 1; column++) {
                double overshoot = overshoot(row * POINTS, column * POINTS);
                for (int corner = 0; corner < 4; corner++) {
                    int r = row + corner / 2;
                    int c = column + corner % 2;
                    worst[r][c] = Math.max(worst[r][c], overshoot);
                }
            }
        }
        double[][] lowered = new double[rows][columns];
        for (int row = 0; row < rows; row++) {
            for (int column = 0; column < columns; column++) {
                lowered[row][column] = floored(exact(row * POINTS, column * POINTS) / (1 + worst[row][column]));
            }
        }
        return lowered;
    }

    /** By how much the exact nodes of the cell that begins there, interpolated, lie above the limit at most. */
    private double overshoot(int fromPh, int fromTemperature) {
        double greatest = 0;
        for (int i = 0; i <= POINTS; i++) {
            double lineB = line(b, fromPh, i);
            for (int j = 0; j <= POINTS; j++) {
                double between = 1 + line(a, fromTemperature, j) * lineB;
                double limit = 1 + a[fromTemperature + j] * b[fromPh + i];
                greatest = Math.max(greatest, between / limit - 1);
            }
        }
        return greatest + MARGIN;
    }

    private static double line(double[] values, int from, int step) {
        return values[from] + (values[from + POINTS] - values[from]) * step / POINTS;
    }

    /** Rounded down to {@link #DIGITS} significant digits. */
    private static double floored(double value) {
        if (value == 0) {
            return 0;
        }
        int exponent = (int) StrictMath.floor(StrictMath.log10(value)) - DIGITS + 1;
        double unit = StrictMath.pow(10, Math.abs(exponent));
        return exponent < 0 ? StrictMath.floor(value * unit) / unit : StrictMath.floor(value / unit) * unit;
    }
}
