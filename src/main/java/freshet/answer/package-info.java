/** What a calculation gives back besides its numbers: the method, its validity, notices; or the faults for which it refuses. */
@NullMarked
package freshet.answer;

import org.jspecify.annotations.NullMarked;
