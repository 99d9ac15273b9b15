package freshet.answer;

import freshet.method.Method;
import freshet.method.Validity;
import java.util.List;

/**
 * A result and how it was made.
 *
 * @param <R> the record that holds the numbers
 * @param result the numbers
 * @param method the method that gave them
 * @param validity whether the inputs lie within the range the method's source states
 * @param notices what the reader must know, most serious first; the first five are shown
 */
public record Answer<R extends Record>(R result, Method method, Validity validity, List<Notice> notices) {}
