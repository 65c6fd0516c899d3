package skytally.skyglow;

/**
 * The shapes every upward emission is put together from where azimuth does not matter: nine hats over the zenith
 * angle, each 1 at its own angle and falling in a straight line to 0 at its neighbours'. They crowd toward the level,
 * where light goes far.
 */
final class ZenithHats {

    private static final double[] PEAK_DEG = {0, 20, 38, 53, 65, 74, 81, 86, 90};

    static final int COUNT = PEAK_DEG.length;

    private static final double[] PEAK = new double[COUNT];

    static {
        for (int i = 0; i < COUNT; i++) {
            PEAK[i] = StrictMath.toRadians(PEAK_DEG[i]);
        }
    }

    private ZenithHats() {}

    /** Zenith angle at which a hat is 1, in radians. */
    static double peak(int hat) {
        return PEAK[hat];
    }

    /** The first of the two hats that are not 0 at a zenith angle of 0 to π/2. */
    static int lower(double zenithAngle) {
        int hat = 0;
        while (hat < COUNT - 2 && zenithAngle > PEAK[hat + 1]) {
            hat++;
        }
        return hat;
    }

    /** What the hat after {@code lower} is at a zenith angle; the lower one is the rest to 1. */
    static double share(int lower, double zenithAngle) {
        return (zenithAngle - PEAK[lower]) / (PEAK[lower + 1] - PEAK[lower]);
    }
}
