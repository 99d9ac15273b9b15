/** Each physical quantity a caller may give, declared once: unit, bounds, wording, example and alternative inputs. */
@NullMarked
package freshet.quantity;

import org.jspecify.annotations.NullMarked;
