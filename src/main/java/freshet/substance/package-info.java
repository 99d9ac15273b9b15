/** Molar masses and conversions between the bases in which a concentration is quoted. */
@NullMarked
package freshet.substance;

import org.jspecify.annotations.NullMarked;
