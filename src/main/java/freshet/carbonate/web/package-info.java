/** What HTTP reaches of the carbonate system. */
@NullMarked
package freshet.carbonate.web;

import org.jspecify.annotations.NullMarked;
