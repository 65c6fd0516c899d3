package skytally.luminaire;

import java.util.List;

/**
 * Luminous intensity by direction, per lumen that leaves the luminaire.
 *
 * <p>Directions are unit vectors of the luminaire's own frame: x toward the street side, y to the left of it, z up.
 * The nadir axis is −z. The integral over the whole sphere is 1, but for one that takes the brighter of several
 * ({@link #readings}).
 */
public interface IntensityDistribution {

    /** Intensity toward a unit direction, in candelas per lumen (1/sr). */
    double perLumen(double x, double y, double z);

    /**
     * Angles from the nadir axis, in radians and rising, between which the intensity is smooth; 0 and π left out.
     * Integrals are divided there, and the intensity may jump there.
     */
    double[] breaksRad();

    /** Whether the intensity is the same all round the nadir axis. */
    boolean isRound();

    /** The light this takes the brightest of in each direction, each of one lumen a lumen: itself alone, as a rule. */
    default List<IntensityDistribution> readings() {
        return List.of(this);
    }

    /** The intensity per lumen in symbols, as printed in a working; γ from the nadir axis, φ from the street side. */
    String formula();
}
