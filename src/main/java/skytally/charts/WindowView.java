package skytally.charts;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.OptionalDouble;
import java.util.function.Function;
import skytally.assessment.SeenLamps.SeenLamp;
import skytally.eye.NaturalAnchors;
import skytally.notation.QuantityFormat;
import skytally.photometry.ZeroPoint;

/**
 * The view from a window at night: every light as a point at its true bearing and altitude, both on one scale.
 *
 * <p>The area of a point is its light at the eye, on the scale of the natural light printed beside it. Lamps on one
 * column are one point, and so are points nearer to each other than the picture can show. The border is cut into
 * blocks of half a degree, or of more where the view is wide; a broken line is level with the eye, a plain one the
 * ground at the site.
 */
public final class WindowView {

    /** The two drawings of one view. */
    public enum Size {
        /** For a desk: the natural light stands beside the view. */
        WIDE(640, 380, 800, 6),
        /** For a telephone: it stands below. */
        NARROW(296, 300, 358, 4);

        private final double paneWidth;
        private final double paneHeight;
        private final double width;
        private final int labels;

        Size(double paneWidth, double paneHeight, double width, int labels) {
            this.paneWidth = paneWidth;
            this.paneHeight = paneHeight;
            this.width = width;
            this.labels = labels;
        }
    }

    private static final double VENUS_RADIUS = 10.5;
    private static final double WIDEST_RADIUS = 24;
    private static final double SMALLEST_RADIUS = 0.6;
    private static final double LEAST_SHOWN_RADIUS = 1.5;
    private static final int MOST_POINTS = 1200;
    private static final double EDGE = 10;
    private static final double MARGIN = 26;
    private static final double ROW = 20;
    private static final double LETTER = 6.7;
    private static final double SMALLEST_FIELD_DEG = 1;
    private static final double LEAST_HEIGHT = 200;
    private static final List<Double> BLOCKS_DEG = List.of(0.5, 1.0, 2.0, 5.0, 10.0, 15.0, 30.0, 45.0, 90.0);

    /** A point of the picture. */
    private record Point(double bearing, double altitude, double lux) {}

    private record Box(double left, double right, double top, double bottom) {

        boolean touches(Box other) {
            return left < other.right && other.left < right && top < other.bottom && other.top < bottom;
        }
    }

    /** Which side of its leader a label stands on. */
    private enum Side {
        RIGHT("h6", "start"),
        LEFT("h-6", "end"),
        OVER("", "middle");

        private final String hook;
        private final String anchor;

        Side(String hook, String anchor) {
            this.hook = hook;
            this.anchor = anchor;
        }
    }

    private record Label(String words, Box box, double leaderX, double fromY, Side side) {

        double middle() {
            return (box.top + box.bottom) / 2;
        }

        double leaderTop() {
            return side == Side.OVER ? box.bottom : middle();
        }

        double textX() {
            return switch (side) {
                case RIGHT -> box.left;
                case LEFT -> box.right;
                case OVER -> (box.left + box.right) / 2;
            };
        }

        Box leader() {
            return new Box(leaderX - 1, leaderX + 1, leaderTop(), fromY);
        }
    }

    /** A natural light, or a round number of lux, that the points are drawn to the scale of. */
    private record Reference(String name, double lux) {}

    private final String id;
    private final String title;
    private final String description;
    private final Function<String, String> names;
    private final Size size;
    private final List<SeenLamp> lamps;
    private final OptionalDouble groundDeg;

    private final double fromDeg; // bearing at the left of the first lamp, so that the rest rise from it
    private final List<Point> points;
    private final double areaPerLux;
    private final double scale; // pixels a degree
    private final double leftDeg; // bearing at the left edge of the pane
    private final double topDeg; // altitude at its upper edge
    private final double paneHeight;
    private final List<Label> labels = new ArrayList<>();

    /**
     * @param id          unique on the page
     * @param title       of the picture
     * @param description the picture in a sentence or two
     * @param lamps       as seen, at least one
     * @param groundDeg   altitude of the ground at the site, if it is to be drawn
     * @param names       what a type is called, by its mark
     */
    public WindowView(
            String id,
            String title,
            String description,
            List<SeenLamp> lamps,
            OptionalDouble groundDeg,
            Function<String, String> names,
            Size size) {
        if (lamps.isEmpty()) {
            throw new IllegalArgumentException("A view needs a lamp that is seen");
        }
        this.id = id;
        this.title = title;
        this.description = description;
        this.lamps = List.copyOf(lamps);
        this.groundDeg = groundDeg;
        this.names = names;
        this.size = size;
        fromDeg = afterTheWidestGap(lamps);
        List<Point> columns = columns();
        double span = columns.stream().mapToDouble(Point::bearing).max().orElse(0);
        double highest = columns.stream().mapToDouble(Point::altitude).max().orElse(0);
        double lowest = columns.stream().mapToDouble(Point::altitude).min().orElse(0);
        double top = Math.max(0, highest);
        double bottom = Math.min(0, Math.min(lowest, groundDeg.orElse(0)));
        double inside = size.paneWidth - 2 * MARGIN;
        double wished = Math.min(
                inside / Math.max(SMALLEST_FIELD_DEG, 1.25 * span),
                (size.paneHeight - 2 * MARGIN) / Math.max(SMALLEST_FIELD_DEG / 2, top - bottom));
        scale = Math.max(wished, size.paneWidth / 360);
        leftDeg = fromDeg + span / 2 - size.paneWidth / 2 / scale;
        points = gathered(columns);
        double most = points.stream().mapToDouble(Point::lux).max().orElse(0);
        areaPerLux = areaPerLux(most);
        double above = radius(most) + 12;
        placeLabels(highest * scale, above); // with the highest lamp at 0
        double labelled =
                labels.stream().mapToDouble(label -> label.box().top()).min().orElse(0);
        double foot = (top - bottom) * scale + Math.max(MARGIN, radius(most) + 6);
        double head = Math.max(Math.max(MARGIN, -labelled - (top - highest) * scale + 8), LEAST_HEIGHT - foot);
        topDeg = top + head / scale;
        paneHeight = head + foot;
    }

    /** The bearing after which all lamps lie within the narrowest field. */
    private static double afterTheWidestGap(List<SeenLamp> lamps) {
        double[] bearings =
                lamps.stream().mapToDouble(SeenLamp::bearingDeg).sorted().toArray();
        double widest = 360 - bearings[bearings.length - 1] + bearings[0];
        double from = bearings[0];
        for (int i = 1; i < bearings.length; i++) {
            if (bearings[i] - bearings[i - 1] > widest) {
                widest = bearings[i] - bearings[i - 1];
                from = bearings[i];
            }
        }
        return from;
    }

    private double along(double bearingDeg) {
        return (bearingDeg - fromDeg + 720) % 360;
    }

    /** Lamps that hang above one spot of the ground. */
    private List<Point> columns() {
        Map<List<Long>, List<Point>> bySpot = new LinkedHashMap<>();
        for (SeenLamp lamp : lamps) {
            List<Long> spot = List.of(
                    Math.round(10 * lamp.at().eastM()),
                    Math.round(10 * lamp.at().northM()));
            bySpot.computeIfAbsent(spot, key -> new ArrayList<>())
                    .add(new Point(along(lamp.bearingDeg()), lamp.altitudeDeg(), lamp.allLx()));
        }
        return bySpot.values().stream().map(WindowView::asOne).toList();
    }

    /** Light adds; the point stands in the middle of its light. */
    private static Point asOne(Collection<Point> some) {
        double lux = some.stream().mapToDouble(Point::lux).sum();
        double bearing = some.stream()
                .mapToDouble(point -> point.bearing() * point.lux())
                .sum();
        double altitude = some.stream()
                .mapToDouble(point -> point.altitude() * point.lux())
                .sum();
        return new Point(bearing / lux, altitude / lux, lux);
    }

    /** Points in one cell of the picture become one; cells grow until the picture is of a bearable size. */
    private List<Point> gathered(List<Point> columns) {
        double cell = 1;
        List<Point> few = gathered(columns, cell);
        while (few.size() > MOST_POINTS) {
            cell *= 1.5;
            few = gathered(columns, cell);
        }
        return few.stream()
                .sorted(Comparator.comparingDouble(Point::lux).reversed())
                .toList();
    }

    private List<Point> gathered(List<Point> columns, double cell) {
        Map<List<Long>, List<Point>> cells = new LinkedHashMap<>();
        for (Point point : columns) {
            List<Long> at =
                    List.of(Math.round(point.bearing() * scale / cell), Math.round(point.altitude() * scale / cell));
            cells.computeIfAbsent(at, key -> new ArrayList<>()).add(point);
        }
        return cells.values().stream().map(WindowView::asOne).toList();
    }

    /** Venus as large as is usual here, unless the brightest point would outgrow the picture. */
    private static double areaPerLux(double most) {
        double usual = Math.PI * VENUS_RADIUS * VENUS_RADIUS / lux("venus");
        return Math.min(usual, Math.PI * WIDEST_RADIUS * WIDEST_RADIUS / most);
    }

    private Reference reference() {
        if (radius(lux("venus")) >= LEAST_SHOWN_RADIUS) {
            return new Reference("Venus", lux("venus"));
        }
        if (radius(lux("full-moon")) >= LEAST_SHOWN_RADIUS) {
            return new Reference("full Moon", lux("full-moon"));
        }
        return new Reference("10 lx", 10);
    }

    private static double lux(String anchor) {
        return NaturalAnchors.byId(anchor)
                .orElseThrow()
                .illuminance(ZeroPoint.TRADITIONAL)
                .lux();
    }

    private double radius(double lux) {
        return Math.sqrt(areaPerLux * lux / Math.PI);
    }

    private double x(double bearing) {
        return EDGE + (fromDeg + bearing - leftDeg) * scale;
    }

    private double y(double altitude) {
        return EDGE + (topDeg - altitude) * scale;
    }

    /** Names of the brightest types above their brightest point, so that none touches another or the level line. */
    private void placeLabels(double levelY, double above) {
        Map<String, Double> byType = new HashMap<>();
        Map<String, SeenLamp> brightest = new HashMap<>();
        for (SeenLamp lamp : lamps) {
            byType.merge(lamp.type(), lamp.allLx(), Double::sum);
            brightest.merge(lamp.type(), lamp, (a, b) -> a.allLx() >= b.allLx() ? a : b);
        }
        double highest = points.stream().mapToDouble(Point::altitude).max().orElse(0);
        Box level = new Box(EDGE, EDGE + 130, levelY - 20, levelY + 4);
        byType.entrySet().stream()
                .sorted(Map.Entry.<String, Double>comparingByValue()
                        .reversed()
                        .thenComparing(Map.Entry.comparingByKey()))
                .limit(size.labels)
                .forEach(type -> {
                    SeenLamp lamp = Objects.requireNonNull(brightest.get(type.getKey()));
                    double at = x(along(lamp.bearingDeg()));
                    double from = (highest - lamp.altitudeDeg()) * scale - 4;
                    placeLabel(names.apply(type.getKey()), at, from, above, level);
                });
    }

    private void placeLabel(String words, double at, double from, double above, Box level) {
        double width = words.length() * LETTER;
        for (int row = 0; row < 2 * size.labels; row++) {
            double bottom = -above - row * ROW;
            for (Side side : Side.values()) {
                double left = left(side, at, width);
                Label label = new Label(words, new Box(left, left + width, bottom - ROW + 2, bottom), at, from, side);
                boolean inside = left >= EDGE + 4 && left + width <= EDGE + size.paneWidth - 4;
                if (inside && !label.box().touches(level) && labels.stream().noneMatch(other -> meet(label, other))) {
                    labels.add(label);
                    return;
                }
            }
        }
    }

    private double left(Side side, double at, double width) {
        return switch (side) {
            case RIGHT -> at + 9;
            case LEFT -> at - 9 - width;
            case OVER -> Math.max(EDGE + 5, Math.min(EDGE + size.paneWidth - 5 - width, at - width / 2));
        };
    }

    private static boolean meet(Label one, Label other) {
        return one.box().touches(other.box())
                || one.box().touches(other.leader())
                || one.leader().touches(other.box());
    }

    /** The picture as one SVG element. */
    public String svg() {
        boolean wide = size == Size.WIDE;
        double height = paneHeight + (wide ? 36 : 94);
        Svg svg = new Svg();
        svg.open(
                "svg",
                "viewBox",
                "0 0 " + Svg.length(size.width) + " " + Svg.length(height),
                "width",
                size.width,
                "height",
                height,
                "role",
                "img",
                "aria-labelledby",
                id + "-title " + id + "-says");
        svg.text("title", title, "id", id + "-title");
        svg.text("desc", description, "id", id + "-says");
        svg.add("rect", "x", EDGE, "y", EDGE, "width", size.paneWidth, "height", paneHeight, "class", "app-pane");
        drawBorder(svg);
        drawLines(svg);
        labels.forEach(label -> drawLabel(svg, label));
        drawPoints(svg);
        drawReference(svg);
        return svg.close("svg").toString();
    }

    private static double step(double scale, double leastPixels) {
        return BLOCKS_DEG.stream()
                .filter(block -> block * scale >= leastPixels)
                .findFirst()
                .orElse(BLOCKS_DEG.get(BLOCKS_DEG.size() - 1));
    }

    private void drawBorder(Svg svg) {
        double right = EDGE + size.paneWidth;
        double foot = EDGE + paneHeight;
        double block = step(scale, 10);
        double bottomDeg = topDeg - paneHeight / scale;
        for (double at = Math.floor(leftDeg / block); at * block < leftDeg + size.paneWidth / scale; at++) {
            if (Math.floorMod((long) at, 2L) == 0) {
                double from = Math.max(EDGE, EDGE + (at * block - leftDeg) * scale);
                double to = Math.min(right, EDGE + ((at + 1) * block - leftDeg) * scale);
                rect(svg, from, 1, to - from, 6);
                rect(svg, from, foot + 3, to - from, 6);
            }
        }
        for (double at = Math.floor(bottomDeg / block); at * block < topDeg; at++) {
            if (Math.floorMod((long) at, 2L) == 0) {
                double from = Math.max(EDGE, y((at + 1) * block));
                double to = Math.min(foot, y(at * block));
                rect(svg, 1, from, 6, to - from);
                rect(svg, right + 3, from, 6, to - from);
            }
        }
        frame(svg, 1);
        frame(svg, 7);
        drawBearings(svg, foot + 26);
        drawAltitudes(svg, right + 15, bottomDeg);
    }

    private static void rect(Svg svg, double x, double y, double width, double height) {
        if (width > 0 && height > 0) {
            svg.add("rect", "x", x, "y", y, "width", width, "height", height, "class", "app-ink");
        }
    }

    private void frame(Svg svg, double at) {
        double more = 2 * (EDGE - at);
        svg.add(
                "rect",
                "x",
                at,
                "y",
                at,
                "width",
                size.paneWidth + more,
                "height",
                paneHeight + more,
                "class",
                "app-stroke",
                "stroke-width",
                1);
    }

    private void drawBearings(Svg svg, double y) {
        double step = step(scale, 62);
        for (double at = Math.ceil(leftDeg / step); at * step <= leftDeg + size.paneWidth / scale; at++) {
            double x = EDGE + (at * step - leftDeg) * scale;
            if (x > EDGE + 12 && x < EDGE + size.paneWidth - 12) {
                String words = degrees((at * step + 720) % 360, step);
                svg.text("text", words, "x", x, "y", y, "font-size", 13, "text-anchor", "middle");
            }
        }
    }

    private void drawAltitudes(Svg svg, double x, double bottomDeg) {
        double step = step(scale, 34);
        for (double at = Math.ceil(bottomDeg / step); at * step <= topDeg; at++) {
            double y = y(at * step);
            if (y > EDGE + 4 && y < EDGE + paneHeight - 4) {
                svg.text("text", degrees(at * step, step), "x", x, "y", y + 4.5, "font-size", 13);
            }
        }
    }

    private static String degrees(double value, double step) {
        return QuantityFormat.decimals(value, step < 1 && value != 0 ? 1 : 0).digits() + "°";
    }

    private void drawLines(Svg svg) {
        double level = y(0);
        line(svg, level, "stroke-dasharray", "5 4");
        svg.text(
                "text",
                "level with the eye",
                "x",
                EDGE + 10,
                "y",
                level - 7,
                "font-size",
                13,
                "class",
                "app-pane__text");
        groundDeg.ifPresent(ground -> {
            line(svg, y(ground), "stroke-linecap", "butt");
            if (y(ground) - level > 20) {
                svg.text(
                        "text",
                        "ground at the site",
                        "x",
                        EDGE + 10,
                        "y",
                        y(ground) + 17,
                        "font-size",
                        13,
                        "class",
                        "app-pane__text");
            }
        });
    }

    private void line(Svg svg, double y, String attribute, String value) {
        String path = "M" + Svg.length(EDGE) + " " + Svg.length(y) + "H" + Svg.length(EDGE + size.paneWidth);
        svg.add("path", "d", path, "class", "app-pane__line", "stroke-width", 1, attribute, value);
    }

    private void drawPoints(Svg svg) {
        svg.open("g", "class", "app-pane__point");
        for (Point point : points) {
            circle(svg, x(point.bearing()), y(point.altitude()), Math.max(SMALLEST_RADIUS, radius(point.lux())));
        }
        svg.close("g");
    }

    private static void circle(Svg svg, double x, double y, double radius) {
        svg.add("circle", "cx", x, "cy", y, "r", Svg.fine(radius));
    }

    private void drawLabel(Svg svg, Label label) {
        double zero = y(points.stream().mapToDouble(Point::altitude).max().orElse(0));
        svg.add(
                "path",
                "d",
                "M" + Svg.length(label.leaderX()) + " " + Svg.length(zero + label.fromY()) + "V"
                        + Svg.length(zero + label.leaderTop()) + label.side().hook,
                "class",
                "app-pane__line",
                "stroke-width",
                1);
        svg.text(
                "text",
                label.words(),
                "x",
                label.textX(),
                "y",
                zero + label.middle() + 4.5,
                "font-size",
                14,
                "text-anchor",
                label.side().anchor,
                "class",
                "app-pane__text");
    }

    private void drawReference(Svg svg) {
        Reference reference = reference();
        boolean wide = size == Size.WIDE;
        double side = Math.max(44, 2 * radius(reference.lux()) + 16);
        double left = wide ? 738 - side / 2 : EDGE;
        double top = wide ? 40 : EDGE + paneHeight + 34;
        double boxed = wide ? side : 44;
        double x = wide ? 738 : left + boxed / 2;
        svg.add("rect", "x", left, "y", top, "width", boxed, "height", boxed, "class", "app-pane");
        svg.open("g", "class", "app-pane__point", "data-reference", reference.name());
        circle(svg, x, top + boxed / 2, radius(reference.lux()));
        svg.close("g");
        if (wide) {
            svg.text("text", reference.name(), "x", x, "y", top + boxed + 18, "font-size", 13, "text-anchor", "middle");
            svg.text(
                    "text",
                    "same scale",
                    "x",
                    x,
                    "y",
                    top + boxed + 34,
                    "font-size",
                    13,
                    "text-anchor",
                    "middle",
                    "class",
                    "app-text--soft");
        } else {
            svg.text(
                    "text",
                    reference.name() + " on the same scale",
                    "x",
                    left + boxed + 12,
                    "y",
                    top + boxed / 2 + 4.5,
                    "font-size",
                    13);
        }
    }
}
