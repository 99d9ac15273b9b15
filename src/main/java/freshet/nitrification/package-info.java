/** Nitrification: ammonia from feed, what a biofilter oxidizes, how large it must be, what the oxidation consumes. */
@NullMarked
package freshet.nitrification;

import org.jspecify.annotations.NullMarked;
