package skytally.assessment;

import java.util.ArrayList;
import java.util.List;
import skytally.geometry.Position;
import skytally.scene.Observer;
import skytally.scene.Pane;

/** Points of a window. */
final class Panes {

    private Panes() {}

    /**
     * An even grid from edge to edge, the middle row and column through the eye's height and place; none below the
     * ground.
     *
     * @param across points from edge to edge, odd
     */
    static List<Position> points(Observer observer, Pane pane, int across) {
        Position middle = observer.eye();
        // along the glass: the facing turned a quarter to the right
        double east = observer.facing().y();
        double north = -observer.facing().x();
        List<Position> points = new ArrayList<>();
        for (int row = 0; row < across; row++) {
            double up = pane.heightM() * ((double) row / (across - 1) - 0.5);
            for (int column = 0; column < across; column++) {
                double right = pane.widthM() * ((double) column / (across - 1) - 0.5);
                points.add(new Position(
                        middle.eastM() + right * east,
                        middle.northM() + right * north,
                        Math.max(0, middle.heightM() + up)));
            }
        }
        return points;
    }
}
