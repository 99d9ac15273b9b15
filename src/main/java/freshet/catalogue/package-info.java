/** What the service tells of itself: methods, constants, problems, the landing page. */
@NullMarked
package freshet.catalogue;

import org.jspecify.annotations.NullMarked;
