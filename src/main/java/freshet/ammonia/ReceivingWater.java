package freshet.ammonia;

import freshet.method.Range;

/** Where published limits of ammonia are applied to receiving waters. */
final class ReceivingWater {

    static final Range PH = new Range("ph", 6.5, 9, "[pH]");
    static final Range TEMPERATURE = new Range("temperature_c", 0, 30, "Cel");
    /** Up to here the fresh-water criteria hold, from here on the salt-water ones; US rule, from memory. */
    private static final double FRESH_TO_SALT = 1;

    static final Range FRESH = new Range("salinity", 0, FRESH_TO_SALT, "1");
    static final Range SALT = new Range("salinity", FRESH_TO_SALT, 45, "1");

    private ReceivingWater() {}
}
