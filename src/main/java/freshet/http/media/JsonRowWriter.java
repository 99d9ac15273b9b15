package freshet.http.media;

import freshet.answer.Answer;
import freshet.http.binding.Rows;
import freshet.http.problem.Problem;
import freshet.http.problem.ProblemRenderer;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** JSON objects, one on each line; as items of one object or each for itself. */
final class JsonRowWriter implements RowWriter {

    private static final byte[] START = "{\"items\":[\n".getBytes(StandardCharsets.US_ASCII);
    private static final byte[] END = "\n]}\n".getBytes(StandardCharsets.US_ASCII);

    private final Table table;
    private final JsonWriter writer;
    private final boolean compact;
    private final String path;
    private final boolean asItems;
    private final List<byte[]> keys = new ArrayList<>();
    private boolean first = true;

    JsonRowWriter(Table table, boolean compact, String path, boolean asItems) {
        this.table = table;
        writer = new JsonWriter(table);
        this.compact = compact;
        this.path = path;
        this.asItems = asItems;
    }

    @Override
    public void start(List<String> carried, Bytes out) {
        for (String name : carried) {
            Bytes key = new Bytes(64);
            JsonText.key(name, key);
            boolean isResult = table.columnNames(List.of("validity", "notice_codes", "error"))
                    .contains(name);
            keys.add(isResult ? new byte[0] : Arrays.copyOf(key.array(), key.length()));
        }
        if (asItems) {
            out.put(START);
        }
    }

    @Override
    public void answer(Rows<?> row, Answer<?> answer, Bytes out) {
        open(row, out);
        writer.members(answer, compact, out);
        close(out);
    }

    @Override
    public void problem(Rows<?> row, long number, Problem problem, Bytes out) {
        open(row, out);
        JsonText.key("error", out);
        out.put(ProblemRenderer.render(problem, path, compact));
        out.dropLast();
        out.put('}');
        close(out);
    }

    @Override
    public void end(Bytes out) {
        if (asItems) {
            out.put(END);
        }
    }

    private void open(Rows<?> row, Bytes out) {
        if (asItems && !first) {
            out.put(',');
            out.put('\n');
        }
        out.put('{');
        for (int i = 0; i < keys.size(); i++) {
            int before = out.length();
            out.put(keys.get(i));
            if (row.carryText(i, out)) {
                out.put(',');
            } else {
                out.dropTo(before);
            }
        }
    }

    private void close(Bytes out) {
        first = false;
        if (!asItems) {
            out.put('\n');
        }
    }
}
