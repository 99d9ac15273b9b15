package freshet.method;

import java.util.Optional;

/**
 * Where a method was published.
 *
 * @param shortName authors and year, as an answer quotes them
 * @param full the whole bibliographic reference
 * @param doi the digital object identifier without a prefix, empty if the source has none
 */
public record Citation(String shortName, String full, Optional<String> doi) {

    private static final int LONGEST_REFERENCE = 80;

    /** Checks that the reference an answer carries fits into 80 characters. */
    public Citation {
        if (reference(shortName, doi).length() > LONGEST_REFERENCE) {
            throw new IllegalArgumentException("Reference longer than 80 characters: " + shortName);
        }
    }

    /** A source with a digital object identifier. */
    public static Citation withDoi(String shortName, String full, String doi) {
        return new Citation(shortName, full, Optional.of(doi));
    }

    /** A source without a digital object identifier: a handbook, a regulation, or this project's own construction. */
    public static Citation withoutDoi(String shortName, String full) {
        return new Citation(shortName, full, Optional.empty());
    }

    /** The reference of an answer, for example "Emerson et al. 1975, doi:10.1139/f75-274"; at most 80 characters. */
    public String reference() {
        return reference(shortName, doi);
    }

    private static String reference(String shortName, Optional<String> doi) {
        return doi.map(id -> shortName + ", doi:" + id).orElse(shortName);
    }
}
