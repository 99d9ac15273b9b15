package freshet.http.media;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
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

/** The printing of one number, beside what the JDK offers for it. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
@Fork(1)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
public class NumberBenchmark {

    private static final MathContext SIX = new MathContext(6, RoundingMode.HALF_EVEN);

    private final Bytes out = new Bytes(64);
    private double value = 0.001;

    private double next() {
        value = value > 1000 ? 0.001 : value * 1.0173;
        return value;
    }

    /** As answers do it. */
    @Benchmark
    public int sixDigits() {
        out.dropTo(0);
        SixDigits.write(next(), out);
        return out.length();
    }

    /** With decimal arithmetic. */
    @Benchmark
    public String bigDecimal() {
        return new BigDecimal(next()).round(SIX).stripTrailingZeros().toPlainString();
    }

    /** All digits of the double, which is not what answers print. */
    @Benchmark
    public String shortest() {
        return Double.toString(next());
    }
}
