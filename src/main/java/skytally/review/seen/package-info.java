/**
 * Knows the page that says how a place is lit: four harms, the ladder, the view, and which type causes what.
 * Does not know how a sky is told direction by direction.
 * Lux, cd/m² and percent, as the assessment gives them.
 */
@NullMarked
package skytally.review.seen;

import org.jspecify.annotations.NullMarked;
