package skytally.assessment;

/**
 * An upright plane in the light of all lamps together.
 *
 * @param facingDeg      bearing of its outward normal, a whole number of degrees
 * @param illuminanceLx on it, with nothing taken by the air
 */
public record UprightPlane(int facingDeg, double illuminanceLx) {

    private static final int FACINGS = 360;

    /**
     * Finds the brightest plane. A plane gets light from the half circle before it, so the light of each degree of
     * bearing, added up as a vector, gives all 360 planes without looking at a lamp twice.
     */
    static final class Search {

        private final double[] east = new double[FACINGS];
        private final double[] north = new double[FACINGS];

        /** Takes up the level part of one lamp's light, a vector from the eye toward the lamp, in lux. */
        void add(double eastLx, double northLx) {
            double bearing = StrictMath.toDegrees(StrictMath.atan2(eastLx, northLx));
            int degree = Math.floorMod((int) Math.floor(bearing), FACINGS);
            east[degree] += eastLx;
            north[degree] += northLx;
        }

        UprightPlane found() {
            int best = 0;
            double most = -1;
            for (int facing = 0; facing < FACINGS; facing++) {
                double lux = on(facing);
                if (lux > most) {
                    best = facing;
                    most = lux;
                }
            }
            return new UprightPlane(best, most);
        }

        /** A bearing of 90° to either side adds nothing, so the half circle may begin with a whole degree. */
        private double on(int facing) {
            double sumEast = 0;
            double sumNorth = 0;
            for (int offset = -90; offset < 90; offset++) {
                int degree = Math.floorMod(facing + offset, FACINGS);
                sumEast += east[degree];
                sumNorth += north[degree];
            }
            double bearing = StrictMath.toRadians(facing);
            return Math.max(0, sumEast * StrictMath.sin(bearing) + sumNorth * StrictMath.cos(bearing));
        }
    }
}
