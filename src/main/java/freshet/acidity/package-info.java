/** pH scales, and the sulfate and fluoride equilibria that convert an acid constant from one scale to another. */
@NullMarked
package freshet.acidity;

import org.jspecify.annotations.NullMarked;
