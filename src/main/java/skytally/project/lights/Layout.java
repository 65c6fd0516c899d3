package skytally.project.lights;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import org.springframework.stereotype.Component;
import skytally.project.Bounds;
import skytally.project.Claim;
import skytally.project.Field;
import skytally.project.LuminaireType;
import skytally.project.Placement;
import skytally.project.Scheme;
import skytally.project.Stated;
import skytally.project.Values;
import skytally.project.entry.Amount;
import skytally.project.entry.AskedFields;
import skytally.project.entry.Spot;
import skytally.project.entry.ValueWords;
import skytally.project.entry.ValuesEditor;
import skytally.project.entry.Words;

/** Makes lights from what was typed: each has its own position, and says how it was worked out. */
@Component
class Layout {

    private static final Set<String> KEPT = Set.of("east", "north", "bearing", "tilt", "mountingHeight");

    private final AskedFields asked;
    private final ValueWords valueWords;
    private final Words words;

    Layout(AskedFields asked, ValueWords valueWords, Words words) {
        this.asked = asked;
        this.valueWords = valueWords;
        this.words = words;
    }

    /**
     * The new lights, marked on from those there are.
     *
     * @param mark of the one light or pole, or empty for the next free one
     * @param said everything the way asks for
     * @throws IllegalArgumentException if they cannot be made, with what to do
     */
    List<Placement> lights(Way way, Scheme scheme, LuminaireType type, String mark, Values said) {
        Heads heads = Heads.read(said.text("heads"), words);
        long asked = (long) poles(way, said) * heads.aPole();
        if (scheme.placements().size() + asked > Bounds.LIGHTS) {
            throw new IllegalArgumentException(
                    words.say("position.fault.many", asked, scheme.placements().size(), Bounds.LIGHTS));
        }
        return poles(way, scheme, type.mark(), mark, said).stream()
                .flatMap(pole -> heads.on(pole, type, words).stream())
                .toList();
    }

    private static int poles(Way way, Values said) {
        return switch (way) {
            case GRID, POLAR -> 1;
            case ROW, RING -> (int) number(said, "howMany");
            case BLOCK -> (int) Math.min(Bounds.LIGHTS + 1.0, number(said, "rows") * number(said, "columns"));
        };
    }

    private List<Placement> poles(Way way, Scheme scheme, String type, String mark, Values said) {
        return switch (way) {
            case GRID -> List.of(new Placement(one(scheme, type, mark), type, kept(said)));
            case POLAR -> {
                String how =
                        words.say("position.how.polar", amount(way, said, "distance"), amount(way, said, "direction"));
                Spot spot = new Spot(0, 0).at(number(said, "distance"), number(said, "direction"));
                yield List.of(
                        new Placement(one(scheme, type, mark), type, put(kept(said), said, "distance", spot, how)));
            }
            case ROW -> row(way, scheme, type, said);
            case RING -> ring(way, scheme, type, said);
            case BLOCK -> block(way, scheme, type, said);
        };
    }

    private List<Placement> block(Way way, Scheme scheme, String type, Values said) {
        int rows = (int) number(said, "rows");
        int columns = (int) number(said, "columns");
        double along = number(said, "rowBearing");
        Spot corner = spot(said, "startEast", "startNorth");
        List<String> marks = marks(scheme, type, rows * columns);
        List<Placement> lights = new ArrayList<>();
        for (int row = 0; row < rows; row++) {
            Spot start = corner.at(row * number(said, "rowSpacing"), along + 90);
            for (int column = 0; column < columns; column++) {
                String how = words.say(
                        "position.how.block",
                        column + 1,
                        columns,
                        row + 1,
                        rows,
                        amount(way, said, "startEast"),
                        amount(way, said, "startNorth"),
                        amount(way, said, "columnSpacing"),
                        amount(way, said, "rowBearing"),
                        amount(way, said, "rowSpacing"));
                Spot spot = start.at(column * number(said, "columnSpacing"), along);
                lights.add(
                        new Placement(marks.get(lights.size()), type, put(kept(said), said, "startEast", spot, how)));
            }
        }
        return lights;
    }

    private List<Placement> row(Way way, Scheme scheme, String type, Values said) {
        int count = (int) number(said, "howMany");
        Spot start = spot(said, "startEast", "startNorth");
        Spot end = spot(said, "endEast", "endNorth");
        List<String> marks = marks(scheme, type, count);
        List<Placement> lights = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            String how = words.say(
                    "position.how.row",
                    i + 1,
                    count,
                    amount(way, said, "startEast"),
                    amount(way, said, "startNorth"),
                    amount(way, said, "endEast"),
                    amount(way, said, "endNorth"));
            Spot spot = count == 1 ? start : start.toward(end, i / (count - 1.0));
            lights.add(new Placement(marks.get(i), type, put(kept(said), said, "startEast", spot, how)));
        }
        return lights;
    }

    private List<Placement> ring(Way way, Scheme scheme, String type, Values said) {
        int count = (int) number(said, "howMany");
        Spot centre = spot(said, "centreEast", "centreNorth");
        String aim = said.text("aim");
        List<String> marks = marks(scheme, type, count);
        List<Placement> lights = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            double bearing = (number(said, "firstBearing") + 360.0 * i / count) % 360;
            String how = words.say(
                    "position.how.ring",
                    i + 1,
                    count,
                    amount(way, said, "radius"),
                    amount(way, said, "centreEast"),
                    amount(way, said, "centreNorth"),
                    amount(way, said, "firstBearing"));
            Values values = put(kept(said), said, "radius", centre.at(number(said, "radius"), bearing), how);
            if (!aim.isEmpty()) {
                double facing = aim.equals("inward") ? (bearing + 180) % 360 : bearing;
                Claim basis = said.get("firstBearing").inUse();
                values = values.with(
                        "bearing",
                        Stated.of(ValuesEditor.workedOut(
                                basis, Spot.metres(facing), "°", words.say("position.how." + aim))));
            }
            lights.add(new Placement(marks.get(i), type, values));
        }
        return lights;
    }

    private static Values put(Values values, Values said, String basis, Spot spot, String how) {
        Claim from = said.get(basis).inUse();
        return values.with("east", Stated.of(ValuesEditor.workedOut(from, Spot.metres(spot.eastM()), "m", how)))
                .with("north", Stated.of(ValuesEditor.workedOut(from, Spot.metres(spot.northM()), "m", how)));
    }

    private static Values kept(Values said) {
        Map<String, Stated> kept = new TreeMap<>(said.byField());
        kept.keySet().retainAll(KEPT);
        return new Values(kept);
    }

    private String amount(Way way, Values said, String name) {
        Field field = way.fields(asked).stream()
                .filter(one -> one.name().equals(name))
                .findFirst()
                .orElseThrow();
        return valueWords.value(field, said.get(name).inUse());
    }

    private static double number(Values said, String name) {
        return Amount.of(said.get(name).inUse()).orElseThrow().doubleValue();
    }

    private static Spot spot(Values said, String east, String north) {
        return Spot.of(said, east, north).orElseThrow();
    }

    private static String one(Scheme scheme, String type, String mark) {
        return mark.isEmpty() ? marks(scheme, type, 1).get(0) : mark;
    }

    /** The next free marks of a type: A1-01, A1-02 and so on; a pole whose lights are A1-01a and A1-01b has A1-01. */
    private static List<String> marks(Scheme scheme, String type, int count) {
        Set<String> taken = new HashSet<>();
        for (Placement light : scheme.placements()) {
            taken.add(light.mark());
            taken.add(light.mark().replaceAll("(?<=\\d)[a-z]$", ""));
        }
        List<String> marks = new ArrayList<>();
        for (int number = 1; marks.size() < count; number++) {
            String mark = type + (number < 10 ? "-0" : "-") + number;
            if (!taken.contains(mark)) {
                marks.add(mark);
            }
        }
        return marks;
    }
}
