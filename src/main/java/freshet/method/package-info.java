/** What a published method is: its source, its equation, its constants and the range its source states. */
@NullMarked
package freshet.method;

import org.jspecify.annotations.NullMarked;
