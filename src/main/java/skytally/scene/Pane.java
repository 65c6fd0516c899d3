package skytally.scene;

/**
 * The glass of a window, its middle at the eye.
 *
 * @param widthM  across, more than 0
 * @param heightM up and down, more than 0
 */
public record Pane(double widthM, double heightM) {

    public Pane {
        if (!(widthM > 0 && heightM > 0 && widthM <= 100 && heightM <= 100)) {
            throw new IllegalArgumentException(
                    "A window is more than 0 and at most 100 m wide and high, not " + widthM + " and " + heightM);
        }
    }
}
