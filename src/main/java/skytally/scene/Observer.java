package skytally.scene;

import java.util.List;
import skytally.geometry.Direction;
import skytally.geometry.Position;

/**
 * A place somebody looks from.
 *
 * @param mark   its name
 * @param eye    position of the eye
 * @param facing outward normal of the window or wall there
 * @param looks  the directions looked in
 */
public record Observer(String mark, Position eye, Direction facing, List<Look> looks) {

    public Observer {
        looks = List.copyOf(looks);
        if (!(eye.heightM() >= 0)) {
            throw new IllegalArgumentException("An eye must not be below the ground, at " + eye.heightM());
        }
    }
}
