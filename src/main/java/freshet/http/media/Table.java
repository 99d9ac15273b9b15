package freshet.http.media;

import java.lang.reflect.RecordComponent;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.stream.Stream;

/** What a response record declares, read once: its outputs in the order in which answers hold them. */
public final class Table {

    private final List<Column> columns = new ArrayList<>();

    private Table(Class<? extends Record> type) {
        for (RecordComponent component : type.getRecordComponents()) {
            columns.add(ColumnReader.read(component));
        }
    }

    /**
     * Reads a response record.
     *
     * @throws IllegalStateException if an output says nothing of itself or is of an unknown kind
     */
    public static Table of(Class<? extends Record> type) {
        return new Table(type);
    }

    /** The outputs. */
    public List<Column> columns() {
        return Collections.unmodifiableList(columns);
    }

    /** The names of the outputs, and {@code more} after them. */
    public List<String> columnNames(List<String> more) {
        return Stream.concat(columns.stream().map(Column::name), more.stream()).toList();
    }

    /** Whether every output is a single value. */
    public boolean flat() {
        return columns.stream().allMatch(column -> column.rows().isEmpty());
    }

    /** Passes all values of {@code result} on to {@code sink}. */
    void read(Record result, Sink sink) {
        for (Column column : columns) {
            column.read(result, sink);
        }
    }
}
