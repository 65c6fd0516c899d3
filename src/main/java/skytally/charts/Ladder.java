package skytally.charts;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import skytally.citation.Citation;
import skytally.eye.NaturalAnchor;
import skytally.eye.NaturalAnchors;
import skytally.notation.QuantityFormat;
import skytally.notation.Written;
import skytally.photometry.Illuminance;
import skytally.photometry.ZeroPoint;

/**
 * The ladder of light at the eye: one tall logarithmic scale, lux on the left rail and magnitudes on the right, with
 * natural lights as rungs and the lights of a proposal as marks.
 *
 * <p>Ten decades from a billionth of a lux to ten, equal steps. Labels that would touch are moved apart and tied to
 * their place by a bent leader. A mark off the scale stands at its end and says so by an arrow.
 */
public final class Ladder {

    private static final double DECADE = 98;
    private static final double TOP = 34;
    private static final int HIGHEST_DECADE = 1;
    private static final int LOWEST_DECADE = -9;
    private static final double BOTTOM = TOP + DECADE * (HIGHEST_DECADE - LOWEST_DECADE);
    private static final double LEFT_RAIL = 59;
    private static final double RIGHT_RAIL = 150;
    private static final double RAIL_WIDTH = 5;
    private static final double MARK_X = 107;
    private static final double LABEL_X = 200;
    private static final double LABEL_HEIGHT = 37;
    private static final double WIDTH = 430;
    private static final double HEIGHT = BOTTOM + 22;

    /**
     * A natural light.
     *
     * @param name     as printed
     * @param lux      at the eye or on the ground, more than 0
     * @param onGround whether it is light on level ground rather than a point
     * @param letter   that leads to its source; the same source has the same letter
     * @param source   where its value comes from
     */
    public record Rung(String name, double lux, boolean onGround, String letter, Citation source) {}

    /** The rungs nature gives, brightest first. */
    public static List<Rung> naturalRungs(ZeroPoint zeroPoint) {
        Map<Citation, String> letters = new HashMap<>();
        return NaturalAnchors.all().stream()
                .sorted(Comparator.comparing((NaturalAnchor anchor) -> anchor.illuminance(zeroPoint))
                        .reversed())
                .map(anchor -> new Rung(
                        anchor.name(),
                        anchor.illuminance(zeroPoint).lux(),
                        anchor.kind() == NaturalAnchor.Kind.GROUND,
                        letters.computeIfAbsent(
                                anchor.citation(), source -> Character.toString((char) ('a' + letters.size()))),
                        anchor.citation()))
                .toList();
    }

    /**
     * A light of the proposal.
     *
     * @param name    as printed
     * @param lux     at the eye
     * @param low     least it may be, in lux
     * @param high    most it may be, in lux
     * @param says    the second line: its value in words and figures
     * @param whatIf  whether it is another way of building it rather than the proposal
     */
    public record Mark(String name, double lux, double low, double high, Line says, boolean whatIf) {}

    /**
     * A line of text with one number in it.
     *
     * @param number written out
     * @param after  what follows it
     */
    public record Line(Written number, String after) {}

    private record Label(
            double at,
            double wanted,
            @Nullable Rung rung,
            @Nullable Mark mark) {}

    private final String id;
    private final String description;
    private final List<Rung> rungs;
    private final List<Mark> marks;
    private final ZeroPoint zeroPoint;

    /**
     * @param id          unique on the page, for the title's and description's ids
     * @param description the picture in a sentence or two
     */
    public Ladder(String id, String description, List<Rung> rungs, List<Mark> marks, ZeroPoint zeroPoint) {
        this.id = id;
        this.description = description;
        this.rungs = List.copyOf(rungs);
        this.marks = marks.stream().filter(mark -> mark.lux() > 0).toList();
        this.zeroPoint = zeroPoint;
    }

    /** The picture as one SVG element. */
    public String svg() {
        Svg svg = new Svg();
        svg.open(
                "svg",
                "class",
                "app-ladder",
                "viewBox",
                "0 0 " + Svg.length(WIDTH) + " " + Svg.length(HEIGHT),
                "width",
                WIDTH,
                "height",
                HEIGHT,
                "role",
                "img",
                "aria-labelledby",
                id + "-title " + id + "-says");
        svg.text("title", "The ladder: light at the eye", "id", id + "-title");
        svg.text("desc", description, "id", id + "-says");
        drawLuxRail(svg);
        drawMagnitudeRail(svg);
        drawRungLines(svg);
        drawMagnitudeNumbers(svg);
        List<Label> placed = apart(labels());
        placed.forEach(label -> drawLabel(svg, label));
        marks.forEach(mark -> drawMark(svg, mark));
        return svg.close("svg").toString();
    }

    private void drawLuxRail(Svg svg) {
        svg.text(
                "text",
                "lux",
                "x",
                LEFT_RAIL - 3,
                "y",
                14.0,
                "font-size",
                13,
                "text-anchor",
                "end",
                "class",
                "app-text--strong");
        for (int decade = LOWEST_DECADE; decade < HIGHEST_DECADE; decade++) {
            boolean filled = Math.floorMod(decade, 2) == 1;
            svg.add(
                    "rect",
                    "x",
                    LEFT_RAIL,
                    "y",
                    y(decade + 1.0),
                    "width",
                    RAIL_WIDTH,
                    "height",
                    DECADE,
                    "class",
                    filled ? "app-ink" : "app-paper");
            for (int tick = 2; tick <= 9; tick++) {
                svg.add(
                        "path",
                        "d",
                        "M" + Svg.length(LEFT_RAIL + RAIL_WIDTH) + " " + Svg.length(y(decade + Math.log10(tick)))
                                + (tick == 5 ? "h7" : "h4"),
                        "class",
                        "app-stroke--thin",
                        "stroke-width",
                        1);
            }
        }
        for (int decade = LOWEST_DECADE; decade <= HIGHEST_DECADE; decade++) {
            double at = y(decade);
            svg.add(
                    "path",
                    "d",
                    "M" + Svg.length(LEFT_RAIL + RAIL_WIDTH) + " " + Svg.length(at) + "h12",
                    "class",
                    "app-stroke--thin",
                    "stroke-width",
                    1);
            svg.open("text", "x", LEFT_RAIL - 5, "y", at + 4.5, "font-size", 14, "text-anchor", "end");
            if (decade >= -2) {
                svg.words(List.of("0.01", "0.1", "1", "10").get(decade + 2));
            } else {
                power(svg, decade);
            }
            svg.close("text");
        }
        svg.add(
                "rect",
                "x",
                LEFT_RAIL,
                "y",
                TOP,
                "width",
                RAIL_WIDTH,
                "height",
                BOTTOM - TOP,
                "class",
                "app-stroke",
                "stroke-width",
                1);
    }

    private static void power(Svg svg, int decade) {
        svg.words("10").text("tspan", "−" + (-decade), "dy", -4.5, "font-size", 11);
    }

    private void drawMagnitudeRail(Svg svg) {
        svg.text("text", "magnitude", "x", RIGHT_RAIL + 8, "y", 14.0, "font-size", 13, "class", "app-text--strong");
        int brightest = (int) Math.ceil(magnitudeAt(HIGHEST_DECADE));
        int faintest = (int) Math.floor(magnitudeAt(LOWEST_DECADE));
        for (int magnitude = brightest; magnitude <= faintest; magnitude++) {
            double at = yOfMagnitude(magnitude);
            if (Math.floorMod(magnitude, 2) == 0) {
                double to = Math.min(BOTTOM, yOfMagnitude(magnitude + 1));
                svg.add("rect", "x", RIGHT_RAIL, "y", at, "width", RAIL_WIDTH, "height", to - at, "class", "app-ink");
            }
            svg.add(
                    "path",
                    "d",
                    "M" + Svg.length(RIGHT_RAIL) + " " + Svg.length(at) + "h-5",
                    "class",
                    "app-stroke--thin",
                    "stroke-width",
                    1);
        }
        svg.add(
                "rect",
                "x",
                RIGHT_RAIL,
                "y",
                TOP,
                "width",
                RAIL_WIDTH,
                "height",
                BOTTOM - TOP,
                "class",
                "app-stroke",
                "stroke-width",
                1);
    }

    private void drawMagnitudeNumbers(Svg svg) {
        int brightest = (int) Math.ceil(magnitudeAt(HIGHEST_DECADE));
        int faintest = (int) Math.floor(magnitudeAt(LOWEST_DECADE));
        for (int magnitude = brightest; magnitude <= faintest; magnitude++) {
            if (Math.floorMod(magnitude, 2) == 0) {
                String digits = magnitude < 0 ? "−" + (-magnitude) : Integer.toString(magnitude);
                svg.text(
                        "text",
                        digits,
                        "x",
                        RIGHT_RAIL + 32,
                        "y",
                        yOfMagnitude(magnitude) + 4.5,
                        "font-size",
                        13,
                        "text-anchor",
                        "end",
                        "class",
                        "app-text--soft app-halo");
            }
        }
    }

    private void drawRungLines(Svg svg) {
        for (Rung rung : rungs) {
            double at = yOfLux(rung.lux());
            String line =
                    "M" + Svg.length(LEFT_RAIL + RAIL_WIDTH) + " " + Svg.length(at) + "H" + Svg.length(RIGHT_RAIL);
            if (rung.onGround()) {
                svg.add("path", "d", line, "class", "app-stroke", "stroke-width", 1.5, "stroke-dasharray", "4 3");
            } else {
                svg.add("path", "d", line, "class", "app-stroke", "stroke-width", 1.5);
            }
        }
    }

    private List<Label> labels() {
        List<Label> labels = new ArrayList<>();
        rungs.forEach(rung -> labels.add(new Label(yOfLux(rung.lux()), yOfLux(rung.lux()), rung, null)));
        marks.forEach(mark -> labels.add(new Label(yOfLux(mark.lux()), yOfLux(mark.lux()), null, mark)));
        labels.sort(Comparator.comparingDouble(Label::at));
        return labels;
    }

    /**
     * Moves labels apart until none touch, each as little as may be: labels that would touch are joined into one
     * block, and a block stands where its members' wishes average out.
     */
    private static List<Label> apart(List<Label> sorted) {
        int count = sorted.size();
        double[] start = new double[count];
        int[] members = new int[count];
        int blocks = 0;
        for (Label label : sorted) {
            start[blocks] = label.wanted();
            members[blocks] = 1;
            blocks++;
            while (blocks > 1 && start[blocks - 1] < start[blocks - 2] + members[blocks - 2] * LABEL_HEIGHT) {
                int above = members[blocks - 2];
                int below = members[blocks - 1];
                double belowAsAbove = start[blocks - 1] - above * LABEL_HEIGHT;
                start[blocks - 2] = (start[blocks - 2] * above + belowAsAbove * below) / (above + below);
                members[blocks - 2] = above + below;
                blocks--;
            }
            double lowest = BOTTOM - (members[blocks - 1] - 1) * LABEL_HEIGHT;
            start[blocks - 1] = Math.max(TOP - 6, Math.min(lowest, start[blocks - 1]));
        }
        List<Label> placed = new ArrayList<>();
        int next = 0;
        for (int block = 0; block < blocks; block++) {
            for (int i = 0; i < members[block]; i++) {
                Label label = sorted.get(next++);
                placed.add(new Label(label.at(), start[block] + i * LABEL_HEIGHT, label.rung(), label.mark()));
            }
        }
        return placed;
    }

    private void drawLabel(Svg svg, Label label) {
        Rung rung = label.rung();
        if (rung != null) {
            svg.add(
                    "path",
                    "d",
                    "M" + Svg.length(RIGHT_RAIL + RAIL_WIDTH) + " " + Svg.length(label.at()) + "H188L194 "
                            + Svg.length(label.wanted()),
                    "class",
                    "app-stroke--thin",
                    "stroke-width",
                    1);
            svg.open("text", "x", LABEL_X, "y", label.wanted() + 4, "font-size", 14.5)
                    .words(rung.name());
            svg.text("tspan", rung.letter(), "font-size", 11, "dy", -5, "dx", 2).close("text");
            line(
                    svg,
                    new Line(
                            QuantityFormat.significant(rung.lux(), 2), rung.onGround() ? " lx on level ground" : " lx"),
                    label.wanted() + 20,
                    "app-text--soft",
                    13);
        }
        Mark mark = label.mark();
        if (mark != null) {
            Object[] stroke = mark.whatIf()
                    ? new Object[] {"stroke-width", 1.25, "stroke-dasharray", "4 3"}
                    : new Object[] {"stroke-width", 2.0, "stroke-linejoin", "round"};
            svg.add(
                    "path",
                    "d",
                    "M" + Svg.length(MARK_X + 9) + " " + Svg.length(label.at()) + "H190L194 "
                            + Svg.length(label.wanted()),
                    "class",
                    "app-mark-line",
                    stroke[0],
                    stroke[1],
                    stroke[2],
                    stroke[3]);
            svg.text(
                    "text",
                    isOffTheScale(mark) ? mark.name() + ", off the scale" : mark.name(),
                    "x",
                    LABEL_X,
                    "y",
                    label.wanted() + 4,
                    "font-size",
                    mark.whatIf() ? 14.5 : 16.0,
                    "class",
                    "app-text--mark");
            line(svg, mark.says(), label.wanted() + 21, "app-text--mark", 13.5);
        }
    }

    private static void line(Svg svg, Line line, double y, String style, double size) {
        svg.open("text", "x", LABEL_X, "y", y, "font-size", size, "class", style);
        Written number = line.number();
        if (number.hasPower()) {
            svg.words(number.digits() + " × 10");
            svg.text("tspan", number.powerDigits(), "dy", -4.5, "font-size", 10.5);
            svg.text("tspan", line.after(), "dy", 4.5);
        } else {
            svg.words(number.digits() + line.after());
        }
        svg.close("text");
    }

    private static boolean isOffTheScale(Mark mark) {
        double decades = Math.log10(mark.lux());
        return decades > HIGHEST_DECADE || decades < LOWEST_DECADE;
    }

    private void drawMark(Svg svg, Mark mark) {
        double at = yOfLux(mark.lux());
        if (!mark.whatIf() && mark.high() > mark.low()) {
            double top = yOfLux(mark.high());
            double bottom = mark.low() > 0 ? yOfLux(mark.low()) : BOTTOM;
            svg.add(
                    "path",
                    "d",
                    "M" + Svg.length(MARK_X) + " " + Svg.length(top) + "V" + Svg.length(bottom) + "M"
                            + Svg.length(MARK_X - 6) + " " + Svg.length(top) + "h12M" + Svg.length(MARK_X - 6) + " "
                            + Svg.length(bottom) + "h12",
                    "class",
                    "app-mark-line",
                    "stroke-width",
                    2.5);
        }
        svg.add(
                "path",
                "d",
                "M" + Svg.length(MARK_X) + " " + Svg.length(at - 10) + "l10 10l-10 10l-10 -10z",
                "class",
                mark.whatIf() ? "app-mark--hollow" : "app-mark");
        double decades = Math.log10(mark.lux());
        if (isOffTheScale(mark)) {
            String arrow = decades > HIGHEST_DECADE
                    ? " " + Svg.length(at - 14) + "l-6 9h12z"
                    : " " + Svg.length(at + 14) + "l-6 -9h12z";
            svg.add("path", "d", "M" + Svg.length(MARK_X) + arrow, "class", "app-range");
        }
    }

    private double magnitudeAt(double decade) {
        return zeroPoint.magnitude(new Illuminance(Math.pow(10, decade))).value();
    }

    private double yOfMagnitude(double magnitude) {
        double decade = Math.log10(zeroPoint.zeroMagnitudeLx()) - 0.4 * magnitude;
        return y(decade);
    }

    private static double yOfLux(double lux) {
        return y(Math.max(LOWEST_DECADE, Math.min(HIGHEST_DECADE, Math.log10(lux))));
    }

    private static double y(double decade) {
        return TOP + (HIGHEST_DECADE - decade) * DECADE;
    }
}
