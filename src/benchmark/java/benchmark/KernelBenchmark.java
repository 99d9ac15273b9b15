package benchmark;

import freshet.acidity.PhScale;
import freshet.ammonia.AmmoniaMethod;
import freshet.ammonia.AmmoniaSpeciation;
import freshet.ammonia.Water;
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

/** The chemistry alone, time for one answer. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
@Fork(1)
@Warmup(iterations = 3, time = 2)
@Measurement(iterations = 5, time = 2)
public class KernelBenchmark {

    private double tanMgPerL = 1;

    /** Fresh water. */
    @Benchmark
    public AmmoniaSpeciation freshSpeciation() {
        return speciation(0, AmmoniaMethod.EMERSON_1975);
    }

    /** Sea water. */
    @Benchmark
    public AmmoniaSpeciation seaSpeciation() {
        return speciation(35, AmmoniaMethod.CLEGG_WHITFIELD_1995);
    }

    private AmmoniaSpeciation speciation(double salinity, AmmoniaMethod method) {
        tanMgPerL = tanMgPerL > 5 ? 0.1 : tanMgPerL + 0.01;
        Water water = new Water(6.5 + tanMgPerL / 2, 10 + tanMgPerL, salinity, PhScale.TOTAL);
        return AmmoniaSpeciation.of(tanMgPerL, water, method.dissociation());
    }
}
