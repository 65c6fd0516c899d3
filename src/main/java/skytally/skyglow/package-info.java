/**
 * Knows how light sent into the air is scattered back: from an emission and a line of sight to the brightness of
 * the sky along it.
 * Does not know what a luminaire is, nor what the sky would be by nature.
 * Metres, radians, nanometres; radiance comes out per unit of the intensity that went in, per square metre.
 */
@NullMarked
package skytally.skyglow;

import org.jspecify.annotations.NullMarked;
