package freshet.http;

import freshet.answer.Answer;
import freshet.answer.Fault;
import freshet.answer.FaultCode;
import freshet.answer.Notice;
import freshet.answer.Refusal;
import freshet.http.media.SixDigits;
import freshet.method.Range;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** What becomes of an answer whose inputs lie outside the range that the method's source states. */
final class StatedRange {

    private StatedRange() {}

    /**
     * The answer, with a notice for each range that is left.
     *
     * @throws Refusal if one is left and {@code strict}
     */
    static <R extends Record> Answer<R> check(Answer<R> answer, boolean strict) {
        if (answer.validity().within()) {
            return answer;
        }
        if (strict) {
            throw new Refusal(answer.validity().exceeded().stream()
                    .map(StatedRange::outsideValidity)
                    .toList());
        }
        return noticed(answer);
    }

    private static <R extends Record> Answer<R> noticed(Answer<R> answer) {
        List<Notice> notices = new ArrayList<>();
        for (Range range : answer.validity().exceeded()) {
            notices.add(new Notice(FaultCode.OUTSIDE_VALIDITY.code(), range.quantity(), stated(range)));
        }
        notices.addAll(answer.notices());
        return new Answer<>(answer.result(), answer.method(), answer.validity(), notices);
    }

    private static Fault outsideValidity(Range range) {
        return new Fault(range.quantity(), FaultCode.OUTSIDE_VALIDITY, stated(range))
                .bounds(OptionalDouble.of(range.minimum()), OptionalDouble.of(range.maximum()), range.unit());
    }

    private static String stated(Range range) {
        return "The source of the method holds for " + range.quantity() + " " + SixDigits.text(range.minimum()) + " to "
                + SixDigits.text(range.maximum()) + " (" + range.unit() + ").";
    }
}
