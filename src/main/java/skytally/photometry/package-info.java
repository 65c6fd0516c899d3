/**
 * Knows the quantities of light and how one is turned into another: lumens, candelas, lux, luminance, magnitudes.
 * Does not know what shines or who looks.
 * Units are the record's name and its one component: lm, cd, lx, cd/m², mag, mag/arcsec².
 */
@NullMarked
package skytally.photometry;

import org.jspecify.annotations.NullMarked;
