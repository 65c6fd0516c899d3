package skytally.scene;

import java.util.List;
import java.util.Map;

/** A scene some of whose values are guesses, so that it can be drawn again with any of them at either end. */
public interface OpenScene {

    /** Where in its range a guess is set. */
    enum End {
        LOW,
        HIGH
    }

    /** The names of the values that are guesses and have a range. */
    List<String> guesses();

    /**
     * The scene with some guesses at an end and the others at their likely value.
     *
     * @param ends by name of the guess
     */
    Scene drawn(Map<String, End> ends);

    /**
     * How well a value that went into the scene is known.
     *
     * @param property which kind of value
     * @param mark     of the lamp or the place it belongs to
     */
    Known known(Property property, String mark);
}
