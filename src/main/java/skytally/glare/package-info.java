/**
 * Knows how light from beside the line of sight scatters in the eye and veils what is looked at.
 * Does not know where lamps and eyes stand, nor what is behind the veil.
 * Angles in degrees between the line of sight and the lamp; illuminance at the eye in lx; luminance in cd/m².
 */
@NullMarked
package skytally.glare;

import org.jspecify.annotations.NullMarked;
