/**
 * Knows the page that says how the sky over a place brightens, direction by direction, and what fades in it.
 * Does not know how lamps are seen.
 * mag/arcsec², cd/m², percent and magnitudes, as the assessment gives them.
 */
@NullMarked
package skytally.review.sky;

import org.jspecify.annotations.NullMarked;
