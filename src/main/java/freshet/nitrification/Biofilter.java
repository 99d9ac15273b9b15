package freshet.nitrification;

import java.util.OptionalDouble;

/**
 * A filter as it stands.
 *
 * @param reference the rate of its media
 * @param amount media in the unit of the rate, m2 or m3
 * @param flowLPerHour water through it, L/h; empty if not known
 * @param flow what that water brings
 */
public record Biofilter(ReferenceRate reference, double amount, OptionalDouble flowLPerHour, FilterFlow flow) {}
