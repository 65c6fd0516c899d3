package skytally.project.places;

import java.util.List;
import org.springframework.stereotype.Component;
import skytally.project.Claim;
import skytally.project.Field;
import skytally.project.Field.Subject;
import skytally.project.Stated;
import skytally.project.Values;
import skytally.project.entry.Amount;
import skytally.project.entry.AskedFields;
import skytally.project.entry.Spot;
import skytally.project.entry.ValueWords;
import skytally.project.entry.ValuesEditor;
import skytally.project.entry.Words;

/** Puts a place where a distance and a bearing from the reference point say. */
@Component
class PlaceSpot {

    static final String DISTANCE = "distance";
    static final String DIRECTION = "direction";

    private final Field distance;
    private final Field direction;
    private final ValueWords valueWords;
    private final Words words;

    PlaceSpot(AskedFields asked, ValueWords valueWords, Words words) {
        this.distance = asked.distance(Subject.PLACE, DISTANCE);
        this.direction = asked.bearing(Subject.PLACE, DIRECTION);
        this.valueWords = valueWords;
        this.words = words;
    }

    List<Field> fields() {
        return List.of(distance, direction);
    }

    /** The values with the position worked out; the grid says from what was typed. */
    Values put(Values values, Values typed) {
        Claim away = typed.get(DISTANCE).inUse();
        Claim toward = typed.get(DIRECTION).inUse();
        Spot spot = new Spot(0, 0)
                .at(
                        Amount.of(away).orElseThrow().doubleValue(),
                        Amount.of(toward).orElseThrow().doubleValue());
        String how =
                words.say("position.how.polar", valueWords.value(distance, away), valueWords.value(direction, toward));
        return values.with("east", stated(values.get("east"), away, spot.eastM(), how))
                .with("north", stated(values.get("north"), away, spot.northM(), how));
    }

    private static Stated stated(Stated before, Claim basis, double metres, String how) {
        return before.claimed(ValuesEditor.workedOut(basis, Spot.metres(metres), "m", how));
    }
}
