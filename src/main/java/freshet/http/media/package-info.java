/** From a response record to the bytes of an answer. */
@NullMarked
package freshet.http.media;

import org.jspecify.annotations.NullMarked;
