/** Entity tags, so that an unchanged answer is neither computed nor sent. */
@NullMarked
package freshet.http.caching;

import org.jspecify.annotations.NullMarked;
