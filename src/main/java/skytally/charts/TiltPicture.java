package skytally.charts;

import skytally.geometry.Attitude;
import skytally.geometry.Direction;
import skytally.geometry.Rotation;
import skytally.luminaire.IntensityDistribution;

/**
 * A fitting from the side, as it hangs: the level, its axis, and how strongly it shines every way in the upright plane of
 * its bearing. The length of a line from the fitting to the edge of the figure is the intensity that way, the longest
 * being the strongest in that plane. What goes above the level is in the second ink.
 */
public final class TiltPicture {

    private static final double WIDTH = 340;
    private static final double X = WIDTH / 2;
    private static final double MARGIN = 10;
    private static final double STRONGEST = 116;
    private static final double AXIS = 130;
    private static final double TURN = 34; // radius of the arc that shows the tilt
    private static final double STEP_DEG = 0.5;
    private static final double INWARD_DEG = 1e-6; // what ends at the level ends on its own side of it
    private static final double SEEN = 0.1;
    private static final double SIZE = 14;

    private final String id;
    private final IntensityDistribution light;
    private final double tiltDeg;
    private final Rotation hang;
    private final String title;
    private final String description;
    private final Words words;
    private final double strongest;
    private final double levelY;
    private final double height;

    /**
     * What stands on the picture.
     *
     * @param level   on the broken line
     * @param tilt    at the arc, such as "64°"; empty for a fitting that hangs straight down
     * @param ahead   under the side it is tilted toward
     */
    public record Words(String level, String tilt, String ahead) {}

    /**
     * @param id          begins the ids of its title and description
     * @param title       of the picture
     * @param description the picture in words
     */
    public TiltPicture(
            String id,
            IntensityDistribution light,
            double tiltDeg,
            double rollDeg,
            String title,
            String description,
            Words words) {
        this.id = id;
        this.light = light;
        this.tiltDeg = tiltDeg;
        this.hang = new Attitude(0, tiltDeg, rollDeg).rotation();
        this.title = title;
        this.description = description;
        this.words = words;
        this.strongest = strongest();
        double highest = 26; // the word on the level line
        double lowest = 40; // the side it faces, and the arc
        for (double altitude = 0; altitude < 360; altitude += STEP_DEG) {
            double rise = length(altitude) * Math.sin(Math.toRadians(altitude));
            highest = Math.max(highest, rise);
            lowest = Math.max(lowest, -rise);
        }
        double axisDrop = AXIS * Math.cos(Math.toRadians(tiltDeg));
        this.levelY = MARGIN + Math.max(highest, -axisDrop);
        this.height = levelY + MARGIN + Math.max(lowest, axisDrop);
    }

    /** The picture as an SVG element. */
    public String svg() {
        Svg svg = new Svg();
        svg.open(
                "svg",
                "class",
                "app-tilt",
                "viewBox",
                "0 0 " + Svg.length(WIDTH) + " " + Svg.length(height),
                "role",
                "img",
                "aria-labelledby",
                id + "-title " + id + "-says");
        svg.text("title", title, "id", id + "-title");
        svg.text("desc", description, "id", id + "-says");
        drawLobe(svg, "app-tilt__down", lobe(180, 360));
        drawLobe(svg, "app-tilt__up", lobe(0, 180));
        svg.add("line", "class", "app-tilt__level", "x1", 8.0, "x2", WIDTH - 8, "y1", levelY, "y2", levelY);
        write(svg, words.level(), 8, levelY - 6, "start", "app-text--soft app-halo");
        double beside = tiltDeg < 90 ? levelY - 6 : levelY + 16; // away from the axis
        write(svg, words.ahead(), WIDTH - 8, beside, "end", "app-text--soft app-halo");
        drawAxis(svg);
        return svg.close("svg").toString();
    }

    private static void drawLobe(Svg svg, String ink, String path) {
        if (!path.isEmpty()) {
            svg.add("path", "class", ink, "d", path);
        }
    }

    private void drawAxis(Svg svg) {
        double turn = Math.toRadians(tiltDeg);
        double across = Math.sin(turn);
        double down = Math.cos(turn);
        svg.add("line", "class", "app-tilt__plumb", "x1", X, "x2", X, "y1", levelY, "y2", height - MARGIN);
        if (tiltDeg != 0) {
            svg.add(
                    "line",
                    "class",
                    "app-tilt__axis",
                    "x1",
                    X,
                    "x2",
                    X + AXIS * across,
                    "y1",
                    levelY,
                    "y2",
                    levelY + AXIS * down);
        }
        svg.add(
                "line",
                "class",
                "app-tilt__face",
                "x1",
                X - 9 * down,
                "x2",
                X + 9 * down,
                "y1",
                levelY + 9 * across,
                "y2",
                levelY - 9 * across);
        if (!words.tilt().isEmpty()) {
            svg.add(
                    "path",
                    "class",
                    "app-tilt__turn",
                    "d",
                    "M" + point(X, levelY + TURN) + "A" + point(TURN, TURN) + " 0 0 0 "
                            + point(X + TURN * across, levelY + TURN * down));
            double middle = turn / 2;
            double x = X + (TURN + 8) * Math.sin(middle);
            double y = levelY + (TURN + 8) * Math.cos(middle) + 8;
            write(svg, words.tilt(), x, y, "start", "app-text--strong app-halo");
        }
    }

    private static void write(Svg svg, String text, double x, double y, String anchor, String ink) {
        if (!text.isEmpty()) {
            svg.text("text", text, "x", x, "y", y, "text-anchor", anchor, "class", ink, "font-size", SIZE);
        }
    }

    /** Intensity a lumen toward an altitude, 0 level ahead, 90 straight up, 180 level behind. */
    private double toward(double altitudeDeg) {
        double altitude = Math.toRadians(altitudeDeg);
        Direction own = hang.turnBack(Direction.of(0, Math.cos(altitude), Math.sin(altitude)));
        return light.perLumen(own.x(), own.y(), own.z());
    }

    private double strongest() {
        double most = 0;
        for (double altitude = 0; altitude < 360; altitude += STEP_DEG) {
            most = Math.max(most, toward(altitude));
        }
        return most;
    }

    private double length(double altitudeDeg) {
        return strongest > 0 ? STRONGEST * toward(altitudeDeg) / strongest : 0;
    }

    /** The part of the figure between two altitudes; empty where nothing of it would be seen. */
    private String lobe(double fromDeg, double toDeg) {
        StringBuilder path = new StringBuilder("M" + point(X, levelY));
        double longest = 0;
        for (double altitude = fromDeg; altitude <= toDeg; altitude += STEP_DEG) {
            double inside = Math.min(toDeg - INWARD_DEG, Math.max(fromDeg + INWARD_DEG, altitude));
            double length = length(inside);
            double angle = Math.toRadians(inside);
            longest = Math.max(longest, length);
            path.append('L').append(point(X + length * Math.cos(angle), levelY - length * Math.sin(angle)));
        }
        return longest < SEEN ? "" : path.append('Z').toString();
    }

    private static String point(double x, double y) {
        return Svg.length(x) + " " + Svg.length(y);
    }
}
