/** The carbonate system: constants, speciation, mixing and dosing. */
@NullMarked
package freshet.carbonate;

import org.jspecify.annotations.NullMarked;
