package freshet.http.binding;

/** A form in which answers can be given. */
public interface Medium {

    /** Its media type. */
    String mediaType();
}
