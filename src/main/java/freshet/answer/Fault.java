package freshet.answer;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * One thing wrong with a request.
 *
 * @param field the input, by the name the caller used
 * @param code what is wrong
 * @param detail one sentence that tells how to mend it
 * @param minimum least allowed value, where that was the fault
 * @param maximum greatest allowed value, where that was the fault
 * @param unit UCUM unit of the bounds
 * @param allowed the allowed values, where there is a list of them
 * @param nearest the known name or value nearest to the one given
 */
public record Fault(
        String field,
        FaultCode code,
        String detail,
        OptionalDouble minimum,
        OptionalDouble maximum,
        Optional<String> unit,
        List<String> allowed,
        Optional<String> nearest) {

    /** A fault that its sentence describes fully. */
    public Fault(String field, FaultCode code, String detail) {
        this(
                field,
                code,
                detail,
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                Optional.empty(),
                List.of(),
                Optional.empty());
    }

    /** The same with the bounds that were overstepped and their unit. */
    public Fault bounds(OptionalDouble least, OptionalDouble greatest, String ucum) {
        return new Fault(field, code, detail, least, greatest, Optional.of(ucum), allowed, nearest);
    }

    /** The same with the allowed values. */
    public Fault allowing(List<String> values) {
        return new Fault(field, code, detail, minimum, maximum, unit, values, nearest);
    }

    /** The same with the nearest known name or value. */
    public Fault near(Optional<String> name) {
        return new Fault(field, code, detail, minimum, maximum, unit, allowed, name);
    }
}
