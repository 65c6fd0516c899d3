package skytally.project.lights;

import java.util.List;
import java.util.stream.Stream;
import skytally.project.Field;
import skytally.project.Fields;
import skytally.project.LuminaireType;
import skytally.project.Placement;
import skytally.project.Scheme;
import skytally.project.Stated;
import skytally.project.entry.Cell;
import skytally.project.entry.Spot;
import skytally.project.entry.ValueWords;
import skytally.project.entry.Words;
import skytally.scene.State;

/**
 * Some of the lights of a scheme as a table, because there may be twenty thousand.
 *
 * @param lines on this page of it
 * @param page  counted from 0
 * @param all   how many lights there are
 * @param type  only those of this type; empty for all
 */
record Plan(List<Line> lines, int page, int all, String type) {

    private static final int A_PAGE = 100;

    private static final List<Field> COLUMNS = Stream.of("east", "north", "bearing", "tilt", "mountingHeight")
            .map(name -> Fields.find(Field.Subject.LIGHT, name).orElseThrow())
            .toList();

    /**
     * A light.
     *
     * @param mark  of it
     * @param type  its type's mark
     * @param cells its values
     * @param polar distance and bearing from the reference point, or that it has no position
     */
    record Line(String mark, String type, List<Cell> cells, String polar) {}

    static Plan of(Scheme scheme, String type, int page, ValueWords valueWords, Words words) {
        List<Placement> lights = type.isEmpty() ? scheme.placements() : scheme.placementsOf(type);
        int last = Math.max(0, (lights.size() - 1) / A_PAGE);
        int shown = Math.min(page, last);
        return new Plan(
                lights.stream()
                        .skip((long) shown * A_PAGE)
                        .limit(A_PAGE)
                        .map(light -> line(scheme, light, valueWords, words))
                        .toList(),
                shown,
                lights.size(),
                type);
    }

    public int first() {
        return page * A_PAGE + 1;
    }

    public int last() {
        return page * A_PAGE + lines.size();
    }

    public boolean before() {
        return page > 0;
    }

    public boolean after() {
        return last() < all;
    }

    private static Line line(Scheme scheme, Placement light, ValueWords valueWords, Words words) {
        LuminaireType type = Schemes.type(scheme, light.type());
        return new Line(
                light.mark(),
                light.type(),
                COLUMNS.stream()
                        .map(field -> cell(field, light, type, valueWords, words))
                        .toList(),
                Spot.of(light.values())
                        .map(spot -> spot.fromReference(words))
                        .orElseGet(() -> words.say("position.none")));
    }

    private static Cell cell(Field field, Placement light, LuminaireType type, ValueWords valueWords, Words words) {
        String label = words.say("position.column." + field.name());
        Stated own = light.values().get(field.name());
        if (own.inUse().state() != State.NOT_KNOWN
                || field.name().equals("east")
                || field.name().equals("north")) {
            return valueWords.cell(label, field, own);
        }
        Stated ofType = type.values().get(field.name());
        String value = valueWords.value(field, ofType.inUse());
        return new Cell(
                label,
                value.isEmpty()
                        ? words.say("position.as-type", type.mark())
                        : words.say("position.as-type.value", type.mark(), value),
                ofType.inUse().state(),
                true);
    }
}
