package skytally.skyglow;

import java.util.List;

/**
 * Light leaving one point, by direction.
 *
 * <p>Directions are in the frame of the point: the first axis level toward the viewer's place, the second level and
 * to the left of it, the third up.
 */
public interface Emission {

    /** Intensity toward a unit direction; any unit of strength, the same that comes out per square metre. */
    double toward(double ahead, double left, double up);

    /**
     * Cones on which the intensity jumps or bends sharply, so that an integral can be cut there. None for a smooth
     * emission.
     */
    List<Cone> edges();

    /** Height of the point above the ground, in metres. */
    double heightM();

    /**
     * A cone about an axis through the point.
     *
     * @param axisAhead first component of the axis, a unit vector
     * @param axisLeft  second component
     * @param axisUp    third component
     * @param cosine    of the half-angle; 0 is the plane square to the axis
     */
    record Cone(double axisAhead, double axisLeft, double axisUp, double cosine) {

        public static Cone aboutZenith(double cosine) {
            return new Cone(0, 0, 1, cosine);
        }
    }
}
