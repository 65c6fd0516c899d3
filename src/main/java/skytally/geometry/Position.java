package skytally.geometry;

/**
 * A point on the local grid.
 *
 * @param eastM   east of the reference point, along the ground
 * @param northM  north of it
 * @param heightM above the ground at the reference point
 */
public record Position(double eastM, double northM, double heightM) {

    public Position {
        if (!(Double.isFinite(eastM) && Double.isFinite(northM) && Double.isFinite(heightM))) {
            throw new IllegalArgumentException(
                    "A position must be finite, not (" + eastM + ", " + northM + ", " + heightM + ")");
        }
    }

    /** Distance along the ground to another position, in metres. */
    public double groundDistanceTo(Position other) {
        return Math.hypot(other.eastM - eastM, other.northM - northM);
    }

    /** Bearing of another position, in radians clockwise from north; north where both stand at one point. */
    public double bearingTo(Position other) {
        return StrictMath.atan2(other.eastM - eastM, other.northM - northM);
    }
}
