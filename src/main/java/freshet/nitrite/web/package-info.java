/** The nitrite calculations as HTTP sees them. */
@NullMarked
package freshet.nitrite.web;

import org.jspecify.annotations.NullMarked;
