package skytally.scene;

import skytally.geometry.Attitude;
import skytally.geometry.Position;
import skytally.luminaire.IntensityDistribution;
import skytally.photometry.LuminousFlux;
import skytally.spectrum.Spectrum;

/**
 * Luminaires of one type that hang at one point in one attitude.
 *
 * @param mark          its name in the scheme
 * @param type          mark of its luminaire type
 * @param count         how many hang there, 0 or more
 * @param position      of the light source
 * @param groundHeightM of the ground under it, in the same heights
 * @param attitude      how it hangs
 * @param flux          of each, initial, leaving the luminaire
 * @param light         how it spreads that flux
 * @param spectrum      of its light
 * @param luminousSizeM largest dimension of the bright part, in metres
 * @param nearestM      distance from which the inverse-square law holds for it, in metres
 */
public record Lamp(
        String mark,
        String type,
        int count,
        Position position,
        double groundHeightM,
        Attitude attitude,
        LuminousFlux flux,
        IntensityDistribution light,
        Spectrum spectrum,
        double luminousSizeM,
        double nearestM) {

    public Lamp {
        if (count < 0) {
            throw new IllegalArgumentException("The number of lamps must be 0 or more, not " + count);
        }
        if (!(position.heightM() >= groundHeightM && groundHeightM >= 0)) {
            throw new IllegalArgumentException("A lamp must not hang below the ground, at " + position.heightM());
        }
    }

    /** Over ground at height 0. */
    public Lamp(
            String mark,
            String type,
            int count,
            Position position,
            Attitude attitude,
            LuminousFlux flux,
            IntensityDistribution light,
            Spectrum spectrum,
            double luminousSizeM,
            double nearestM) {
        this(mark, type, count, position, 0, attitude, flux, light, spectrum, luminousSizeM, nearestM);
    }

    /** The flux of all that hang there. */
    public LuminousFlux allFlux() {
        return flux.times(count);
    }
}
