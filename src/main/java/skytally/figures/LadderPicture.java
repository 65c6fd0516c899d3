package skytally.figures;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import skytally.charts.Ladder;
import skytally.notation.QuantityFormat;
import skytally.photometry.Illuminance;
import skytally.photometry.ZeroPoint;
import skytally.web.Switches.Units;

/**
 * The ladder of light at the eye, as a picture, a sentence and a table.
 *
 * @param svg     the picture
 * @param says    the picture in a sentence or two
 * @param rows    the same as a table, brightest first
 * @param sources what the letters lead to
 */
public record LadderPicture(String svg, String says, List<Row> rows, List<Source> sources) {

    /** One light: a natural one, or one of the proposal. */
    public record Row(
            String name,
            Quantity light,
            Quantity other,
            String magnitude,
            String source,
            boolean proposed,
            double lux,
            String said) {}

    /** A letter on the picture and what it leads to. */
    public record Source(String letter, String reference, String standing) {}

    /**
     * A mark on the ladder and what it is called in a sentence.
     *
     * @param mark on the picture
     * @param said such as {@code These 24 lights together}
     */
    public record Said(Ladder.Mark mark, String said) {}

    private static final ZeroPoint ZERO_POINT = ZeroPoint.TRADITIONAL;

    /**
     * The ladder with the marks of a proposal on it.
     *
     * @param id    unique on the page
     * @param marks none of them without light
     */
    public static LadderPicture of(String id, List<Said> marks, Units units) {
        List<Ladder.Rung> rungs = Ladder.naturalRungs(ZERO_POINT);
        List<Row> rows = new ArrayList<>();
        Set<Source> sources = new LinkedHashSet<>();
        for (Ladder.Rung rung : rungs) {
            String name = rung.name() + (rung.onGround() ? ", on level ground" : "");
            rows.add(row(name, name, rung.lux(), units, rung.letter(), false));
            sources.add(new Source(
                    rung.letter(),
                    rung.source().reference(),
                    rung.source().standing().words()));
        }
        for (Said said : marks) {
            rows.add(row(said.mark().name(), said.said(), said.mark().lux(), units, "", true));
        }
        rows.sort(Comparator.comparingDouble(Row::lux).reversed());
        String says = says(rows);
        String svg = new Ladder(id, says, rungs, marks.stream().map(Said::mark).toList(), ZERO_POINT).svg();
        return new LadderPicture(svg, says, rows, List.copyOf(sources));
    }

    /** A light as the second line of a mark: with its magnitude, where it may be compared with stars. */
    public static Ladder.Line line(double lux, boolean comparedWithStars) {
        return new Ladder.Line(
                QuantityFormat.significant(lux, 2), comparedWithStars ? " lx, magnitude " + magnitude(lux) : " lx");
    }

    private static Row row(String name, String said, double lux, Units units, String source, boolean proposed) {
        return new Row(
                name,
                Quantity.light(lux, 3, units),
                Quantity.lightOtherwise(lux, 3, units),
                magnitude(lux),
                source,
                proposed,
                lux,
                said);
    }

    private static String magnitude(double lux) {
        return QuantityFormat.decimals(
                        ZERO_POINT.magnitude(new Illuminance(lux)).value(), 1)
                .digits();
    }

    private static String says(List<Row> rows) {
        StringBuilder says =
                new StringBuilder("A logarithmic scale of light at the eye, from a billionth of a lux to ten lux.");
        for (int i = 0; i < rows.size(); i++) {
            Row row = rows.get(i);
            if (row.proposed()) {
                says.append(' ')
                        .append(row.said())
                        .append(": ")
                        .append(row.light().plain())
                        .append(between(rows, i));
            }
        }
        if (rows.stream().noneMatch(Row::proposed)) {
            says.append(" No direct light of the proposal stands on it.");
        }
        return says.toString();
    }

    private static String between(List<Row> rows, int at) {
        String above = neighbour(rows, at, -1);
        String below = neighbour(rows, at, 1);
        if (above.isEmpty()) {
            return ", above every natural light shown.";
        }
        return below.isEmpty() ? ", below every natural light shown." : ", between " + below + " and " + above + ".";
    }

    private static String neighbour(List<Row> rows, int at, int step) {
        for (int i = at + step; i >= 0 && i < rows.size(); i += step) {
            if (!rows.get(i).proposed()) {
                return rows.get(i).name();
            }
        }
        return "";
    }
}
