package skytally.firstlook;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import skytally.assessment.Assessment.Topic;
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
record LadderPicture(String svg, String says, List<Row> rows, List<Source> sources) {

    /** One light: a natural one, or one of the proposal. */
    record Row(
            String name,
            Quantity light,
            Quantity other,
            String magnitude,
            String source,
            boolean proposed,
            double lux) {}

    /** A letter on the picture and what it leads to. */
    record Source(String letter, String reference, String standing) {}

    private static final ZeroPoint ZERO_POINT = ZeroPoint.TRADITIONAL;
    private static final double FAINTEST_SHOWN_LX = 1e-10;

    static LadderPicture of(Answer answer, Units units) {
        List<Ladder.Rung> rungs = Ladder.naturalRungs(ZERO_POINT);
        List<Row> rows = new ArrayList<>();
        Set<Source> sources = new LinkedHashSet<>();
        for (Ladder.Rung rung : rungs) {
            String name = rung.name() + (rung.onGround() ? ", on level ground" : "");
            rows.add(row(name, rung.lux(), units, rung.letter(), false));
            sources.add(new Source(
                    rung.letter(),
                    rung.source().reference(),
                    rung.source().standing().words()));
        }
        List<Ladder.Mark> marks = marks(answer);
        for (Ladder.Mark mark : marks) {
            rows.add(row(mark.name(), mark.lux(), units, "your sentence", true));
        }
        rows.sort(Comparator.comparingDouble(Row::lux).reversed());
        String says = says(answer, rows, units);
        return new LadderPicture(
                new Ladder("ladder", says, rungs, marks, ZERO_POINT).svg(), says, rows, List.copyOf(sources));
    }

    private static List<Ladder.Mark> marks(Answer answer) {
        int count = answer.sentence().count();
        String all = count == 1
                ? "This light"
                : "These " + QuantityFormat.decimals(count, 0).digits() + " lights";
        List<Ladder.Mark> marks = new ArrayList<>();
        answer.figure("direct/illuminance").range().ifPresent(range -> {
            if (range.likely() > 0) {
                marks.add(new Ladder.Mark(
                        all, range.likely(), range.low(), range.high(), light(answer, range.likely()), false));
            }
        });
        double other = answer.otherFigure("direct/illuminance").likely();
        if (isWorthAMark(answer, other)) {
            double now = answer.figure("direct/illuminance").likely();
            Ladder.Line says = now > 0
                    ? new Ladder.Line(
                            QuantityFormat.significant(other, 2),
                            " lx, " + QuantityFormat.significant(other / now, 2).plain() + " times as much")
                    : light(answer, other);
            marks.add(new Ladder.Mark(otherName(answer), other, other, other, says, true));
        }
        return marks;
    }

    /** Not when it is next to nothing, nor when it would lie on the other mark. */
    private static boolean isWorthAMark(Answer answer, double other) {
        double now = answer.figure("direct/illuminance").likely();
        return other > FAINTEST_SHOWN_LX && (now == 0 || Math.abs(other / now - 1) > 0.02);
    }

    private static String otherName(Answer answer) {
        double usual = answer.sentence().shape().usualTiltDeg();
        return answer.otherTilt() == usual
                ? "The same, hung as described"
                : "The same, tilted "
                        + QuantityFormat.atMost(answer.otherTilt() - usual, 3).plain()
                        + (usual == 0 ? "° toward you" : "° further up");
    }

    /** With its magnitude, where it may be compared with stars. */
    private static Ladder.Line light(Answer answer, double lux) {
        boolean star = !answer.assessment().has(Topic.NOT_A_POINT)
                && !answer.assessment().has(Topic.BRIGHTER_THAN_MOON);
        return new Ladder.Line(QuantityFormat.significant(lux, 2), star ? " lx, magnitude " + magnitude(lux) : " lx");
    }

    private static Row row(String name, double lux, Units units, String source, boolean proposed) {
        return new Row(
                name,
                Quantity.light(lux, 3, units),
                Quantity.lightOtherwise(lux, 3, units),
                magnitude(lux),
                source,
                proposed,
                lux);
    }

    private static String magnitude(double lux) {
        return QuantityFormat.decimals(
                        ZERO_POINT.magnitude(new Illuminance(lux)).value(), 1)
                .digits();
    }

    private static String says(Answer answer, List<Row> rows, Units units) {
        StringBuilder says =
                new StringBuilder("A logarithmic scale of light at the eye, from a billionth of a lux to ten lux.");
        for (int i = 0; i < rows.size(); i++) {
            Row row = rows.get(i);
            if (row.proposed()) {
                says.append(' ')
                        .append(row.name())
                        .append(verb(answer, row))
                        .append(row.light().plain())
                        .append(between(rows, i));
            }
        }
        if (rows.stream().noneMatch(Row::proposed)) {
            says.append(" No direct light of the proposal stands on it.");
        }
        return says.toString();
    }

    private static String verb(Answer answer, Row row) {
        boolean one = answer.sentence().count() == 1 || row.name().startsWith("The same");
        return one ? ": " : " together: ";
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
