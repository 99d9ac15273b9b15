/** Every answer that is not a result: one renderer for the servlet, Spring MVC and the server. */
@NullMarked
package freshet.http.problem;

import org.jspecify.annotations.NullMarked;
