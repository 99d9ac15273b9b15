package freshet.nitrification;

import freshet.acidity.PhScale;
import freshet.ammonia.AmmoniaMethod;
import freshet.ammonia.AmmoniaSpeciation;
import freshet.ammonia.Water;
import java.util.OptionalDouble;

/**
 * A biofilter under a load: whether total ammonia settles, and where. The equilibrium holds for the present pH, oxygen and
 * temperature and without exchange of water.
 *
 * @param capacity the filter at the present total ammonia
 * @param load what it must oxidize
 * @param water the present water
 */
public record LoadedBiofilter(BiofilterCapacity capacity, TanLoad load, FilterWater water) {

    /** What the media oxidize at most, however high total ammonia rises, g as N per day. */
    public double ultimateTanGPerDay() {
        return plateauTanGPerDay()
                * new SubstrateKinetics(water.tanMgPerL(), water.dissolvedOxygenMgPerL()).highestOrder();
    }

    /** The most the filter can carry at all: {@link #ultimateTanGPerDay} as far as flow and its oxygen allow. */
    public double bearableTanGPerDay() {
        double brought = passes() ? Double.POSITIVE_INFINITY : 0;
        double oxygen = capacity.oxygenTransportTanGPerDay().orElse(Double.POSITIVE_INFINITY);
        return Math.min(ultimateTanGPerDay(), Math.min(oxygen, brought));
    }

    /** Whether total ammonia settles. */
    public boolean carried() {
        return load.tanGPerDay() <= bearableTanGPerDay();
    }

    /** Total ammonia as N at which the load is oxidized as it comes, mg/L; empty if it never is. */
    public OptionalDouble equilibriumTanMgPerL() {
        if (!carried()) {
            return OptionalDouble.empty();
        }
        return OptionalDouble.of(
                Math.max(SubstrateFloor.TAN_MG_PER_L, Math.max(mediaTanMgPerL(), transportTanMgPerL())));
    }

    /** Un-ionized ammonia as N at that equilibrium, mg/L; empty if there is none. */
    public OptionalDouble equilibriumNh3NMgPerL() {
        Water sample = new Water(water.ph(), water.temperatureC(), water.salinity(), PhScale.NBS);
        return equilibriumTanMgPerL().stream()
                .map(tan -> AmmoniaSpeciation.nh3NMgPerL(tan, sample))
                .findFirst();
    }

    /** Whether un-ionized ammonia from an NBS pH reads high in this water. */
    public boolean saline() {
        return water.salinity() > AmmoniaMethod.FRESH_SALINITY;
    }

    /** Whether the equilibrium is the least that sustains a film. */
    public boolean atFloor() {
        return carried() && Math.max(mediaTanMgPerL(), transportTanMgPerL()) <= SubstrateFloor.TAN_MG_PER_L;
    }

    /** Load over present capacity, %; empty if the capacity is 0. */
    public OptionalDouble utilizationPercent() {
        double present = capacity.tanGPerDay();
        return present > 0 ? OptionalDouble.of(100 * load.tanGPerDay() / present) : OptionalDouble.empty();
    }

    /** The same at the daily peak; empty unless the load came from feed. */
    public OptionalDouble peakUtilizationPercent() {
        OptionalDouble mean = utilizationPercent();
        return mean.isPresent() && load.peakFactor().isPresent()
                ? OptionalDouble.of(mean.getAsDouble() * load.peakFactor().getAsDouble())
                : OptionalDouble.empty();
    }

    /** Present capacity less load, g as N per day. */
    public double headroomTanGPerDay() {
        return capacity.tanGPerDay() - load.tanGPerDay();
    }

    /** The feed, kg/day, that the filter can carry at all; empty unless the load came from feed with protein in it. */
    public OptionalDouble feedCarriedKgPerDay() {
        return load.ration().stream()
                .filter(ration -> ration.proteinPercent() > 0)
                .mapToDouble(ration -> ProteinCoefficient.feedKgPerDay(bearableTanGPerDay(), ration.proteinPercent()))
                .findFirst();
    }

    private double plateauTanGPerDay() {
        return capacity.rate().plateau() * capacity.filter().amount();
    }

    private double mediaTanMgPerL() {
        return load.tanGPerDay() == 0 ? 0 : HalfOrder.published().tanMgPerL(load.tanGPerDay() / plateauTanGPerDay());
    }

    private double transportTanMgPerL() {
        return load.tanGPerDay() == 0 || capacity.filter().flowLPerHour().isEmpty()
                ? 0
                : load.tanGPerDay() / clearedM3PerDay();
    }

    private boolean passes() {
        return capacity.filter().flowLPerHour().isEmpty() || clearedM3PerDay() > 0;
    }

    /** Water that leaves the filter as if wholly freed of ammonia, m3/day. */
    private double clearedM3PerDay() {
        Biofilter filter = capacity.filter();
        return FilterFlow.m3PerDay(filter.flowLPerHour().orElse(0))
                * filter.flow().removal().estimate();
    }
}
