package skytally.project.lights;

import java.util.List;
import java.util.stream.Stream;
import skytally.project.Field;
import skytally.project.Fields;
import skytally.project.LuminaireType;
import skytally.project.Scheme;
import skytally.project.Values;
import skytally.project.entry.Cell;
import skytally.project.entry.Tally;
import skytally.project.entry.ValueWords;
import skytally.project.entry.Words;

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
     * @param placed how many of it are on the plan
     * @param tally  how well its values are known
     */
    record Line(String mark, List<Cell> cells, int placed, Tally tally) {}

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
        return new Line(
                type.mark(),
                COLUMNS.stream()
                        .map(field -> valueWords.cell(
                                words.say("lights.column." + field.name()),
                                field,
                                type.values().get(field.name())))
                        .toList(),
                scheme.placementsOf(type.mark()).size(),
                tally(List.of(type.values())));
    }
}
