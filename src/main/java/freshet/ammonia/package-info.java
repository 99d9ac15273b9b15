/** The ammonium-ammonia equilibrium: speciation and the limits that follow from it. */
@NullMarked
package freshet.ammonia;

import org.jspecify.annotations.NullMarked;
