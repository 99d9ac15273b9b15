/** The dilution calculations as HTTP sees them. */
@NullMarked
package freshet.dilution.web;

import org.jspecify.annotations.NullMarked;
