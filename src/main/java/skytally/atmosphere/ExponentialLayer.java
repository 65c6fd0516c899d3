package skytally.atmosphere;

/**
 * How much of a layer that thins out exponentially with height lies on a straight path over a round Earth, as a
 * multiple of what lies overhead from the ground up.
 *
 * <p>With c = (1 − µ²) / 2(R + h), a = √(c/H), b = µ / 2aH and E(x) = exp(x²) erfc(x), a path that climbs all the way
 * holds
 * <pre>
 *   F = √π / 2aH · [ exp(−h₁/H) E(b₁) − exp(−h₂/H) E(b₂) ]
 * </pre>
 * and one through a lowest point is the sum of two climbs. Exact to second order in the Earth's curve; the fit of E
 * is good to 1.8e-7.
 */
public final class ExponentialLayer {

    private static final double SQRT_PI = Math.sqrt(Math.PI);
    /** Below this the path counts as vertical; the curve then has no part in it. */
    private static final double LEAST_SINE_SQUARED = 1e-7;
    /** exp of this is still a number, and a path that deep lets nothing through. */
    private static final double DEEPEST_EXPONENT = 60;

    private ExponentialLayer() {}

    /**
     * @param earthRadiusM  radius of the (effective) Earth
     * @param scaleHeightM  height over which the layer thins out by a factor e
     * @param fromHeightM   height of the path's beginning above the layer's ground
     * @param zenithCosine  cosine of the angle between the path and the vertical at its beginning
     * @param lengthM       length of the path, 0 or more
     */
    public static double on(
            double earthRadiusM, double scaleHeightM, double fromHeightM, double zenithCosine, double lengthM) {
        double c = Math.max(1 - zenithCosine * zenithCosine, LEAST_SINE_SQUARED) / (2 * (earthRadiusM + fromHeightM));
        double a = Math.sqrt(c / scaleHeightM);
        double from = zenithCosine / (2 * a * scaleHeightM);
        double to = from + a * lengthM;
        double toHeightM = fromHeightM + lengthM * (zenithCosine + c * lengthM);
        double scale = SQRT_PI / (2 * a * scaleHeightM);
        double thinFrom = Math.exp(-fromHeightM / scaleHeightM);
        double thinTo = Math.exp(-toHeightM / scaleHeightM);
        if (from >= 0) {
            return scale * (thinFrom * scaledErfc(from) - thinTo * scaledErfc(to));
        }
        if (to <= 0) {
            return scale * (thinTo * scaledErfc(-to) - thinFrom * scaledErfc(-from));
        }
        double lowest = 2 * thinFrom * Math.exp(Math.min(from * from, DEEPEST_EXPONENT));
        return scale * (lowest - thinFrom * scaledErfc(-from) - thinTo * scaledErfc(to));
    }

    /** exp(x²) erfc(x) for x of 0 or more; a fit made for this project, relative error at most 1.8e-7. */
    static double scaledErfc(double x) {
        double t = 2.5 / (2.5 + x);
        double sum = 0.04955038582;
        sum = sum * t - 0.1801198054;
        sum = sum * t + 0.1646831396;
        sum = sum * t - 0.001993875049;
        sum = sum * t + 0.1397960519;
        sum = sum * t + 0.1689414832;
        sum = sum * t + 0.2077951308;
        sum = sum * t + 0.2256717354;
        sum = sum * t + 0.2256758464;
        return sum * t;
    }
}
