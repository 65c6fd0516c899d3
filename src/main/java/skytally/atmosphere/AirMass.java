package skytally.atmosphere;

/**
 * How many times more air a slanting sightline to a star crosses than a vertical one.
 *
 * <p>Kasten and Young's fit, with the apparent altitude {@code a} in degrees, at sea level:
 * <pre>
 *   X(a) = 1 / ( sin a + 0.50572 (a + 6.07995)^−1.6364 )
 * </pre>
 * It stays finite at the horizon. For haze, which lies lower than the molecules, it is too small below about 5°.
 *
 * @see "Kasten, F. and Young, A. T. (1989), Revised optical air mass tables and approximation formula,
 *     Applied Optics 28, 4735-4738"
 */
public final class AirMass {

    private AirMass() {}

    /**
     * @param altitudeDeg apparent altitude above the horizon, 0 to 90 degrees
     * @return relative air mass, 1 overhead
     */
    public static double atAltitude(double altitudeDeg) {
        if (!(altitudeDeg >= 0 && altitudeDeg <= 90)) {
            throw new IllegalArgumentException("Altitude must be 0 to 90 degrees, not " + altitudeDeg);
        }
        double sine = StrictMath.sin(StrictMath.toRadians(altitudeDeg));
        return 1 / (sine + 0.50572 * StrictMath.pow(altitudeDeg + 6.07995, -1.6364));
    }
}
