package freshet.http.binding;

import freshet.answer.Fault;
import freshet.answer.Refusal;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.jspecify.annotations.Nullable;

/** What the header row of a table says: which columns hold inputs, and which are only carried along. */
final class Columns {

    private final Draft<?> constants;
    private final Set<String> results;
    private final List<Fault> faults = new ArrayList<>();
    private final List<Shape.@Nullable Entry> entries = new ArrayList<>();

    private Columns(Draft<?> constants, Set<String> results) {
        this.constants = constants;
        this.results = results;
    }

    /**
     * Reads a header row.
     *
     * @param constants what all rows have in common
     * @param results names of the columns of an answer, which may come back as columns
     * @return the input of each column, null for a column that is carried along
     * @throws Refusal with every fault
     */
    static List<Shape.@Nullable Entry> read(List<String> header, Draft<?> constants, Set<String> results) {
        Columns columns = new Columns(constants, results);
        Set<String> seen = new HashSet<>();
        Set<Input> given = new HashSet<>();
        for (String name : header) {
            if (!seen.add(name)) {
                columns.faults.add(Wording.repeated(name));
            }
            Shape.Entry entry = columns.entry(name);
            columns.entries.add(entry);
            if (entry != null) {
                given.add(entry.input());
            }
        }
        columns.faults.addAll(constants.faultsOfAllRows(given));
        if (!columns.faults.isEmpty()) {
            throw new Refusal(columns.faults);
        }
        return columns.entries;
    }

    private Shape.@Nullable Entry entry(String name) {
        Shape.Entry entry = constants.entry(name);
        if (entry == null) {
            if (!results.contains(name)) {
                Names.almost(name, constants.names()).ifPresent(known -> faults.add(Wording.almost(name, known)));
            }
            return null;
        }
        String constant = constants.givenBy(entry.input());
        if (constant != null) {
            faults.add(constant.equals(name) ? Wording.repeatsConstant(name) : Wording.givenTwice(entry));
        }
        return entry;
    }
}
