package freshet.answer;

/**
 * Something the reader of an answer must know.
 *
 * @param code what it is, lower case with hyphens
 * @param field the input or output it speaks of
 * @param detail one sentence, at most 160 characters
 */
public record Notice(String code, String field, String detail) {

    private static final int LONGEST_DETAIL = 160;

    /** Checks the length of the sentence. */
    public Notice {
        if (detail.length() > LONGEST_DETAIL) {
            throw new IllegalArgumentException("Notice " + code + " is longer than 160 characters");
        }
    }
}
