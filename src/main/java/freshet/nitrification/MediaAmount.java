package freshet.nitrification;

import java.util.OptionalDouble;

/**
 * An amount of media by its surface or by its bulk volume.
 *
 * @param value m2 or m3
 * @param byVolume whether it is a volume
 */
public record MediaAmount(double value, boolean byVolume) {

    /** Whether a rate per m3 ({@code perVolume}) or per m2 needs the specific surface to be used with it. */
    public boolean needsSurface(boolean perVolume) {
        return byVolume != perVolume;
    }

    /**
     * The amount in m3 ({@code perVolume}) or m2; empty if that needs a specific surface that is not known.
     *
     * @param perVolume whether it is wanted as a volume
     * @param specificSurfaceM2PerM3 surface per bulk volume
     */
    public OptionalDouble in(boolean perVolume, OptionalDouble specificSurfaceM2PerM3) {
        if (!needsSurface(perVolume)) {
            return OptionalDouble.of(value);
        }
        return specificSurfaceM2PerM3.isEmpty()
                ? OptionalDouble.empty()
                : OptionalDouble.of(
                        byVolume
                                ? value * specificSurfaceM2PerM3.getAsDouble()
                                : value / specificSurfaceM2PerM3.getAsDouble());
    }
}
