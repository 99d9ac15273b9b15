package freshet.http.media;

import freshet.answer.Answer;
import freshet.answer.FaultCode;
import freshet.answer.Notice;
import freshet.answer.Refusal;
import freshet.http.binding.Controls.Format;
import java.util.List;
import java.util.stream.Collectors;

/** Writes answers in one media type. */
public interface AnswerWriter {

    /** How many notices an answer shows. */
    int MOST_NOTICES = 5;

    /** The notice that the inputs lie outside the range of a method. */
    String OUTSIDE = FaultCode.OUTSIDE_VALIDITY.code();

    /**
     * Writes an answer.
     *
     * @throws Refusal if a number is too large to be printed
     */
    Bytes write(Answer<?> answer, boolean compact);

    /** The writer of a format for one response record. */
    static AnswerWriter of(Format format, Table table) {
        return switch (format) {
            case JSON -> new JsonWriter(table);
            case CSV -> new CsvWriter(table);
            case CBOR -> new CborWriter(table);
            case C -> throw new IllegalStateException("A calculation writes this itself");
        };
    }

    /** The notices that are shown. */
    static List<Notice> shown(Answer<?> answer) {
        return answer.notices()
                .subList(0, Math.min(MOST_NOTICES, answer.notices().size()));
    }

    /** Their codes, each once, joined by semicolons; that of the range is left to {@code validity} beside them. */
    static String codes(Answer<?> answer) {
        return answer.notices().isEmpty()
                ? ""
                : shown(answer).stream()
                        .map(Notice::code)
                        .filter(code -> !code.equals(OUTSIDE))
                        .distinct()
                        .collect(Collectors.joining(";"));
    }

    /** The validity as answers spell it. */
    static String validity(Answer<?> answer) {
        return answer.validity().within() ? "within" : "outside";
    }
}
