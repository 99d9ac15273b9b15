package freshet.http.binding;

import de.siegmar.fastcsv.reader.CloseableIterator;
import de.siegmar.fastcsv.reader.CsvParseException;
import de.siegmar.fastcsv.reader.CsvReader;
import freshet.answer.Refusal;
import freshet.http.limits.Sizes;
import freshet.http.media.Bytes;
import freshet.http.media.CsvCells;
import freshet.http.media.JsonText;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.jspecify.annotations.Nullable;

/** The lines of a table after RFC 4180 whose first line names the columns. */
public final class CsvRows<T extends Record> implements Rows<T> {

    /** Longest cell that can be read over; a longer one, or a quote that is never closed, ends the series. */
    private static final int LONGEST_CELL = 1 << 20;

    private final Draft<T> constants;
    private final boolean decimalComma;
    private final CsvRecord line = new CsvRecord();
    private final CloseableIterator<CsvRecord> lines;
    private final List<String> header;
    private final Shape.@Nullable Entry[] entries;
    private boolean malformed;

    /**
     * Starts to read a table.
     *
     * @param constants what all rows have in common
     * @param results names of the columns of an answer
     * @param decimalComma whether semicolons separate the cells and numbers have a decimal comma
     * @throws Refusal with every fault of the header row
     * @throws UnreadableBody if there is no header row
     */
    CsvRows(Draft<T> constants, Set<String> results, boolean decimalComma, InputStream body) throws IOException {
        this.constants = constants;
        this.decimalComma = decimalComma;
        lines = CsvReader.builder()
                .fieldSeparator(decimalComma ? ';' : ',')
                .allowMissingFields(true)
                .allowExtraFields(true)
                .maxBufferSize(LONGEST_CELL)
                .build(line, new CsvText(body))
                .iterator();
        header = header();
        entries = Columns.read(header, constants, results).toArray(new Shape.@Nullable Entry[0]);
    }

    private List<String> header() throws IOException {
        boolean there = next() && !malformed && !line.tooLong();
        List<String> names = new ArrayList<>();
        for (int i = 0; there && i < line.count(); i++) {
            names.add(utf8(line.text(i)));
        }
        if (!there || names.stream().anyMatch(name -> name.chars().anyMatch(c -> c < ' ' || c == 0xFFFD))) {
            throw new UnreadableBody("The body must begin with a header row that names the columns, in UTF-8.");
        }
        return names;
    }

    @Override
    public List<String> carried() {
        return header;
    }

    @Override
    public boolean next() throws IOException {
        if (malformed) {
            return false;
        }
        try {
            if (!lines.hasNext()) {
                return false;
            }
            lines.next();
            malformed = line.swallowedEnd();
            return malformed || !line.isEnd();
        } catch (CsvParseException broken) {
            malformed = true;
            return true;
        } catch (UncheckedIOException failed) {
            throw failed.getCause();
        }
    }

    @Override
    public T inputs() {
        if (malformed) {
            throw new UnreadableBody(
                    "A quote is not closed, or text follows a closing one; no further row can be read.");
        }
        if (line.tooLong()) {
            throw Sizes.rowTooLong(LONGEST_ROW);
        }
        if (line.count() != entries.length) {
            throw new UnreadableBody("The row has " + line.count() + " cells, the header row " + entries.length + ".");
        }
        Draft<T> draft = constants.row();
        for (int i = 0; i < entries.length; i++) {
            Shape.Entry entry = entries[i];
            int start = line.start(i);
            if (entry != null && (decimalComma || !draft.plain(entry, line.chars(), start, line.end(i) - start))) {
                take(entry, line.text(i), draft);
            }
        }
        return draft.finish();
    }

    private void take(Shape.Entry entry, String text, Draft<T> draft) {
        if (!decimalComma || !entry.input().numeric()) {
            draft.cell(entry, text);
        } else if (text.indexOf('.') >= 0) {
            draft.decimalPoint(entry, text);
        } else {
            draft.cell(entry, text.replace(',', '.'));
        }
    }

    @Override
    public void carryCell(int column, char separator, Bytes out) {
        if (!readable(column)) {
            return;
        }
        int start = line.start(column);
        int end = line.end(column);
        if (line.quoted(column)) {
            CsvCells.quoted(line.chars(), start, end, out);
        } else {
            out.put(line.chars(), start, end);
        }
    }

    @Override
    public boolean carryText(int column, Bytes out) {
        if (!readable(column) || entries[column] != null || line.start(column) == line.end(column)) {
            return false;
        }
        JsonText.quoted(utf8(line.text(column)), out);
        return true;
    }

    private boolean readable(int column) {
        return !malformed && column < line.count();
    }

    @Override
    public @Nullable String pointer() {
        return null;
    }

    private static String utf8(String bytes) {
        return new String(bytes.getBytes(StandardCharsets.ISO_8859_1), StandardCharsets.UTF_8);
    }
}
