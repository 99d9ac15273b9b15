package freshet.method;

/** How well the source of a method's numbers was seen. */
public enum Seen {
    /** The numbers were read in the source itself. */
    PRINTED,
    /** The numbers were read in a later text, table or code that names the source. */
    SECONDARY,
    /** The numbers are recalled from the source and were not seen again. */
    MEMORY
}
