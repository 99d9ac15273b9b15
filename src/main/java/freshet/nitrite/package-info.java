/** Nitrite: how much of it is nitrous acid, and how much chloride keeps it out of fish. */
@NullMarked
package freshet.nitrite;

import org.jspecify.annotations.NullMarked;
