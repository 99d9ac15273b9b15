package freshet.ammonia;

import freshet.acidity.PhScale;

/**
 * The water in which ammonia dissociates.
 *
 * @param ph pH on {@code scale}
 * @param temperatureC temperature, °C
 * @param salinity practical salinity (PSS-78)
 * @param scale the scale of the pH
 */
public record Water(double ph, double temperatureC, double salinity, PhScale scale) {}
