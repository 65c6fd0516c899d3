/**
 * Knows how the light of a lamp, a star or the natural sky is spread over wavelength, and what eye and V band make of it.
 * Does not know how much light there is, what it passes through, nor who looks.
 * Wavelengths in nm in air; powers in watts per watt of radiant flux between 380 and 780 nm.
 */
@NullMarked
package skytally.spectrum;

import org.jspecify.annotations.NullMarked;
