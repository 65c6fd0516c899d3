package skytally.project.lights;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.stream.Stream;
import skytally.project.Bounds;
import skytally.project.Field;
import skytally.project.Field.Subject;
import skytally.project.Fields;
import skytally.project.entry.AskedFields;

/** How new lights are put on the plan. */
enum Way {
    /** One, by its coordinates. */
    GRID("east", "north"),
    /** One, by distance and bearing from the reference point. */
    POLAR("distance", "direction"),
    /** Several at equal distances from a start to an end. */
    ROW("howMany", "startEast", "startNorth", "endEast", "endNorth"),
    /** Several at equal angles around a centre. */
    RING("howMany", "centreEast", "centreNorth", "radius", "firstBearing"),
    /** Rows of columns from a corner: a row runs along a bearing, the next is to its right. */
    BLOCK("startEast", "startNorth", "rows", "columns", "rowSpacing", "columnSpacing", "rowBearing");

    private final Set<String> required;

    Way(String... required) {
        this.required = Set.of(required);
    }

    /** The one of that word; by coordinates if it is none. */
    static Way of(String word) {
        return Arrays.stream(values())
                .filter(way -> way.word().equals(word))
                .findFirst()
                .orElse(GRID);
    }

    static List<String> words() {
        return Arrays.stream(values()).map(Way::word).toList();
    }

    String word() {
        return name().toLowerCase(Locale.ROOT);
    }

    /** What may not be left open; a position that is not known is left off the plan instead. */
    Set<String> required() {
        return required;
    }

    /** What is asked for, where first. */
    List<Field> fields(AskedFields asked) {
        List<Field> where = switch (this) {
            case GRID -> List.of(light("east"), light("north"));
            case POLAR -> List.of(asked.distance(Subject.LIGHT, "distance"), asked.bearing(Subject.LIGHT, "direction"));
            case ROW ->
                List.of(
                        asked.count(Subject.LIGHT, "howMany", Bounds.LIGHTS),
                        asked.coordinate(Subject.LIGHT, "startEast"),
                        asked.coordinate(Subject.LIGHT, "startNorth"),
                        asked.coordinate(Subject.LIGHT, "endEast"),
                        asked.coordinate(Subject.LIGHT, "endNorth"));
            case RING ->
                List.of(
                        asked.count(Subject.LIGHT, "howMany", Bounds.LIGHTS),
                        asked.coordinate(Subject.LIGHT, "centreEast"),
                        asked.coordinate(Subject.LIGHT, "centreNorth"),
                        asked.distance(Subject.LIGHT, "radius"),
                        asked.bearing(Subject.LIGHT, "firstBearing"),
                        asked.choice(Subject.LIGHT, "aim", List.of("outward", "inward")));
            case BLOCK ->
                List.of(
                        asked.coordinate(Subject.LIGHT, "startEast"),
                        asked.coordinate(Subject.LIGHT, "startNorth"),
                        asked.bearing(Subject.LIGHT, "rowBearing"),
                        asked.count(Subject.LIGHT, "rows", Bounds.LIGHTS),
                        asked.count(Subject.LIGHT, "columns", Bounds.LIGHTS),
                        asked.distance(Subject.LIGHT, "rowSpacing"),
                        asked.distance(Subject.LIGHT, "columnSpacing"));
        };
        return Stream.concat(
                        where.stream(),
                        Stream.of(
                                light("bearing"),
                                light("tilt"),
                                light("mountingHeight"),
                                asked.text(Subject.LIGHT, "heads")))
                .toList();
    }

    private static Field light(String name) {
        return Fields.find(Subject.LIGHT, name).orElseThrow();
    }
}
