/**
 * Knows how a luminaire spreads its light: shapes, their exact normalisation, and what an attitude makes of them.
 * Does not know where it stands or who sees it.
 * Candelas per lumen of the luminaire's flux; own frame x street side, y left, z up; angles from the nadir axis.
 */
@NullMarked
package skytally.luminaire;

import org.jspecify.annotations.NullMarked;
