/** What a calculation is, and the servlet that answers all of them. */
@NullMarked
package freshet.http;

import org.jspecify.annotations.NullMarked;
