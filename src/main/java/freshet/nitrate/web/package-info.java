/** The nitrate calculations as HTTP sees them. */
@NullMarked
package freshet.nitrate.web;

import org.jspecify.annotations.NullMarked;
