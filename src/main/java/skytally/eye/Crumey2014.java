package skytally.eye;

/**
 * The threshold formulas of Crumey (2014), as printed: illuminance at the eye, in lux, of the faintest point seen half of
 * the time on an even background of B cd/m². Nothing clamped, field factor 1.
 *
 * @see "Crumey, A. (2014), Human contrast threshold and astronomical visibility, MNRAS 442, 2600; equation numbers from it"
 */
final class Crumey2014 {

    private static final double A1 = 5.949e-8;
    private static final double A2 = -2.389e-7;
    private static final double A3 = 2.459e-7;
    private static final double A4 = 4.120e-4;
    private static final double A5 = -4.225e-4;

    private static final double R1 = 6.505e-4;
    private static final double R2 = -8.461e-4;
    private static final double R3 = 1.772e-4;
    private static final double R4 = 7.167e-5;

    private static final double K1 = 7.633e-3;
    private static final double K2 = -7.174e-3;

    private Crumey2014() {}

    /** Eq. 34, all backgrounds: {@code (√(a1 B^½ + a2 B^¾ + a3 B) + a4 B^¼ + a5 B^½)²}. */
    static double eq34Lx(double backgroundCdM2) {
        double half = Math.sqrt(backgroundCdM2);
        double quarter = Math.sqrt(half);
        double root = Math.sqrt(A1 * half + A2 * half * quarter + A3 * backgroundCdM2);
        double sum = root + A4 * quarter + A5 * half;
        return sum * sum;
    }

    /** Eq. 53, dark-adapted, up to 0.0708 cd/m²: {@code (r1 B^¼ + r2 B^½)²}. */
    static double eq53Lx(double backgroundCdM2) {
        return squareOfSum(R1, R2, backgroundCdM2);
    }

    /** Eq. 33, by day vision, from 0.0708 cd/m² on: {@code (r3 B^¼ + r4 B^½)²}. */
    static double eq33Lx(double backgroundCdM2) {
        return squareOfSum(R3, R4, backgroundCdM2);
    }

    private static double squareOfSum(double first, double second, double backgroundCdM2) {
        double half = Math.sqrt(backgroundCdM2);
        double sum = first * Math.sqrt(half) + second * half;
        return sum * sum;
    }

    /** Eq. 56, dark-adapted, a sharp-edged patch without end: {@code k1 B^¾ + k2 B}, cd/m² over the background. */
    static double eq56CdM2(double backgroundCdM2) {
        double half = Math.sqrt(backgroundCdM2);
        return K1 * half * Math.sqrt(half) + K2 * backgroundCdM2;
    }
}
