package skytally.project;

import java.util.List;
import java.util.function.ToDoubleFunction;

/**
 * A place somebody looks from.
 *
 * @param mark    unique in the project
 * @param values  what was said of it
 * @param looks   named directions looked at from it
 * @param horizon altitude of the skyline by bearing, rising in bearing; empty where it is open
 * @param ground  height of the ground on the line from the reference point to the place, rising in distance; empty where
 *                nothing is said of it
 */
public record Place(
        String mark, Values values, List<NamedLook> looks, List<HorizonPoint> horizon, List<GroundPoint> ground) {

    private static final double FARTHEST_M = 1_000_000;
    private static final double DEEPEST_M = -430;
    private static final double HIGHEST_M = 9000;

    /** A direction looked at: bearing clockwise from true north and altitude, both in degrees. */
    public record NamedLook(String name, double bearingDeg, double altitudeDeg) {

        public NamedLook {
            if (!(bearingDeg >= 0 && bearingDeg < 360 && altitudeDeg >= -90 && altitudeDeg <= 90)) {
                throw new IllegalArgumentException("A direction has a bearing of 0 to 360 and an altitude of -90 to 90"
                        + " degrees, not " + bearingDeg + " and " + altitudeDeg);
            }
        }
    }

    /** One point of the skyline, in degrees. */
    public record HorizonPoint(double bearingDeg, double altitudeDeg) {

        public HorizonPoint {
            if (!(bearingDeg >= 0 && bearingDeg < 360 && altitudeDeg >= -90 && altitudeDeg < 90)) {
                throw new IllegalArgumentException("A point of the skyline has a bearing of 0 to 360 and an altitude of"
                        + " -90 to 90 degrees, not " + bearingDeg + " and " + altitudeDeg);
            }
        }
    }

    /** The ground at a distance from the reference point: how far, and how high above the sea, both in metres. */
    public record GroundPoint(double distanceM, double heightM) {

        public GroundPoint {
            if (!(distanceM >= 0 && distanceM <= FARTHEST_M && heightM >= DEEPEST_M && heightM <= HIGHEST_M)) {
                throw new IllegalArgumentException("A point of the ground lies 0 to 1000000 m away and -430 to 9000 m"
                        + " above the sea, not " + distanceM + " and " + heightM);
            }
        }
    }

    public Place {
        Mark.require(mark);
        looks = List.copyOf(looks);
        horizon = List.copyOf(horizon);
        ground = List.copyOf(ground);
        Bounds.require(looks.size(), Bounds.LINES, "directions looked at from a place");
        Bounds.require(horizon.size(), Bounds.LINES, "points of a skyline");
        Bounds.require(ground.size(), Bounds.LINES, "points of the ground toward a place");
        requireRising("bearing of the skyline", horizon, HorizonPoint::bearingDeg);
        requireRising("distance of the ground", ground, GroundPoint::distanceM);
    }

    /** A place toward which nothing is said of the ground. */
    public Place(String mark, Values values, List<NamedLook> looks, List<HorizonPoint> horizon) {
        this(mark, values, looks, horizon, List.of());
    }

    /** The same place under another mark. */
    public Place called(String other) {
        return new Place(other, values, looks, horizon, ground);
    }

    /** The same place with other values. */
    public Place with(Values other) {
        return new Place(mark, other, looks, horizon, ground);
    }

    private static <T> void requireRising(String what, List<T> points, ToDoubleFunction<T> along) {
        for (int i = 1; i < points.size(); i++) {
            double here = along.applyAsDouble(points.get(i));
            if (!(here > along.applyAsDouble(points.get(i - 1)))) {
                throw new IllegalArgumentException(
                        "Each " + what + " is larger than the one before; " + here + " is not");
            }
        }
    }
}
