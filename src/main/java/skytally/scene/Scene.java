package skytally.scene;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import skytally.geometry.Position;

/**
 * Everything the computation needs and nothing else. The same scene gives the same answer for ever.
 *
 * @param lamps        what shines, each where it hangs
 * @param unplaced     what shines nobody knows where: at the middle of the site, and counted for the sky alone
 * @param observers    who looks
 * @param surroundings what lies between and below
 * @param present      the sky as it is before, if anything is to be said of it
 * @param boundary     corners of the property line, each at the height of the ground there; none where it is not known
 */
public record Scene(
        List<Lamp> lamps,
        List<Lamp> unplaced,
        List<Observer> observers,
        Surroundings surroundings,
        Optional<Present> present,
        List<Position> boundary) {

    public Scene {
        lamps = List.copyOf(lamps);
        unplaced = List.copyOf(unplaced);
        observers = List.copyOf(observers);
        boundary = List.copyOf(boundary);
    }

    /** All that lights the sky. */
    public List<Lamp> allLamps() {
        return Stream.concat(lamps.stream(), unplaced.stream()).toList();
    }

    /** Nothing said of the present sky or of the outline of the site. */
    public Scene(List<Lamp> lamps, List<Observer> observers, Surroundings surroundings) {
        this(lamps, List.of(), observers, surroundings, Optional.empty(), List.of());
    }
}
