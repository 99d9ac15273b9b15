package freshet.catalogue;

import freshet.answer.Fault;
import freshet.answer.FaultCode;
import freshet.answer.Refusal;
import freshet.http.binding.Names;
import java.util.ArrayList;
import java.util.List;
import org.springframework.util.MultiValueMap;

/** The catalogue is as strict with names as the calculations are. */
final class QueryCheck {

    private QueryCheck() {}

    /** Refuses parameters other than {@code known} (and the view, which pages do not have but may be asked for). */
    static void only(MultiValueMap<String, String> query, String... known) {
        List<String> names = new ArrayList<>(List.of(known));
        List<Fault> faults = new ArrayList<>();
        query.forEach((name, values) -> {
            if (!names.contains(name)) {
                faults.add(new Fault(name, FaultCode.UNKNOWN, "There is no parameter of this name here.")
                        .near(Names.nearest(name, names)));
            } else if (values.size() > 1) {
                faults.add(new Fault(name, FaultCode.REPEATED, name + " was given more than once."));
            }
        });
        if (!faults.isEmpty()) {
            throw new Refusal(faults);
        }
    }
}
