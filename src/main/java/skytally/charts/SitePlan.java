package skytally.charts;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import skytally.notation.QuantityFormat;

/**
 * A plain plan, north up: rings of distance about the reference point, the outline of the site, lights as dots with a
 * tick along their bearing, places as triangles with their marks, and a border counted in blocks of even length.
 *
 * <p>Lights of the proposal are filled dots, existing ones hollow. Where many fall together at the scale of the
 * drawing, one stands for them, so that a plan of any number of lights stays small.
 */
public final class SitePlan {

    /** More marks than this are gathered. */
    private static final int MOST_MARKS = 2000;

    private static final double EDGE = 30;
    private static final double BORDER = 6;
    private static final double TICK = 11;
    private static final double BEARING_STEP_DEG = 15;
    private static final double FONT = 13;
    private static final double LETTER = 0.56 * FONT;
    private static final double LEAST_HEIGHT = 0.5;
    private static final double MOST_HEIGHT = 1.0;
    private static final double PADDING = 0.07;
    private static final double LEAST_FRAME_M = 20;
    private static final double RINGS = 9;
    private static final double BLOCKS = 16;

    /** A point of the ground, in metres from the reference point. */
    public record Point(double eastM, double northM) {}

    /**
     * A light of the plan.
     *
     * @param at         where it hangs
     * @param bearingDeg of its street side, clockwise from true north, or nothing for one without
     * @param existing   whether it is there already
     */
    public record Light(Point at, @Nullable Double bearingDeg, boolean existing) {}

    /** A place people look from. */
    public record Place(String mark, Point at) {}

    /** What distances are written in. */
    public enum Unit {
        METRES(1, "m", 1000, "km"),
        FEET(0.3048, "ft", 1609.344, "mi");

        private final double shortM;
        private final String shortName;
        private final double longM;
        private final String longName;

        Unit(double shortM, String shortName, double longM, String longName) {
            this.shortM = shortM;
            this.shortName = shortName;
            this.longM = longM;
            this.longName = longName;
        }

        private boolean isLong(double extentM) {
            return extentM > 3 * longM;
        }
    }

    /** The ground a plan shows. */
    public record Frame(double westM, double eastM, double southM, double northM) {

        /** Around all of the points, with some ground beside them. */
        public static Frame around(List<Point> points) {
            double west = points.stream().mapToDouble(Point::eastM).min().orElse(0);
            double east = points.stream().mapToDouble(Point::eastM).max().orElse(0);
            double south = points.stream().mapToDouble(Point::northM).min().orElse(0);
            double north = points.stream().mapToDouble(Point::northM).max().orElse(0);
            double least = Math.max(LEAST_FRAME_M, Math.max(east - west, north - south));
            double beside = least * PADDING;
            double wider = Math.max(0, least - (east - west)) / 4;
            return new Frame(west - beside - wider, east + beside + wider, south - beside, north + beside).shaped();
        }

        /** Grown where it is too flat or too tall to draw. */
        private Frame shaped() {
            double ratio = heightM() / widthM();
            double taller = Math.max(0, LEAST_HEIGHT * widthM() - heightM()) / 2;
            double wider = ratio > MOST_HEIGHT ? (heightM() / MOST_HEIGHT - widthM()) / 2 : 0;
            return new Frame(westM - wider, eastM + wider, southM - taller, northM + taller);
        }

        public boolean holds(Point point) {
            return point.eastM() >= westM
                    && point.eastM() <= eastM
                    && point.northM() >= southM
                    && point.northM() <= northM;
        }

        double widthM() {
            return eastM - westM;
        }

        double heightM() {
            return northM - southM;
        }

        /** How far the point of it that is nearest to the reference point lies. */
        double nearestM() {
            return Math.hypot(Math.max(0, Math.max(westM, -eastM)), Math.max(0, Math.max(southM, -northM)));
        }

        /** How far the point of it that is farthest from the reference point lies. */
        double farthestM() {
            return Math.hypot(Math.max(-westM, eastM), Math.max(-southM, northM));
        }
    }

    private record Box(double left, double top, double right, double bottom) {

        boolean touches(Box other) {
            return left < other.right && other.left < right && top < other.bottom && other.top < bottom;
        }
    }

    private final Frame frame;
    private final Unit unit;
    private final List<Point> outline;
    private final List<Light> lights;
    private final List<Place> places;
    private final @Nullable Frame inset;

    /**
     * @param frame   the ground it shows
     * @param unit    of its distances
     * @param outline corners of the site, or none
     * @param inset   ground that has a plan of its own: drawn as a rectangle, its places without their marks; or nothing
     */
    public SitePlan(
            Frame frame,
            Unit unit,
            List<Point> outline,
            List<Light> lights,
            List<Place> places,
            @Nullable Frame inset) {
        this.frame = frame;
        this.unit = unit;
        this.outline = List.copyOf(outline);
        this.lights = List.copyOf(lights);
        this.places = List.copyOf(places);
        this.inset = inset;
    }

    /** Between two rings. */
    public String ringStep() {
        return written(ringStepM());
    }

    /** The length of a block of the border. */
    public String blockLength() {
        return written(blockM());
    }

    private double ringStepM() {
        return even(Math.hypot(frame.widthM(), frame.heightM()) / RINGS);
    }

    /** The rings that cross the ground shown, which may lie far from the reference point. */
    private List<Double> ringsM() {
        List<Double> rings = new ArrayList<>();
        double step = ringStepM();
        for (long i = Math.max(1, (long) Math.ceil(frame.nearestM() / step)); i * step <= frame.farthestM(); i++) {
            rings.add(i * step);
        }
        return rings;
    }

    private double blockM() {
        return even(frame.widthM() / BLOCKS);
    }

    /** The least of 1, 2, 5, 10 and so on in the unit that is no shorter. */
    private double even(double leastM) {
        double one = unit.isLong(frame.widthM()) ? unit.longM : unit.shortM;
        double least = leastM / one;
        double power = Math.pow(10, Math.floor(Math.log10(least)));
        double digit = Stream.of(1.0, 2.0, 5.0, 10.0)
                .filter(step -> step * power >= least * (1 - 1e-9))
                .findFirst()
                .orElse(10.0);
        return digit * power * one;
    }

    private String written(double metres) {
        boolean isLong = unit.isLong(frame.widthM());
        double count = metres / (isLong ? unit.longM : unit.shortM);
        return QuantityFormat.asTyped(new BigDecimal(count).round(new MathContext(6)))
                        .plain()
                + "\u00a0" + (isLong ? unit.longName : unit.shortName);
    }

    /**
     * The picture as one SVG element.
     *
     * @param id          unique on the page
     * @param title       of the picture
     * @param description in a sentence or two
     * @param width       of the ground, in CSS pixels
     */
    public String svg(String id, String title, String description, double width) {
        return new Drawing(id, width).drawn(title, description);
    }

    /** One drawing, at one width. */
    private final class Drawing {

        private final Svg svg = new Svg();
        private final String id;
        private final double width;
        private final double height;
        private final double perMetre;
        private final List<Box> taken = new ArrayList<>();

        Drawing(String id, double width) {
            this.id = id;
            this.width = width;
            this.perMetre = width / frame.widthM();
            this.height = frame.heightM() * perMetre;
        }

        String drawn(String title, String description) {
            double wide = width + 2 * EDGE;
            double high = height + 2 * EDGE;
            svg.open(
                    "svg",
                    "class",
                    "app-plan",
                    "viewBox",
                    "0 0 " + Svg.length(wide) + " " + Svg.length(high),
                    "width",
                    wide,
                    "height",
                    high,
                    "role",
                    "img",
                    "aria-labelledby",
                    id + "-title " + id + "-says");
            svg.text("title", title, "id", id + "-title");
            svg.text("desc", description, "id", id + "-says");
            ground();
            List<Place> marked = places.stream()
                    .filter(place -> frame.holds(place.at()) && !(inset != null && inset.holds(place.at())))
                    .toList();
            marked.forEach(place -> taken.add(around(x(place.at()), y(place.at()), 7)));
            marked.forEach(this::mark);
            ringNumbers();
            border();
            letters();
            return svg.close("svg").toString();
        }

        private double x(Point point) {
            return EDGE + (point.eastM() - frame.westM()) * perMetre;
        }

        private double y(Point point) {
            return EDGE + (frame.northM() - point.northM()) * perMetre;
        }

        /** What is cut off at the border. */
        private void ground() {
            svg.open("clipPath", "id", id + "-ground")
                    .add("rect", "x", EDGE, "y", EDGE, "width", width, "height", height)
                    .close("clipPath");
            svg.open("g", "clip-path", "url(#" + id + "-ground)");
            Point reference = new Point(0, 0);
            for (double radius : ringsM()) {
                svg.add(
                        "circle",
                        "cx",
                        x(reference),
                        "cy",
                        y(reference),
                        "r",
                        radius * perMetre,
                        "class",
                        "app-plan__ring");
            }
            svg.add(
                    "path",
                    "d",
                    "M" + at(x(reference) - 6, y(reference)) + "h12M" + at(x(reference), y(reference) - 6) + "v12",
                    "class",
                    "app-stroke",
                    "stroke-width",
                    1);
            outline();
            lights(true);
            lights(false);
            if (inset != null) {
                inset(inset);
            }
            for (Place place : places) {
                if (frame.holds(place.at())) {
                    svg.add(
                            "path",
                            "d",
                            "M" + at(x(place.at()), y(place.at()) - 6.5) + "l5.6 9.7h-11.2z",
                            "class",
                            "app-plan__place");
                }
            }
            svg.close("g");
        }

        private void outline() {
            if (outline.size() > 1) {
                StringBuilder path = new StringBuilder();
                outline.forEach(
                        corner -> path.append(path.isEmpty() ? 'M' : 'L').append(at(x(corner), y(corner))));
                svg.add("path", "d", path.append('z'), "class", "app-plan__outline");
            }
        }

        private void inset(Frame near) {
            Point corner = new Point(near.westM(), near.northM());
            double wide = Math.max(9, near.widthM() * perMetre);
            double high = Math.max(9, near.heightM() * perMetre);
            svg.add(
                    "rect",
                    "x",
                    x(corner) - (wide - near.widthM() * perMetre) / 2,
                    "y",
                    y(corner) - (high - near.heightM() * perMetre) / 2,
                    "width",
                    wide,
                    "height",
                    high,
                    "class",
                    "app-plan__inset");
        }

        /** All lights of one kind as two paths: their dots, and their ticks. */
        private void lights(boolean existing) {
            StringBuilder dots = new StringBuilder();
            StringBuilder ticks = new StringBuilder();
            for (Light light : gathered(existing)) {
                String at = at(x(light.at()), y(light.at()));
                dots.append('M').append(at).append("h0");
                Double bearing = light.bearingDeg();
                if (bearing != null) {
                    double turned = StrictMath.toRadians(bearing);
                    ticks.append('M')
                            .append(at)
                            .append('l')
                            .append(at(TICK * StrictMath.sin(turned), -TICK * StrictMath.cos(turned)));
                }
            }
            if (dots.isEmpty()) {
                return;
            }
            String kind = existing ? "existing" : "proposed";
            svg.add("path", "d", ticks, "class", "app-plan__tick app-plan__tick--" + kind);
            svg.add("path", "d", dots, "class", "app-plan__light app-plan__light--" + kind);
            if (existing) {
                svg.add("path", "d", dots, "class", "app-plan__light app-plan__light--hole");
            }
        }

        /** One light for all that fall together and point the same way, in cells as small as the number allows. */
        private List<Light> gathered(boolean existing) {
            List<Light> found = lights.stream()
                    .filter(light -> light.existing() == existing)
                    .toList();
            for (double cell = 1; ; cell *= 2) {
                Map<List<Long>, Light> cells = new LinkedHashMap<>();
                for (Light light : found) {
                    cells.putIfAbsent(cell(light, cell), light);
                }
                if (cells.size() <= MOST_MARKS) {
                    return List.copyOf(cells.values());
                }
            }
        }

        private List<Long> cell(Light light, double cell) {
            Double bearing = light.bearingDeg();
            return List.of(
                    Math.round(x(light.at()) / cell),
                    Math.round(y(light.at()) / cell),
                    bearing == null ? -1 : Math.round(bearing / BEARING_STEP_DEG));
        }

        private void mark(Place place) {
            double wide = place.mark().length() * LETTER + 2;
            double x = x(place.at());
            double y = y(place.at());
            List<Box> ways = List.of(
                    new Box(x + 8, y - 8, x + 8 + wide, y + 8),
                    new Box(x - 8 - wide, y - 8, x - 8, y + 8),
                    new Box(x - wide / 2, y - 24, x + wide / 2, y - 8),
                    new Box(x - wide / 2, y + 8, x + wide / 2, y + 24));
            Box free = ways.stream().filter(this::isFree).findFirst().orElse(ways.get(0));
            taken.add(free);
            svg.text(
                    "text",
                    place.mark(),
                    "x",
                    free.left() + 1,
                    "y",
                    free.bottom() - 3.5,
                    "font-size",
                    (int) FONT,
                    "class",
                    "app-halo app-text--strong");
        }

        private void ringNumbers() {
            for (double radius : ringsM()) {
                String number = written(radius);
                double wide = number.length() * LETTER;
                for (int bearing = 180; bearing < 540; bearing += 15) {
                    double turned = Math.toRadians(bearing);
                    Point on = new Point(radius * Math.sin(turned), radius * Math.cos(turned));
                    Box box = new Box(x(on) - wide / 2, y(on) - 9, x(on) + wide / 2, y(on) + 9);
                    if (isFree(box)) {
                        taken.add(box);
                        svg.text(
                                "text",
                                number,
                                "x",
                                x(on),
                                "y",
                                y(on) + 4.5,
                                "font-size",
                                (int) FONT,
                                "text-anchor",
                                "middle",
                                "class",
                                "app-halo app-text--soft");
                        break;
                    }
                }
            }
        }

        private boolean isFree(Box box) {
            return box.left() > EDGE + 2
                    && box.right() < EDGE + width - 2
                    && box.top() > EDGE + 2
                    && box.bottom() < EDGE + height - 2
                    && taken.stream().noneMatch(box::touches);
        }

        private Box around(double x, double y, double half) {
            return new Box(x - half, y - half, x + half, y + half);
        }

        private void border() {
            StringBuilder filled = new StringBuilder();
            double block = blockM();
            for (long i = (long) Math.floor(frame.westM() / block); i * block < frame.eastM(); i++) {
                if (i % 2 == 0) {
                    double left = x(new Point(Math.max(frame.westM(), i * block), 0));
                    double right = x(new Point(Math.min(frame.eastM(), (i + 1) * block), 0));
                    block(filled, left, EDGE - BORDER, right - left, BORDER);
                    block(filled, left, EDGE + height, right - left, BORDER);
                }
            }
            for (long i = (long) Math.floor(frame.southM() / block); i * block < frame.northM(); i++) {
                if (i % 2 == 0) {
                    double top = y(new Point(0, Math.min(frame.northM(), (i + 1) * block)));
                    double bottom = y(new Point(0, Math.max(frame.southM(), i * block)));
                    block(filled, EDGE - BORDER, top, BORDER, bottom - top);
                    block(filled, EDGE + width, top, BORDER, bottom - top);
                }
            }
            svg.add("path", "d", filled, "class", "app-ink");
            for (double out : new double[] {0, BORDER}) {
                svg.add(
                        "rect",
                        "x",
                        EDGE - out,
                        "y",
                        EDGE - out,
                        "width",
                        width + 2 * out,
                        "height",
                        height + 2 * out,
                        "class",
                        "app-stroke",
                        "stroke-width",
                        1);
            }
        }

        private static void block(StringBuilder path, double left, double top, double wide, double high) {
            path.append('M')
                    .append(at(left, top))
                    .append('h')
                    .append(Svg.length(wide))
                    .append('v')
                    .append(Svg.length(high))
                    .append('h')
                    .append(Svg.length(-wide))
                    .append('z');
        }

        private void letters() {
            double middleX = EDGE + width / 2;
            double middleY = EDGE + height / 2 + 5;
            letter("N", middleX, 16, "app-text--strong");
            letter("S", middleX, EDGE + height + 23, "app-text--soft");
            letter("W", 12, middleY, "app-text--soft");
            letter("E", EDGE + width + 18, middleY, "app-text--soft");
            svg.add("path", "d", "M" + at(middleX + 11, 16) + "l5-12l5 12l-5-3z", "class", "app-ink");
        }

        private void letter(String letter, double x, double y, String kind) {
            svg.text("text", letter, "x", x, "y", y, "font-size", 15, "text-anchor", "middle", "class", kind);
        }

        private static String at(double x, double y) {
            return Svg.length(x) + " " + Svg.length(y);
        }
    }
}
