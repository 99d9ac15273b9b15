/** Salinity and density of water. */
@NullMarked
package freshet.salinity;

import org.jspecify.annotations.NullMarked;
