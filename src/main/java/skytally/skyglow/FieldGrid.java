package skytally.skyglow;

/**
 * The points around a light at which a field is kept: distances in equal steps of their logarithm, and at each
 * distance some levels from the ground up to the point overhead or to 50 km.
 *
 * <p>The levels crowd toward the ground over 400 m. Near the light they are angles, for there the field looks the
 * same at all distances; far away they are heights.
 */
final class FieldGrid {

    static final double NEAREST_M = 100;
    static final double FURTHEST_M = 700_000;
    static final double TOP_M = 50_000;
    private static final double CROWDING_M = 400;

    private final int distances;
    private final int levels;
    private final double step; // of the logarithm of the distance

    FieldGrid(int distances, int levels) {
        this.distances = distances;
        this.levels = levels;
        this.step = StrictMath.log(FURTHEST_M / NEAREST_M) / (distances - 1);
    }

    int distances() {
        return distances;
    }

    int levels() {
        return levels;
    }

    int points() {
        return distances * levels;
    }

    /** Straight distance of the points of one row from the light, in metres. */
    double distance(int row) {
        return NEAREST_M * StrictMath.exp(step * row);
    }

    /** Height of a point above the ground, in metres; level 0 is the highest, the last is the ground. */
    double height(int row, int level) {
        if (level == levels - 1) {
            return 0;
        }
        double top = Math.min(distance(row), TOP_M);
        double down = level / (levels - 1.0);
        double share = 1 - down * down;
        return CROWDING_M * StrictMath.sinh(share * asinh(top / CROWDING_M));
    }

    /** For x of 0 or more. */
    private static double asinh(double x) {
        return StrictMath.log(x + Math.sqrt(x * x + 1));
    }

    /** The four points around a place, and how much each counts. */
    static final class Cell {
        int row;
        int level;
        double beyond; // share of the way to the next row
        double below; // share of the way to the next level down
    }

    /** Finds the cell; a place outside the grid is taken to its edge. */
    void find(double distance, double height, Cell cell) {
        double place = StrictMath.log(Math.min(Math.max(distance, NEAREST_M), FURTHEST_M) / NEAREST_M) / step;
        cell.row = Math.min((int) place, distances - 2);
        cell.beyond = place - cell.row;
        double top = Math.min(distance, TOP_M);
        double share = height <= 0 ? 0 : Math.min(asinh(height / CROWDING_M) / asinh(top / CROWDING_M), 1);
        double down = Math.sqrt(1 - share) * (levels - 1);
        cell.level = Math.min((int) down, levels - 2);
        cell.below = down - cell.level;
    }
}
