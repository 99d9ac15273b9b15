package freshet.nitrification;

import freshet.method.Method;

/** How the rate of nitrification changes from one temperature to another, as one source gives it. */
interface TemperatureResponse {

    /** Its entry in the catalogue. */
    Method method();

    /**
     * Rate at one temperature over rate at another.
     *
     * @param temperatureC the temperature of the water, °C, at most 30
     * @param referenceC the temperature of the reference rate, °C, at most 30
     * @param oxygenLimited whether oxygen, not ammonia, sets the rate
     */
    double ratio(double temperatureC, double referenceC, boolean oxygenLimited);
}
