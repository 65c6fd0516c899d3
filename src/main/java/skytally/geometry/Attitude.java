package skytally.geometry;

/**
 * How a luminaire hangs: roll innermost, then tilt, then bearing.
 *
 * <p>Own frame: x toward the street side, y to the left of it, z up. World: x east, y north, z up.
 * <pre>
 *   world = Rz(90° − bearing) · Ry(−tilt) · Rx(roll) · own
 * </pre>
 * A positive tilt raises the street side: the nadir axis goes from straight down (0°) through level (90°),
 * toward the bearing, to straight up (180°). A positive roll raises the left side.
 *
 * @param bearingDeg of the street side, degrees clockwise from true north
 * @param tiltDeg    of the nadir axis from straight down, 0 to 180 degrees
 * @param rollDeg    about the street-side axis, −180 to 180 degrees
 */
public record Attitude(double bearingDeg, double tiltDeg, double rollDeg) {

    /** Opening straight down, street side to the north. */
    public static final Attitude LEVEL = new Attitude(0, 0, 0);

    public Attitude {
        if (!(bearingDeg >= -360 && bearingDeg <= 360)) {
            throw new IllegalArgumentException("Bearing must be -360 to 360 degrees, not " + bearingDeg);
        }
        if (!(tiltDeg >= 0 && tiltDeg <= 180)) {
            throw new IllegalArgumentException("Tilt must be 0 to 180 degrees, not " + tiltDeg);
        }
        if (!(rollDeg >= -180 && rollDeg <= 180)) {
            throw new IllegalArgumentException("Roll must be -180 to 180 degrees, not " + rollDeg);
        }
    }

    /** From the luminaire's own frame to the world's. */
    public Rotation rotation() {
        return Rotation.aboutZ(StrictMath.toRadians(90 - bearingDeg))
                .after(Rotation.aboutY(-StrictMath.toRadians(tiltDeg)))
                .after(Rotation.aboutX(StrictMath.toRadians(rollDeg)));
    }
}
