package freshet.http.binding;

import freshet.quantity.Unit;

/**
 * One name by which an input may be given.
 *
 * @param name name on the wire
 * @param unit unit of the value under that name
 * @param factor canonical units per unit
 * @param offset added to the value first, in its own unit
 */
public record Spelling(String name, Unit unit, double factor, double offset) {

    /** The canonical value of {@code given}. */
    public double canonical(double given) {
        return (given + offset) * factor;
    }

    /** {@code canonical} as it is written under this name. */
    public double given(double canonical) {
        return canonical / factor - offset;
    }
}
