package freshet.answer;

import java.util.List;

/** Thrown when a request cannot be answered; carries every fault that was found. */
public final class Refusal extends RuntimeException {

    private static final long serialVersionUID = 1L;

    private final transient List<Fault> faults;

    /** Refuses for several faults, at least one. */
    public Refusal(List<Fault> faults) {
        super(faults.get(0).detail(), null, false, false);
        this.faults = List.copyOf(faults);
    }

    /** Refuses for one fault. */
    public Refusal(Fault fault) {
        this(List.of(fault));
    }

    /** Refuses for one fault that its sentence describes fully. */
    public Refusal(String field, FaultCode code, String detail) {
        this(new Fault(field, code, detail));
    }

    /** All faults, in the order in which they were found. */
    public List<Fault> faults() {
        return faults;
    }
}
