package benchmark;

import freshet.acidity.PhScale;
import freshet.ammonia.Water;
import freshet.carbonate.CarbonateSolver;
import freshet.carbonate.CarbonateState;
import freshet.dilution.Blend;
import freshet.dilution.BlendedWater;
import freshet.dilution.SafeExchange;
import java.util.OptionalDouble;
import java.util.Random;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/** The carbonate system, time for one answer of each kind. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Fork(1)
@Warmup(iterations = 3, time = 2)
@Measurement(iterations = 5, time = 2)
public class CarbonateBenchmark {

    private final Random random = new Random(1);

    private double salinity() {
        return random.nextBoolean() ? 0 : 35 * random.nextDouble();
    }

    /** From pH and alkalinity, which needs no solving. */
    @Benchmark
    public CarbonateState speciationFromPh() {
        return CarbonateSolver.of(5 + 25 * random.nextDouble(), salinity(), PhScale.NBS, 1e-4)
                .ofPhAndAlkalinity(6 + 3 * random.nextDouble(), 2e-3);
    }

    /** From alkalinity and inorganic carbon, which does. */
    @Benchmark
    public CarbonateState speciationSolved() {
        return CarbonateSolver.of(5 + 25 * random.nextDouble(), salinity(), PhScale.NBS, 1e-4)
                .ofAlkalinityAndCarbon(2e-3, 1e-3 + 2e-3 * random.nextDouble());
    }

    private Blend waters() {
        double salinity = salinity();
        BlendedWater tank = BlendedWater.measured(
                new Water(6.5 + random.nextDouble(), 20 + 8 * random.nextDouble(), salinity, PhScale.NBS), 40, 3);
        BlendedWater source = BlendedWater.measured(
                new Water(7 + random.nextDouble(), 20 + 8 * random.nextDouble(), salinity, PhScale.NBS), 200, 0);
        return new Blend(tank, source, tank.co2MgPerL(), PhScale.NBS);
    }

    /** Two waters and their mixture in three states. */
    @Benchmark
    public Blend.Mixture blend() {
        return waters().mixture(0.3);
    }

    /** The same, and how much is safe. */
    @Benchmark
    public SafeExchange safeShare() {
        Blend blend = waters();
        return SafeExchange.of(blend, new SafeExchange.Limits(OptionalDouble.of(blend.nh3NBeforeMgPerL() * 20), 2, 8));
    }
}
