package skytally.atmosphere;

/**
 * How much of a layer that thins out exponentially with height lies on a straight path over a round Earth, as a
 * multiple of what lies overhead from the ground up.
 *
 * <p>With r = R + h₁, c = (1 − µ²) / 2r · (1 − ¾ µL/r), a = √(c/H), b₁ = µ / 2aH, b₂ = b₁ + aL and
 * E(x) = exp(x²) erfc(x), a path that climbs all the way holds
 * <pre>
 *   F = √π / 2aH · [ exp(−h₁/H) E(b₁) − exp(−h₂/H) E(b₂) ]
 * </pre>
 * and one through a lowest point is the sum of two climbs. Exact to second order in the Earth's curve, the last
 * factor of c standing for most of the third: within 2e-4 on paths of 100 km along the ground, and
 * 1e-3 on 300 km reckoned from the lower end.
 *
 * <p>Where both ends lie within a tenth of H in height and the path sags by less than x = cL²/4H = 0.005 below the
 * straight slope between them, the two terms would nearly cancel. There Simpson's rule on the slope, with the sag's
 * part added in closed form, is quicker and good to 1e-6:
 * <pre>
 *   F = L/H · [ (t₁ + t₂)/6 + m (2/3 + 2x/3 + 4x²/15) ]        t = exp(−h/H), m = √(t₁ t₂)
 * </pre>
 */
public final class ExponentialLayer {

    private static final double SQRT_PI = Math.sqrt(Math.PI);
    /** Below this the path counts as vertical; the curve then has no part in it. */
    private static final double LEAST_SINE_SQUARED = 1e-7;
    /** exp of this is still a number, and a path that deep lets nothing through. */
    private static final double DEEPEST_EXPONENT = 60;

    /** e to the tenth: how much thinner the layer may be at one end than at the other to be short. */
    private static final double SHORT_THINNING = StrictMath.exp(0.1);

    private static final double SHORT_SAG = 0.005;

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
        double curve = curve(earthRadiusM + fromHeightM, zenithCosine);
        double toHeightM = fromHeightM + lengthM * (zenithCosine + curve * lengthM);
        return between(
                scaleHeightM,
                earthRadiusM + fromHeightM,
                zenithCosine,
                lengthM,
                density(scaleHeightM, fromHeightM),
                density(scaleHeightM, toHeightM));
    }

    /** How dense the layer is at a height, 1 at its ground: {@code exp(−h/H)}. */
    public static double density(double scaleHeightM, double heightM) {
        return Math.exp(-heightM / scaleHeightM);
    }

    private static double curve(double fromRadiusM, double zenithCosine) {
        return Math.max(1 - zenithCosine * zenithCosine, LEAST_SINE_SQUARED) / (2 * fromRadiusM);
    }

    /**
     * The same for loops that know how dense the layer is at both ends.
     *
     * @param scaleHeightM height over which the layer thins out by a factor e
     * @param fromRadiusM  distance of the path's beginning from the centre of the (effective) Earth
     * @param zenithCosine cosine of the angle between the path and the vertical at its beginning
     * @param lengthM      length of the path, 0 or more
     * @param fromDensity  {@link #density} at its beginning
     * @param toDensity    the same at its end
     */
    public static double between(
            double scaleHeightM,
            double fromRadiusM,
            double zenithCosine,
            double lengthM,
            double fromDensity,
            double toDensity) {
        double c = curve(fromRadiusM, zenithCosine) * (1 - 0.75 * zenithCosine * lengthM / fromRadiusM);
        double sag = c * lengthM * lengthM / (4 * scaleHeightM);
        if (sag <= SHORT_SAG
                && fromDensity <= SHORT_THINNING * toDensity
                && toDensity <= SHORT_THINNING * fromDensity) {
            double middle = Math.sqrt(fromDensity * toDensity) * (2 + sag * (2 + 0.8 * sag)) / 3;
            return lengthM / scaleHeightM * ((fromDensity + toDensity) / 6 + middle);
        }
        double a = Math.sqrt(c / scaleHeightM);
        double from = zenithCosine / (2 * a * scaleHeightM);
        double to = from + a * lengthM;
        double scale = SQRT_PI / (2 * a * scaleHeightM);
        if (from >= 0) {
            return scale * (fromDensity * scaledErfc(from) - toDensity * scaledErfc(to));
        }
        if (to <= 0) {
            return scale * (toDensity * scaledErfc(-to) - fromDensity * scaledErfc(-from));
        }
        double lowest = 2 * fromDensity * StrictMath.exp(Math.min(from * from, DEEPEST_EXPONENT));
        return scale * (lowest - fromDensity * scaledErfc(-from) - toDensity * scaledErfc(to));
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
