/**
 * Knows how numbers of an assessment are shown on pages: written with their unit and range, as a door to their
 * working, and on the ladder with its table.
 * Does not know which numbers a page shows, nor what they mean for it.
 * Takes what {@code assessment} gives, in its units, and writes it in the units the reader asked for.
 */
@NullMarked
package skytally.figures;

import org.jspecify.annotations.NullMarked;
