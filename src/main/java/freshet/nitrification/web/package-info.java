/** The nitrification calculations as HTTP sees them. */
@NullMarked
package freshet.nitrification.web;

import org.jspecify.annotations.NullMarked;
