package freshet.http;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.springframework.stereotype.Component;

/** Every calculation the topics declare, by address. */
@Component
public class Calculations {

    private final List<Calculation<?, ?>> all;

    Calculations(List<Calculation<?, ?>> declared) {
        all = declared.stream()
                .sorted(Comparator.comparing(Calculation::address))
                .toList();
    }

    /** All of them. */
    public List<Calculation<?, ?>> all() {
        return all;
    }

    /** The one at {@code path}, for example {@code ammonia/speciation}. */
    public Optional<Calculation<?, ?>> at(String path) {
        return all.stream()
                .filter(calculation -> calculation.path().equals(path))
                .<Calculation<?, ?>>map(calculation -> calculation)
                .findFirst();
    }
}
