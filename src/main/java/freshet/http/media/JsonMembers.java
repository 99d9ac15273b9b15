package freshet.http.media;

import java.nio.charset.StandardCharsets;
import java.util.List;

/** Writes outputs as members of a JSON object, each with a comma after it; leaves out what does not exist. */
final class JsonMembers implements Sink {

    private final Bytes out;

    JsonMembers(Bytes out) {
        this.out = out;
    }

    @Override
    public void absent(Column column) {
        // There is no null in any answer.
    }

    @Override
    public void number(Column column, double value) {
        out.put(column.key());
        SixDigits.write(value, out);
        out.put(',');
    }

    @Override
    public void word(Column column, String value) {
        out.put(column.key());
        if (column.kind() == Column.Kind.TEXT) {
            JsonText.quoted(value, out);
        } else {
            out.put(value.getBytes(StandardCharsets.US_ASCII));
        }
        out.put(',');
    }

    @Override
    public void numbers(Column column, List<?> values) {
        out.put(column.key());
        list(values);
        out.put(',');
    }

    private void list(List<?> values) {
        out.put('[');
        for (Object value : values) {
            if (value instanceof List<?> inner) {
                list(inner);
            } else {
                SixDigits.write((Double) value, out);
            }
            out.put(',');
        }
        if (!values.isEmpty()) {
            out.dropLast();
        }
        out.put(']');
    }

    @Override
    public void rows(Column column, List<? extends Record> records) {
        out.put(column.key());
        out.put('[');
        for (Record row : records) {
            out.put('{');
            column.rows().orElseThrow().read(row, this);
            out.dropLast();
            out.put('}');
            out.put(',');
        }
        if (!records.isEmpty()) {
            out.dropLast();
        }
        out.put(']');
        out.put(',');
    }
}
