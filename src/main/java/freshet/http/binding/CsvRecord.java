package freshet.http.binding;

import de.siegmar.fastcsv.reader.CsvCallbackHandler;
import de.siegmar.fastcsv.reader.RecordType;
import java.util.Arrays;

/** The cells of one line of a table; the same object for every line, since there may be millions of them. */
final class CsvRecord extends CsvCallbackHandler<CsvRecord> {

    private char[] chars = new char[512];
    private int[] ends = new int[32];
    private boolean[] quoted = new boolean[32];
    private int count;
    private boolean tooLong;
    private boolean empty;
    private boolean end;

    /** How many cells there are. */
    int count() {
        return count;
    }

    /** Whether the line was longer than a row may be; its cells are empty then. */
    boolean tooLong() {
        return tooLong;
    }

    /** Whether this is the line that marks the end. */
    boolean isEnd() {
        return end;
    }

    /** Whether the last cell has swallowed the mark of the end, because its quote was never closed. */
    boolean swallowedEnd() {
        return end && (count > 1 || quoted[0]);
    }

    /** A cell, each byte as one character. */
    String text(int cell) {
        int start = start(cell);
        return new String(chars, start, ends[cell] - start);
    }

    /** What holds the cells, one after the other. */
    char[] chars() {
        return chars;
    }

    int start(int cell) {
        return cell == 0 ? 0 : ends[cell - 1];
    }

    int end(int cell) {
        return ends[cell];
    }

    boolean quoted(int cell) {
        return quoted[cell];
    }

    @Override
    protected RecordType getRecordType() {
        return empty ? RecordType.EMPTY : RecordType.DATA;
    }

    @Override
    protected int getFieldCount() {
        return count;
    }

    @Override
    protected void beginRecord(long startingLineNumber) {
        count = 0;
        tooLong = false;
        empty = false;
        end = false;
    }

    @Override
    protected void addField(char[] buffer, int offset, int length, boolean inQuotes) {
        int start = count == 0 ? 0 : ends[count - 1];
        tooLong |= start + count + length > Rows.LONGEST_ROW;
        end |= length > 0 && buffer[offset + length - 1] == CsvText.END;
        int kept = tooLong ? 0 : length;
        if (start + kept > chars.length) {
            chars = Arrays.copyOf(chars, Math.max(2 * chars.length, start + kept));
        }
        System.arraycopy(buffer, offset, chars, start, kept);
        if (count == ends.length) {
            ends = Arrays.copyOf(ends, 2 * count);
            quoted = Arrays.copyOf(quoted, 2 * count);
        }
        ends[count] = start + kept;
        quoted[count] = inQuotes;
        count++;
    }

    @Override
    protected void setComment(char[] buffer, int offset, int length) {
        // A table has no comments.
    }

    @Override
    protected void setEmpty() {
        empty = true;
    }

    @Override
    protected CsvRecord buildRecord() {
        return this;
    }
}
