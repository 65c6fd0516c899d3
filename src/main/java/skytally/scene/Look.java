package skytally.scene;

import skytally.geometry.Direction;

/**
 * A direction somebody looks in.
 *
 * @param id        its name at its place, such as {@code zenith}
 * @param direction of the line of sight
 */
public record Look(String id, Direction direction) {

    public static final String ZENITH = "zenith";
    public static final String TOWARD_SITE = "toward-site";
    public static final String BESIDE = "beside";

    /** Angle from straight up, in degrees. */
    public double zenithAngleDeg() {
        return StrictMath.toDegrees(direction.angleTo(Direction.UP));
    }
}
