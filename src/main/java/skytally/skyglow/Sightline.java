package skytally.skyglow;

/**
 * A line of sight from a viewer's place, reckoned from the light.
 *
 * @param groundDistanceM  from under the light to under the eye, along the ground; more than 0, at most 500 km
 * @param eyeHeightM       above the ground at the light, 0 to 10 000 m
 * @param zenithAngleRad   of the direction looked at, 0 (overhead) to π
 * @param azimuthRad       of the direction looked at, clockwise from the direction to the light
 */
public record Sightline(double groundDistanceM, double eyeHeightM, double zenithAngleRad, double azimuthRad) {

    private static final double FURTHEST_M = 500_000;
    private static final double HIGHEST_M = 10_000;

    public Sightline {
        if (!(groundDistanceM > 0 && groundDistanceM <= FURTHEST_M)) {
            throw new IllegalArgumentException(
                    "Distance must be more than 0 and at most 500 000 m, not " + groundDistanceM);
        }
        if (!(eyeHeightM >= 0 && eyeHeightM <= HIGHEST_M)) {
            throw new IllegalArgumentException("Eye height must be 0 to 10 000 m, not " + eyeHeightM);
        }
        if (!(zenithAngleRad >= 0 && zenithAngleRad <= Math.PI)) {
            throw new IllegalArgumentException("Zenith angle must be 0 to π, not " + zenithAngleRad);
        }
        if (!Double.isFinite(azimuthRad)) {
            throw new IllegalArgumentException("Azimuth must be finite, not " + azimuthRad);
        }
    }

    /** The same, in degrees. */
    public static Sightline ofDegrees(
            double groundDistanceM, double eyeHeightM, double zenithAngleDeg, double azimuthDeg) {
        return new Sightline(
                groundDistanceM, eyeHeightM, StrictMath.toRadians(zenithAngleDeg), StrictMath.toRadians(azimuthDeg));
    }
}
