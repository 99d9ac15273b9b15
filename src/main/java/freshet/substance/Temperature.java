package freshet.substance;

/** The zero of the Celsius scale. */
public final class Temperature {

    private static final double ICE_POINT_KELVIN = 273.15;

    private Temperature() {}

    /** Kelvin from degrees Celsius. */
    public static double kelvin(double celsius) {
        return celsius + ICE_POINT_KELVIN;
    }

    /** Degrees Celsius from kelvin. */
    public static double celsius(double kelvin) {
        return kelvin - ICE_POINT_KELVIN;
    }
}
