/**
 * Knows where each number, formula and comparison came from, and how sure that is.
 * Does not know what is computed from it, nor who asks.
 * No units: a citation carries words only.
 */
@NullMarked
package skytally.citation;

import org.jspecify.annotations.NullMarked;
