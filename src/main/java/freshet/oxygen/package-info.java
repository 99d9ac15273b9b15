/** Dissolved oxygen at saturation. */
@NullMarked
package freshet.oxygen;

import org.jspecify.annotations.NullMarked;
