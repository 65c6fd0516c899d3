package skytally.geometry;

/**
 * A direction in space, held as a unit vector.
 *
 * @param x east (or, in a luminaire's own frame, toward its street side)
 * @param y north (or to the left of the street side)
 * @param z up
 */
public record Direction(double x, double y, double z) {

    public static final Direction UP = new Direction(0, 0, 1);
    public static final Direction DOWN = new Direction(0, 0, -1);

    private static final double UNIT_TOLERANCE = 1e-9;

    public Direction {
        if (!(Math.abs(x * x + y * y + z * z - 1) < UNIT_TOLERANCE)) {
            throw new IllegalArgumentException("A direction must have length 1, not (" + x + ", " + y + ", " + z + ")");
        }
    }

    /**
     * The direction of a vector of any length but none.
     *
     * @throws IllegalArgumentException for a vector of no length, or one that is not finite
     */
    public static Direction of(double x, double y, double z) {
        double length = Math.sqrt(x * x + y * y + z * z);
        if (!(length > 0 && length < Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException("No direction has the vector (" + x + ", " + y + ", " + z + ")");
        }
        return new Direction(x / length, y / length, z / length);
    }

    /**
     * @param bearingRad  clockwise from true north
     * @param altitudeRad above the level
     */
    public static Direction toward(double bearingRad, double altitudeRad) {
        double level = StrictMath.cos(altitudeRad);
        return of(level * StrictMath.sin(bearingRad), level * StrictMath.cos(bearingRad), StrictMath.sin(altitudeRad));
    }

    /** Cosine of the angle between this and another direction. */
    public double dot(Direction other) {
        return x * other.x + y * other.y + z * other.z;
    }

    /** Angle between this and another direction, in radians, 0 to π. */
    public double angleTo(Direction other) {
        double crossX = y * other.z - z * other.y;
        double crossY = z * other.x - x * other.z;
        double crossZ = x * other.y - y * other.x;
        double sine = Math.sqrt(crossX * crossX + crossY * crossY + crossZ * crossZ);
        return StrictMath.atan2(sine, dot(other));
    }
}
