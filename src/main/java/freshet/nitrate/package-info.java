/** Where nitrate goes in a mixed tank with production, exchange, plants and denitrification. */
@NullMarked
package freshet.nitrate;

import org.jspecify.annotations.NullMarked;
