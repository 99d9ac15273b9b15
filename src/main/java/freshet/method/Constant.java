package freshet.method;

/**
 * One number of a method, under the symbol its source uses.
 *
 * @param symbol the symbol
 * @param value the value
 * @param unit UCUM unit; "1" for a number without dimension
 * @param note what it is, or how well it is known; may be empty
 */
public record Constant(String symbol, double value, String unit, String note) {

    /** A constant that needs no remark. */
    public Constant(String symbol, double value, String unit) {
        this(symbol, value, unit, "");
    }
}
