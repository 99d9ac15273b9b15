/** Many rows through one calculation, one answer row for each, with memory that does not grow with them. */
@NullMarked
package freshet.http.series;

import org.jspecify.annotations.NullMarked;
