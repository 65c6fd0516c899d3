/**
 * Knows how bright the night sky is of itself, over the zenith and down to the horizon, and the light it lays on surfaces.
 * Does not know any lamp, nor what an eye makes of the sky; extinction is handed to it as a number.
 * Zenith angles in degrees; sky in mag/arcsec², cd/m² or W m⁻² nm⁻¹ sr⁻¹ (V band); light on surfaces in lx.
 */
@NullMarked
package skytally.naturalsky;

import org.jspecify.annotations.NullMarked;
