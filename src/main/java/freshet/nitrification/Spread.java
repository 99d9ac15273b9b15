package freshet.nitrification;

/**
 * An estimate between the corners of its published spread; never a confidence interval.
 *
 * @param estimate the estimate
 * @param lower the same at the low corner
 * @param upper the same at the high corner
 */
public record Spread(double estimate, double lower, double upper) {

    /** A value that is known, as from the caller: the same at all corners. */
    static Spread known(double value) {
        return new Spread(value, value, value);
    }

    /** The three constants that start at {@code first}: estimate, low corner, high corner. */
    static Spread of(double[] constants, int first) {
        return new Spread(constants[first], constants[first + 1], constants[first + 2]);
    }

    /** All three multiplied by {@code factor}. */
    Spread times(double factor) {
        return new Spread(estimate * factor, lower * factor, upper * factor);
    }
}
