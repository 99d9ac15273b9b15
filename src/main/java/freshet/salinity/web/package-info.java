/** What HTTP reaches of salinity. */
@NullMarked
package freshet.salinity.web;

import org.jspecify.annotations.NullMarked;
