package skytally.project;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import skytally.scene.State;

/**
 * The edge of the site: its corners in turn, in metres from the reference point. No edge crosses or touches another, so
 * it has one inside.
 *
 * @param corners at least three; the last is joined to the first
 */
public record Outline(List<Corner> corners) {

    private static final double FARTHEST_M = 1_000_000;
    private static final double M2_PER_HA = 10_000;

    /** A corner, in metres from the reference point. */
    public record Corner(double eastM, double northM) {

        public Corner {
            if (!(Math.abs(eastM) <= FARTHEST_M && Math.abs(northM) <= FARTHEST_M)) {
                throw new IllegalArgumentException("a corner lies within 1000 km of the reference point");
            }
        }
    }

    public Outline {
        corners = List.copyOf(corners);
    }

    /** What the site's value in use says, if it says anything. */
    public static Optional<Outline> of(Values site) {
        Claim claim = site.get("outline").inUse();
        return claim.state() == State.NOT_KNOWN ? Optional.empty() : Optional.of(read(claim.value(), claim.unit()));
    }

    /**
     * Reads corners typed a line each, east before north.
     *
     * @param unit m or ft
     * @throws IllegalArgumentException with the line and what is wrong with it
     */
    public static Outline read(String text, String unit) {
        double metres = Units.inFirst(BigDecimal.ONE, unit).doubleValue();
        List<Lines.Line<Corner>> lines = Lines.read(text, line -> {
            double[] two = Lines.twoNumbers(line)
                    .orElseThrow(() -> new IllegalArgumentException("write east and north, such as “700 590”"));
            return new Corner(two[0] * metres, two[1] * metres);
        });
        if (lines.size() > 3
                && lines.get(0).thing().equals(lines.get(lines.size() - 1).thing())) {
            lines = lines.subList(0, lines.size() - 1);
        }
        if (lines.size() < 3) {
            throw new IllegalArgumentException(
                    "A site has at least three corners, a line each; there are " + lines.size());
        }
        requireOneInside(lines);
        return new Outline(lines.stream().map(Lines.Line::thing).toList());
    }

    private static void requireOneInside(List<Lines.Line<Corner>> lines) {
        int count = lines.size();
        for (int i = 0; i < count; i++) {
            for (int j = i + 1; j < count; j++) {
                boolean next = j == i + 1 || (i == 0 && j == count - 1);
                boolean wrong = next ? foldsBack(lines, i, j) : meet(lines, i, j);
                if (wrong) {
                    throw new IllegalArgumentException(
                            "The edge from " + edge(lines, j) + " crosses or touches the edge" + " from "
                                    + edge(lines, i) + ". Put the corners in their turn around the site");
                }
            }
        }
    }

    private static String edge(List<Lines.Line<Corner>> lines, int from) {
        return "line " + lines.get(from).number() + " to line "
                + lines.get((from + 1) % lines.size()).number();
    }

    /** Whether of two edges that share a corner one lies on the other. */
    private static boolean foldsBack(List<Lines.Line<Corner>> lines, int i, int j) {
        boolean closing = i == 0 && j == lines.size() - 1 && lines.size() > 2;
        int before = closing ? j : i;
        Corner start = corner(lines, before);
        Corner shared = corner(lines, before + 1);
        Corner end = corner(lines, before + 2);
        double along = (start.eastM - shared.eastM) * (end.eastM - shared.eastM)
                + (start.northM - shared.northM) * (end.northM - shared.northM);
        return turn(start, shared, end) == 0 && !(along < 0);
    }

    private static boolean meet(List<Lines.Line<Corner>> lines, int i, int j) {
        Corner a = corner(lines, i);
        Corner b = corner(lines, i + 1);
        Corner c = corner(lines, j);
        Corner d = corner(lines, j + 1);
        double abc = turn(a, b, c);
        double abd = turn(a, b, d);
        double cda = turn(c, d, a);
        double cdb = turn(c, d, b);
        if (abc * abd < 0 && cda * cdb < 0) {
            return true;
        }
        return (abc == 0 && isBetween(a, b, c))
                || (abd == 0 && isBetween(a, b, d))
                || (cda == 0 && isBetween(c, d, a))
                || (cdb == 0 && isBetween(c, d, b));
    }

    private static Corner corner(List<Lines.Line<Corner>> lines, int index) {
        return lines.get(index % lines.size()).thing();
    }

    /** Twice the area of the triangle, positive where the way turns left. */
    private static double turn(Corner a, Corner b, Corner c) {
        return (b.eastM - a.eastM) * (c.northM - a.northM) - (b.northM - a.northM) * (c.eastM - a.eastM);
    }

    private static boolean isBetween(Corner a, Corner b, Corner on) {
        return Math.min(a.eastM, b.eastM) <= on.eastM
                && on.eastM <= Math.max(a.eastM, b.eastM)
                && Math.min(a.northM, b.northM) <= on.northM
                && on.northM <= Math.max(a.northM, b.northM);
    }

    /** The area within, by the surveyor's formula: half the sum of the cross products around it. */
    public double areaHa() {
        return Math.abs(twiceSignedAreaM2()) / 2 / M2_PER_HA;
    }

    /** The middle of the area within. */
    public Corner centroid() {
        double east = 0;
        double north = 0;
        Corner origin = corners.get(0);
        for (int i = 0; i < corners.size(); i++) {
            Corner here = corners.get(i);
            Corner next = corners.get((i + 1) % corners.size());
            double twice = turn(origin, here, next);
            east += (origin.eastM + here.eastM + next.eastM) / 3 * twice;
            north += (origin.northM + here.northM + next.northM) / 3 * twice;
        }
        return new Corner(east / twiceSignedAreaM2(), north / twiceSignedAreaM2());
    }

    private double twiceSignedAreaM2() {
        double sum = 0;
        for (int i = 0; i < corners.size(); i++) {
            sum += turn(corners.get(0), corners.get(i), corners.get((i + 1) % corners.size()));
        }
        return sum;
    }
}
