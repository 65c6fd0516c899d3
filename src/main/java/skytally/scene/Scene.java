package skytally.scene;

import java.util.List;

/**
 * Everything the computation needs and nothing else. The same scene gives the same answer for ever.
 *
 * @param lamps        what shines
 * @param observers    who looks
 * @param surroundings what lies between and below
 */
public record Scene(List<Lamp> lamps, List<Observer> observers, Surroundings surroundings) {

    public Scene {
        lamps = List.copyOf(lamps);
        observers = List.copyOf(observers);
    }
}
