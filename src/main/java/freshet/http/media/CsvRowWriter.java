package freshet.http.media;

import freshet.answer.Answer;
import freshet.answer.Fault;
import freshet.http.binding.Rows;
import freshet.http.problem.Problem;
import freshet.http.problem.ProblemType;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;

/**
 * Tables after RFC 4180: what the rows carry, then the outputs, validity, notice codes and error; an output that bears the
 * name of a carried column stands in its place.
 */
final class CsvRowWriter implements RowWriter {

    private final Table table;
    private final char separator;
    private final List<String> results;
    private final CsvCellSink cells;
    /** For each column of the answer the number of the result, or, less than 0, of the carried column, inverted. */
    private int[] sources = {};

    CsvRowWriter(Table table, boolean decimalComma) {
        this.table = table;
        separator = decimalComma ? ';' : ',';
        results = table.columnNames(List.of("validity", "notice_codes", "error"));
        cells = new CsvCellSink(results.size(), separator, decimalComma);
    }

    @Override
    public void start(List<String> carried, Bytes out) {
        List<String> names = new ArrayList<>(carried);
        results.stream().filter(name -> !carried.contains(name)).forEach(names::add);
        sources = new int[names.size()];
        for (int i = 0; i < sources.length; i++) {
            int result = results.indexOf(names.get(i));
            sources[i] = result < 0 ? ~i : result;
            CsvCells.put(names.get(i), separator, out);
            out.put(separator);
        }
        endLine(out);
    }

    @Override
    public void answer(Rows<?> row, Answer<?> answer, Bytes out) {
        cells.clear();
        table.read(answer.result(), cells);
        cells.text(AnswerWriter.validity(answer));
        cells.text(AnswerWriter.codes(answer));
        cells.text("");
        write(row, out);
    }

    @Override
    public void problem(Rows<?> row, long number, Problem problem, Bytes out) {
        cells.clear();
        for (int i = 1; i < results.size(); i++) {
            cells.text("");
        }
        cells.text("row " + number + "; " + reason(problem));
        write(row, out);
    }

    private static String reason(Problem problem) {
        if (problem.faults().isEmpty()) {
            return problem.type() == ProblemType.UNREADABLE
                    ? "malformed"
                    : problem.type().id();
        }
        return problem.faults().stream().map(CsvRowWriter::reason).collect(Collectors.joining("; "));
    }

    private static String reason(Fault fault) {
        return fault.field() + ": " + fault.code().code();
    }

    @Override
    public void end(Bytes out) {
        // A table just ends.
    }

    private void write(Rows<?> row, Bytes out) {
        for (int source : sources) {
            if (source < 0) {
                row.carryCell(~source, separator, out);
            } else {
                cells.copy(source, out);
            }
            out.put(separator);
        }
        endLine(out);
    }

    private static void endLine(Bytes out) {
        out.dropLast();
        out.put('\r');
        out.put('\n');
    }
}
