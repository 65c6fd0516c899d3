/**
 * Knows how a quantity is written for people: how many figures, which power of ten, which unit.
 * Does not know what the quantity means.
 * Takes numbers in the unit they are to be printed in.
 */
@NullMarked
package skytally.notation;

import org.jspecify.annotations.NullMarked;
