/** What HTTP reaches of the farm. */
@NullMarked
package freshet.farm.web;

import org.jspecify.annotations.NullMarked;
