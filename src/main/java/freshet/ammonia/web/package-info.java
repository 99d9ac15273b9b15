/** The ammonia calculations as HTTP sees them. */
@NullMarked
package freshet.ammonia.web;

import org.jspecify.annotations.NullMarked;
