package skytally.scene;

import java.util.List;
import skytally.atmosphere.DirectPath;
import skytally.geometry.Position;

/**
 * The height of the ground on the straight line from the reference point to a place, where somebody entered it. Light
 * from a lamp whose line of sight runs into it is hidden.
 *
 * <p>The same heights stand for lines to lamps a little beside that line. Trees and hedges are no ground.
 *
 * @param points rising in distance from the reference point; none for ground that hides nothing
 */
public record GroundLine(List<Point> points) {

    /** Nothing entered, so nothing is hidden: the upper bound. */
    public static final GroundLine OPEN = new GroundLine(List.of());

    /** Nearer than this to either end a point of the ground is that end's own and hides nothing. */
    private static final double OWN_GROUND_M = 1;

    /**
     * A point of the ground.
     *
     * @param distanceM from the reference point, along the ground
     * @param heightM   in the scene's heights
     */
    public record Point(double distanceM, double heightM) {}

    public GroundLine {
        points = List.copyOf(points);
        for (int i = 1; i < points.size(); i++) {
            if (!(points.get(i).distanceM() > points.get(i - 1).distanceM())) {
                throw new IllegalArgumentException("Ground heights must rise in distance");
            }
        }
    }

    /**
     * Whether the ground stands in the line of sight between a lamp and an eye. The line is straight over the Earth
     * enlarged for mean refraction, so at x of the ground distance D it lies x (D − x) / 2R lower than the chord.
     */
    public boolean hides(Position lamp, Position eye) {
        if (points.isEmpty()) {
            return false;
        }
        double whole = lamp.groundDistanceTo(eye);
        double placeM = Math.hypot(eye.eastM(), eye.northM());
        for (Point point : points) {
            double fromEye = placeM - point.distanceM();
            if (fromEye > OWN_GROUND_M && fromEye < whole - OWN_GROUND_M) {
                double chord = eye.heightM() + (lamp.heightM() - eye.heightM()) * fromEye / whole;
                double sag = fromEye * (whole - fromEye) / (2 * DirectPath.EFFECTIVE_EARTH_RADIUS_M);
                if (point.heightM() > chord - sag) {
                    return true;
                }
            }
        }
        return false;
    }
}
