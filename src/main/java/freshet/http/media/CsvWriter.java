package freshet.http.media;

import de.siegmar.fastcsv.writer.LineDelimiter;
import freshet.answer.Answer;
import java.io.StringWriter;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

/**
 * Tables after RFC 4180: a header row with every output, empty cells for what does not exist, CRLF. An answer that holds
 * records gives one row for each of them and says nothing of its method.
 */
final class CsvWriter implements AnswerWriter {

    private final Table table;

    CsvWriter(Table table) {
        this.table = table;
    }

    @Override
    public Bytes write(Answer<?> answer, boolean compact) {
        Rows rows = new Rows();
        if (table.flat()) {
            flat(answer, compact, rows);
        } else {
            table.read(answer.result(), rows);
        }
        StringWriter text = new StringWriter();
        var csv = de.siegmar.fastcsv.writer.CsvWriter.builder()
                .lineDelimiter(LineDelimiter.CRLF)
                .bufferSize(0) // Nothing to flush: the text is the buffer.
                .build(text);
        rows.lines.forEach(csv::writeRecord);
        Bytes out = new Bytes(256);
        out.put(text.toString().getBytes(StandardCharsets.UTF_8));
        return out;
    }

    private void flat(Answer<?> answer, boolean compact, Rows rows) {
        List<String> header = names(table);
        header.addAll(
                compact
                        ? List.of("method", "method_version", "validity", "notice_codes")
                        : List.of("method", "method_version", "reference", "validity", "notice_codes"));
        rows.lines.add(header);
        List<String> cells = rows.line(table, answer.result());
        cells.add(answer.method().id());
        cells.add(Integer.toString(answer.method().version()));
        if (!compact) {
            cells.add(answer.method().citation().reference());
        }
        cells.add(AnswerWriter.validity(answer));
        cells.add(AnswerWriter.codes(answer));
    }

    private static List<String> names(Table table) {
        return new ArrayList<>(table.columns().stream().map(Column::name).toList());
    }

    private static final class Rows implements Sink {

        private final List<List<String>> lines = new ArrayList<>();
        private List<String> cells = new ArrayList<>();

        List<String> line(Table columns, Record result) {
            cells = new ArrayList<>();
            lines.add(cells);
            columns.read(result, this);
            return cells;
        }

        @Override
        public void absent(Column column) {
            cells.add("");
        }

        @Override
        public void number(Column column, double value) {
            cells.add(SixDigits.text(value));
        }

        @Override
        public void word(Column column, String value) {
            cells.add(value);
        }

        @Override
        public void rows(Column column, List<? extends Record> records) {
            Table rowTable = column.rows().orElseThrow();
            lines.add(names(rowTable));
            records.forEach(row -> line(rowTable, row));
        }
    }
}
