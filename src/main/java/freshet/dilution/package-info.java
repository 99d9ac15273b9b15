/** How much water a change of concentration takes. */
@NullMarked
package freshet.dilution;

import org.jspecify.annotations.NullMarked;
