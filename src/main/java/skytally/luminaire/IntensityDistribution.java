package skytally.luminaire;

/**
 * Luminous intensity by direction, per lumen that leaves the luminaire.
 *
 * <p>Directions are unit vectors of the luminaire's own frame: x toward the street side, y to the left of it, z up.
 * The nadir axis is −z. The integral over the whole sphere is 1.
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

    /** The intensity per lumen in symbols, as printed in a working; γ from the nadir axis, φ from the street side. */
    String formula();
}
