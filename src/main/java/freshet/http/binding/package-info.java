/** From a query string or a JSON body to a request record, collecting every fault. */
@NullMarked
package freshet.http.binding;

import org.jspecify.annotations.NullMarked;
