/**
 * Knows how findings are drawn: ladders, circles, plans, as SVG that stands by itself and prints.
 * Does not know how anything is worked out, nor where the picture goes.
 * Lengths in the picture's own units; every picture carries a title, a description and the numbers it shows.
 */
@NullMarked
package skytally.charts;

import org.jspecify.annotations.NullMarked;
