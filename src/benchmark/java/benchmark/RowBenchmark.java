package benchmark;

import freshet.http.Calculation;
import freshet.http.binding.Rows;
import freshet.http.binding.SeriesControls.Format;
import freshet.http.binding.SeriesRequest;
import freshet.http.media.Bytes;
import freshet.http.media.RowWriter;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.util.Random;
import java.util.Set;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OperationsPerInvocation;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import org.springframework.context.annotation.AnnotationConfigApplicationContext;

/** The way of a row through a series without HTTP: read, checked, computed, written; time for one row. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
@Fork(1)
@Warmup(iterations = 4, time = 2)
@Measurement(iterations = 5, time = 2)
public class RowBenchmark {

    private static final int ROWS = 10_000;

    /** Medium of the rows. */
    @Param({"JSON", "CSV", "NDJSON"})
    public Format format = Format.JSON;

    private Calculation<?, ?> speciation;
    private byte[] body = {};

    /** Makes the rows. */
    @Setup
    public void rows() throws ClassNotFoundException {
        try (var context =
                new AnnotationConfigApplicationContext(Class.forName("freshet.ammonia.web.AmmoniaCalculations"))) {
            speciation = context.getBean("ammoniaSpeciation", Calculation.class);
        }
        Random random = new Random(1);
        StringBuilder text = new StringBuilder();
        for (int i = 0; i < ROWS; i++) {
            text.append(row(random, i == 0));
        }
        body = (format == Format.JSON ? "{\"items\":[" + text + "]}" : text.toString())
                .getBytes(StandardCharsets.US_ASCII);
    }

    private String row(Random random, boolean first) {
        Object[] values = {
            random.nextInt(10, 500) / 100.0, random.nextInt(650, 900) / 100.0, random.nextInt(50, 300) / 10.0
        };
        String json = "{\"tan_mg_per_l\":%s,\"ph\":%s,\"temperature_c\":%s}".formatted(values);
        return switch (format) {
            case JSON -> first ? json : "," + json;
            case NDJSON -> json + "\n";
            case CSV -> (first ? "tan_mg_per_l,ph,temperature_c\n" : "") + "%s,%s,%s\n".formatted(values);
        };
    }

    /** All of it. */
    @Benchmark
    @OperationsPerInvocation(ROWS)
    public int row() throws IOException {
        return run(speciation);
    }

    /** Read and written only. */
    @Benchmark
    @OperationsPerInvocation(ROWS)
    public void bare() throws IOException {
        BareSeries.copy(format, new ByteArrayInputStream(body), OutputStream.nullOutputStream());
    }

    private <I extends Record, O extends Record> int run(Calculation<I, O> calculation) throws IOException {
        SeriesRequest<I> request = SeriesRequest.fromQuery(calculation.inputs(), null);
        Rows<I> rows = request.rows(format, Set.of(), new ByteArrayInputStream(body));
        RowWriter writer = RowWriter.of(format, calculation.outputs(), request.controls(), "/");
        Bytes out = new Bytes(64 * 1024);
        writer.start(rows.carried(), out);
        int sum = 0;
        while (rows.next()) {
            writer.answer(rows, calculation.function().apply(rows.inputs()), out);
            if (out.length() > 32 * 1024) {
                sum += out.length();
                out.dropTo(0);
            }
        }
        return sum + out.length();
    }
}
