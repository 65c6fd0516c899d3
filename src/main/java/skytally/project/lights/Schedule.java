package skytally.project.lights;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import skytally.luminaire.FittedShape;
import skytally.notation.QuantityFormat;
import skytally.project.Field;
import skytally.project.Fields;
import skytally.project.LuminaireType;
import skytally.project.Scheme;
import skytally.project.TypeLight;
import skytally.project.Values;
import skytally.project.entry.Amount;
import skytally.project.entry.Cell;
import skytally.project.entry.Tally;
import skytally.project.entry.ValueWords;
import skytally.project.entry.Words;
import skytally.scene.State;

/**
 * The schedule of one scheme as a table.
 *
 * @param mark   of the scheme
 * @param name   of the scheme
 * @param lines  a type each
 * @param placed lights on the plan
 * @param tally  how well its values are known
 * @param typed  the mark that could not be added, or empty
 */
record Schedule(String mark, String name, List<Line> lines, int placed, Tally tally, String typed) {

    /** What a schedule of the trade has, in its order. */
    private static final List<Field> COLUMNS = Stream.of(
                    "use",
                    "count",
                    "lumens",
                    "watts",
                    "spectralClass",
                    "shape",
                    "tilt",
                    "mountingHeight",
                    "hours",
                    "earlyOutput",
                    "lateOutput")
            .map(name -> Fields.find(Field.Subject.TYPE, name).orElseThrow())
            .toList();

    /**
     * A type.
     *
     * @param mark   of it
     * @param cells  its values
     * @param up     what it sends above the level as it hangs
     * @param placed how many of it are on the plan
     * @param tally  how well its values are known
     * @param differs what about it does not agree, in words
     */
    record Line(String mark, List<Column> cells, Up up, int placed, Tally tally, List<String> differs) {}

    /**
     * A value in its column.
     *
     * @param figure whether it is a number, to be set with the others under one another
     */
    record Column(Cell cell, boolean figure) {}

    /**
     * The share above the level as tilted.
     *
     * @param share  as reckoned with
     * @param says   how it came about, in few words
     */
    record Up(String share, String says) {}

    static Schedule of(Scheme scheme, ValueWords valueWords, Words words, String typed) {
        return new Schedule(
                scheme.mark(),
                scheme.name(),
                scheme.types().stream()
                        .map(type -> line(scheme, type, valueWords, words))
                        .toList(),
                scheme.placements().size(),
                tally(scheme.types().stream().map(LuminaireType::values).toList()),
                typed);
    }

    /** Over the values that a schedule has. */
    static Tally tally(List<Values> types) {
        return Tally.of(COLUMNS, types);
    }

    private static Line line(Scheme scheme, LuminaireType type, ValueWords valueWords, Words words) {
        TypeLight light = TypeLight.of(type.values());
        int placed = scheme.placementsOf(type.mark()).size();
        return new Line(
                type.mark(),
                COLUMNS.stream()
                        .map(field -> new Column(
                                cell(field, type.values(), light, valueWords, words),
                                field.kind().isNumber()))
                        .toList(),
                up(light, words),
                placed,
                tally(List.of(type.values())),
                differs(type.values(), light, placed, words));
    }

    /** As stated; lumens that nobody states stand as they are worked out. */
    private static Cell cell(Field field, Values values, TypeLight light, ValueWords valueWords, Words words) {
        String label = words.say("lights.column." + field.name());
        boolean workedOut =
                field.name().equals("lumens") && values.text("lumens").isEmpty();
        return workedOut && light.lumens().isPresent()
                ? new Cell(
                        label,
                        words.say(
                                "lights.lumens.worked",
                                QuantityFormat.atMost(light.lumens().get().value(), 6)
                                        .plain()),
                        State.NOT_KNOWN,
                        false)
                : valueWords.cell(label, field, values.get(field.name()));
    }

    private static Up up(TypeLight light, Words words) {
        FittedShape shape = light.shape();
        String says = switch (shape.fit()) {
            case NOTHING_STATED -> words.say("lights.up.shape");
            case AS_STATED -> words.say("lights.up.stated");
            case WIDTH_WORKED_OUT -> words.say("lights.up.width", Shares.degrees(shape.beamWidthDeg()));
            case DIFFERS ->
                words.say(
                        "lights.up.differs",
                        Shares.percent(shape.statedShare().orElseThrow()),
                        Shares.percent(shape.shapeShare()));
        };
        return new Up(Shares.percent(light.upwardShare()), says);
    }

    private static List<String> differs(Values values, TypeLight light, int placed, Words words) {
        List<String> differs = new ArrayList<>();
        COLUMNS.stream()
                .filter(field -> values.get(field.name()).isDisputed())
                .map(field -> words.say("lights.differs.claims", field.label()))
                .forEach(differs::add);
        if (light.shape().differs()) {
            differs.add(words.say("lights.differs.share"));
        }
        Amount.of(values.get("count").inUse())
                .filter(count -> count.intValue() != placed)
                .ifPresent(count -> differs.add(words.say("lights.differs.count", count.intValue(), placed)));
        return List.copyOf(differs);
    }
}
