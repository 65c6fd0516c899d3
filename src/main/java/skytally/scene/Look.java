package skytally.scene;

import skytally.geometry.Direction;

/**
 * A direction somebody looks in.
 *
 * @param id        its name at its place, such as {@code zenith}
 * @param purpose   what is asked of it
 * @param direction of the line of sight
 */
public record Look(String id, Purpose purpose, Direction direction) {

    /** What is asked of a direction. */
    public enum Purpose {
        /** How the lamps beside it dazzle and what the air scatters into it. */
        GLARE,
        /** How bright the sky is there. */
        SKY,
        /** Where somebody drives to, and what lamps hide of the road there. */
        ROAD
    }

    public static final String ZENITH = "zenith";
    public static final String TOWARD_SITE = "toward-site";
    public static final String BESIDE = "beside";
    public static final String TRAVEL = "travel";

    /** How far beside the lights one looks in the direction {@link #BESIDE}. */
    public static final double BESIDE_RAD = Math.toRadians(10);

    /** Angle from straight up, in degrees. */
    public double zenithAngleDeg() {
        return StrictMath.toDegrees(direction.angleTo(Direction.UP));
    }
}
