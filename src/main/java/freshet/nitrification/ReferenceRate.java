package freshet.nitrification;

/** The rate of media at a known state, and from it the rate in any water. */
public interface ReferenceRate {

    /** Whether the rate is per m3 of media; else per m2 of surface. */
    boolean perVolume();

    /** Whether air keeps up the oxygen around the media, so that the water need not bring it. */
    boolean aerated();

    /** The rate in {@code water}. */
    Rate in(FilterWater water, TemperatureMethod temperature);
}
