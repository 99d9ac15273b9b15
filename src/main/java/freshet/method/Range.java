package freshet.method;

/**
 * The range of one input within which a source states its method to hold; both ends belong to it.
 *
 * @param quantity the input, by its name in requests
 * @param minimum least value
 * @param maximum greatest value
 * @param unit UCUM unit of both
 */
public record Range(String quantity, double minimum, double maximum, String unit) {

    /** Checks that the ends are in order. */
    public Range {
        if (!(minimum <= maximum)) {
            throw new IllegalArgumentException("Range of " + quantity + " is empty");
        }
    }

    /** Whether {@code value}, in the range's unit, lies within. */
    public boolean contains(double value) {
        return value >= minimum && value <= maximum;
    }

    /** Whether this is a range of the same quantity that reaches no farther than {@code other}. */
    boolean liesWithin(Range other) {
        return quantity.equals(other.quantity)
                && unit.equals(other.unit)
                && minimum >= other.minimum
                && maximum <= other.maximum;
    }
}
