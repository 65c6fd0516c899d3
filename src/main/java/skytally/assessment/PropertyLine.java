package skytally.assessment;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import skytally.geometry.Direction;
import skytally.geometry.Position;
import skytally.scene.Observer;
import skytally.scene.Scene;

/**
 * The edge of the site, along which rules of the kind "at any point of the property line" hold.
 *
 * @param corners in order, the last joined to the first; fewer than three are no line
 */
record PropertyLine(List<Position> corners) {

    /** A point at least every so often. */
    private static final double STEP_M = 1;

    /** Height above the ground at which the light is looked for (common practice, no source). */
    private static final double EYE_M = 1.5;

    private record Found(Position eye, UprightPlane plane) {}

    static PropertyLine of(Scene scene) {
        return new PropertyLine(scene.boundary());
    }

    /** The point that gets most on some upright plane, facing as that plane does. */
    Optional<Observer> worstPoint(DirectLight light) {
        if (corners.size() < 3) {
            return Optional.empty();
        }
        return points().parallelStream()
                .map(eye -> new Found(eye, light.brightestPlane(facing(eye, 0))))
                .reduce((one, other) ->
                        other.plane().illuminanceLx() > one.plane().illuminanceLx() ? other : one)
                .map(found -> facing(found.eye(), found.plane().facingDeg()));
    }

    private static Observer facing(Position eye, double bearingDeg) {
        return new Observer(
                Assessment.PROPERTY_LINE, eye, Direction.toward(StrictMath.toRadians(bearingDeg), 0), List.of());
    }

    /** Eyes along the line, {@link #STEP_M} apart or a little less so that each side is divided evenly. */
    List<Position> points() {
        List<Position> points = new ArrayList<>();
        for (int i = 0; i < corners.size(); i++) {
            Position from = corners.get(i);
            Position to = corners.get((i + 1) % corners.size());
            int steps = Math.max(1, (int) Math.ceil(from.groundDistanceTo(to) / STEP_M));
            for (int step = 0; step < steps; step++) {
                double share = (double) step / steps;
                points.add(new Position(
                        between(from.eastM(), to.eastM(), share),
                        between(from.northM(), to.northM(), share),
                        between(from.heightM(), to.heightM(), share) + EYE_M));
            }
        }
        return points;
    }

    private static double between(double from, double to, double share) {
        return from + (to - from) * share;
    }
}
