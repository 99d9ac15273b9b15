/** How much the service takes on at once. */
@NullMarked
package freshet.http.limits;

import org.jspecify.annotations.NullMarked;
