package skytally.review;

import java.util.List;
import java.util.Optional;
import skytally.assessment.Assessment;
import skytally.scene.Observer;
import skytally.scene.Scene;

/**
 * One scheme in one period of the night, and what it gives.
 *
 * @param scene      likely values
 * @param leftOut    marks of types that could not be reckoned with
 * @param unplaced   marks of types some of whose lights have no position
 * @param unaimed    marks of types that face true north because nobody said where to
 * @param assessment nothing where no lamp can be reckoned with
 */
public record Night(
        Scene scene,
        List<String> leftOut,
        List<String> unplaced,
        List<String> unaimed,
        Optional<Assessment> assessment) {

    public Night {
        leftOut = List.copyOf(leftOut);
        unplaced = List.copyOf(unplaced);
        unaimed = List.copyOf(unaimed);
    }

    /** Who looks from that place; nothing where it has no position. */
    public Optional<Observer> observer(String place) {
        return scene.observers().stream()
                .filter(observer -> observer.mark().equals(place))
                .findFirst();
    }

    /** Rough size in memory, counted in figures. */
    int weight() {
        return 1
                + scene.allLamps().size()
                + assessment
                        .map(found -> found.figures().size()
                                + found.influences().size() / 8
                                + found.contributions().size())
                        .orElse(0);
    }
}
