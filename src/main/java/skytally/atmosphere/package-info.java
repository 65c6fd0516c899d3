/**
 * Knows the air: how much of it lies on a path, what it lets through and how it scatters, and where the Earth's
 * curve ends the view.
 * Does not know what shines through it or who looks.
 * Metres above the site's ground, nanometres, radians; optical depths and transmissions have no unit.
 */
@NullMarked
package skytally.atmosphere;

import org.jspecify.annotations.NullMarked;
