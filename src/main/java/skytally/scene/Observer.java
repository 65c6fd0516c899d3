package skytally.scene;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import skytally.geometry.Direction;
import skytally.geometry.Position;

/**
 * A place somebody looks from.
 *
 * @param mark             its name
 * @param eye              position of the eye
 * @param facing           outward normal of the window or wall there
 * @param looks            the directions looked in
 * @param pane             the window, where its size is known
 * @param roadLuminanceCdM2 what the eye of a road user is adapted to, where somebody drives here
 * @param ground           what may hide the lamps
 */
public record Observer(
        String mark,
        Position eye,
        Direction facing,
        List<Look> looks,
        Optional<Pane> pane,
        OptionalDouble roadLuminanceCdM2,
        GroundLine ground) {

    public Observer {
        looks = List.copyOf(looks);
        if (!(eye.heightM() >= 0)) {
            throw new IllegalArgumentException("An eye must not be below the ground, at " + eye.heightM());
        }
    }

    /** An open place with nothing in between. */
    public Observer(String mark, Position eye, Direction facing, List<Look> looks) {
        this(mark, eye, facing, looks, Optional.empty(), OptionalDouble.empty(), GroundLine.OPEN);
    }

    /** The same eye moved to another point. */
    public Observer at(Position other) {
        return new Observer(mark, other, facing, looks, pane, roadLuminanceCdM2, ground);
    }
}
