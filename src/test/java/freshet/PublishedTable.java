package freshet;

import de.siegmar.fastcsv.reader.CommentStrategy;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.Reader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Set;
import java.util.stream.Collectors;

/** Published values of one method, as {@code src/test/resources/published/<method-id>.csv} keeps them. */
public final class PublishedTable {

    private static final Set<String> OBTAINED = Set.of("printed", "secondary", "memory", "computed", "common practice");

    private final List<Row> rows;

    private PublishedTable(List<Row> rows) {
        this.rows = rows;
    }

    /** One published value and the inputs it belongs to. */
    public record Row(
            String id,
            Map<String, String> inputs,
            String output,
            double expected,
            double tolerance,
            String source,
            String obtained) {

        /** An input as a number. */
        public double number(String input) {
            return Double.parseDouble(text(input));
        }

        /** An input as text. */
        public String text(String input) {
            return Objects.requireNonNull(inputs.get(input), () -> id + " has no input " + input);
        }

        /** Whether {@code value} agrees with the published one. */
        public boolean agrees(double value) {
            return Math.abs(value - expected) <= tolerance;
        }

        @Override
        public String toString() {
            return id;
        }
    }

    /** The table of a method; fails if it is not there, does not say where it comes from, or is malformed. */
    public static PublishedTable of(String methodId) {
        String name = "/published/" + methodId + ".csv";
        try (Reader reader = new InputStreamReader(
                        Objects.requireNonNull(PublishedTable.class.getResourceAsStream(name), name),
                        StandardCharsets.UTF_8);
                CsvReader<NamedCsvRecord> csv = CsvReader.builder()
                        .commentStrategy(CommentStrategy.SKIP)
                        .ofNamedCsvRecord(reader)) {
            return new PublishedTable(csv.stream().map(PublishedTable::row).toList());
        } catch (IOException unreadable) {
            throw new UncheckedIOException(unreadable);
        }
    }

    /** All rows. */
    public List<Row> rows() {
        return rows;
    }

    /** The rows of one output; fails if there are none. */
    public List<Row> rows(String output) {
        List<Row> found =
                rows.stream().filter(row -> row.output().equals(output)).toList();
        if (found.isEmpty()) {
            throw new IllegalArgumentException("No rows of " + output);
        }
        return found;
    }

    private static Row row(NamedCsvRecord csv) {
        Row row = new Row(
                csv.getField("id"),
                inputs(csv.getField("inputs")),
                csv.getField("output"),
                Double.parseDouble(csv.getField("expected")),
                Double.parseDouble(csv.getField("tolerance")),
                csv.getField("source"),
                csv.getField("obtained"));
        if (row.source().isBlank() || OBTAINED.stream().noneMatch(row.obtained()::startsWith)) {
            throw new IllegalArgumentException(row.id() + " does not say where it comes from");
        }
        return row;
    }

    private static Map<String, String> inputs(String text) {
        return Arrays.stream(text.split(";"))
                .filter(pair -> pair.contains("="))
                .collect(Collectors.toMap(
                        pair -> pair.substring(0, pair.indexOf('=')).strip(),
                        pair -> pair.substring(pair.indexOf('=') + 1).strip()));
    }
}
