/** What HTTP reaches of oxygen. */
@NullMarked
package freshet.oxygen.web;

import org.jspecify.annotations.NullMarked;
