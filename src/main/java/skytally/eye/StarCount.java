package skytally.eye;

import skytally.citation.Bibliography;
import skytally.citation.Citation;
import skytally.photometry.Magnitude;

/**
 * How many stars there are down to a magnitude, V. From 1 to 8 a fit to counts of catalogues,
 * <pre>
 *   log10 N = 0.59293 + 0.56138 m − 0.0072122 m²
 * </pre>
 * within 15 % of them, the worst at the bright end; down to −1 the counts themselves, straight in log N between.
 */
public final class StarCount {

    /** How far the fit may be off, as a share. */
    public static final double WORST_ERROR = 0.15;

    private static final double BRIGHTEST = -1;
    private static final double FAINTEST = 8;
    private static final double FIT_FROM = 1;

    /** Stars to V −1, −0.5, 0, 0.5 and 1. */
    private static final double[] COUNTED = {1, 2, 4, 10, 15};

    private static final double COUNTED_STEP = 0.5;

    /** Share of the stars above the horizon that extinction of 0.2 mag per air mass leaves in sight. */
    private static final double LEFT_BY_EXTINCTION = 0.66;

    private StarCount() {}

    /** True for a limit that can be counted, −1 to 8. */
    public static boolean covers(Magnitude limit) {
        return limit.value() >= BRIGHTEST && limit.value() <= FAINTEST;
    }

    /**
     * On the whole sphere, without extinction.
     *
     * @param limit V of the faintest star counted, −1 to 8
     * @throws IllegalArgumentException outside; the message names the range
     */
    public static double wholeSky(Magnitude limit) {
        double m = limit.value();
        if (!covers(limit)) {
            throw new IllegalArgumentException("Stars are counted from magnitude −1 to 8, not to " + m);
        }
        return m <= FIT_FROM ? counted(m) : Math.max(COUNTED[COUNTED.length - 1], fitted(m));
    }

    /**
     * Above the horizon at one moment, by a rule of thumb: half of the sphere, two thirds of it left by the air. Within
     * 20 % of counts with extinction 0.2 at any latitude; a glow on the horizon takes more.
     *
     * @param zenithLimit catalogue magnitude of the faintest star seen overhead, −1 to 8
     */
    public static double aboveHorizonByRuleOfThumb(Magnitude zenithLimit) {
        return wholeSky(zenithLimit) / 2 * LEFT_BY_EXTINCTION;
    }

    private static double fitted(double m) {
        return StrictMath.pow(10, 0.59293 + 0.56138 * m - 0.0072122 * m * m);
    }

    private static double counted(double m) {
        double steps = (m - BRIGHTEST) / COUNTED_STEP;
        int below = Math.min((int) steps, COUNTED.length - 2);
        return COUNTED[below] * StrictMath.pow(COUNTED[below + 1] / COUNTED[below], steps - below);
    }

    public static Citation citation() {
        return Bibliography.cite("star-counts");
    }
}
