/** What a farm's controller needs of several topics at once. */
@NullMarked
package freshet.farm;

import org.jspecify.annotations.NullMarked;
