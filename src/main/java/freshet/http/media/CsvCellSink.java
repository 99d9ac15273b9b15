package freshet.http.media;

import java.nio.charset.StandardCharsets;
import java.util.List;

/** Takes the outputs of one row as cells, to be copied in any order. */
final class CsvCellSink implements Sink {

    private final Bytes bytes = new Bytes(256);
    private final int[] ends;
    private final char separator;
    private final boolean decimalComma;
    private int count;

    CsvCellSink(int most, char separator, boolean decimalComma) {
        ends = new int[most];
        this.separator = separator;
        this.decimalComma = decimalComma;
    }

    void clear() {
        bytes.dropTo(0);
        count = 0;
    }

    void text(String value) {
        if (!value.isEmpty()) {
            CsvCells.put(value, separator, bytes);
        }
        end();
    }

    void copy(int cell, Bytes out) {
        int start = cell == 0 ? 0 : ends[cell - 1];
        out.put(bytes.array(), start, ends[cell] - start);
    }

    @Override
    public void absent(Column column) {
        end();
    }

    @Override
    public void number(Column column, double value) {
        int start = bytes.length();
        SixDigits.write(value, bytes);
        for (int i = start; decimalComma && i < bytes.length(); i++) {
            if (bytes.array()[i] == '.') {
                bytes.array()[i] = ',';
            }
        }
        end();
    }

    @Override
    public void word(Column column, String value) {
        bytes.put(value.getBytes(StandardCharsets.US_ASCII));
        end();
    }

    @Override
    public void rows(Column column, List<? extends Record> records) {
        throw new IllegalStateException("Only flat answers have a series");
    }

    private void end() {
        ends[count++] = bytes.length();
    }
}
