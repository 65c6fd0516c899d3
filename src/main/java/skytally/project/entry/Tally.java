package skytally.project.entry;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import skytally.project.Field;
import skytally.project.Values;
import skytally.scene.State;

/**
 * How many values are how well known.
 *
 * @param given     from a document
 * @param workedOut from given ones
 * @param assumed   by us
 * @param notKnown  at all
 */
public record Tally(int given, int workedOut, int assumed, int notKnown) {

    /** Of these fields, over all those things. */
    public static Tally of(List<Field> fields, List<Values> things) {
        Map<State, Integer> counts = new EnumMap<>(State.class);
        for (Values values : things) {
            for (Field field : fields) {
                counts.merge(values.get(field.name()).inUse().state(), 1, Integer::sum);
            }
        }
        return new Tally(
                counts.getOrDefault(State.GIVEN, 0),
                counts.getOrDefault(State.WORKED_OUT, 0),
                counts.getOrDefault(State.ASSUMED, 0),
                counts.getOrDefault(State.NOT_KNOWN, 0));
    }

    public int all() {
        return given + workedOut + assumed + notKnown;
    }
}
