/**
 * Knows where things stand and which way they face: positions, directions, turns.
 * Does not know what stands there.
 * Metres and radians; axes x east, y north, z up.
 */
@NullMarked
package skytally.geometry;

import org.jspecify.annotations.NullMarked;
