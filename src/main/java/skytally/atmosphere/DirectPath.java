package skytally.atmosphere;

/**
 * The straight line between a lamp and an eye over the curve of the Earth.
 *
 * <p>Light near the ground bends a little downward; as is usual, that is reckoned by an Earth 7/6 as large (mean
 * refraction). Heights are above the same ground, which is taken as level but for the curve.
 *
 * @param lengthM            along the line of sight
 * @param altitudeAtEyeRad   of the lamp above the eye's level
 * @param altitudeAtLampRad  of the eye above the lamp's level; negative when the eye lies lower
 * @param lampHeightM        above the ground
 * @param clearsTheHorizon   whether the curve of the Earth leaves the line free
 */
public record DirectPath(
        double lengthM,
        double altitudeAtEyeRad,
        double altitudeAtLampRad,
        double lampHeightM,
        boolean clearsTheHorizon) {

    /** Radius of the Earth enlarged for mean refraction, in metres. */
    public static final double EFFECTIVE_EARTH_RADIUS_M = Atmosphere.EARTH_RADIUS_M * 7 / 6;

    private static final double LOWEST_M = 0.01;

    /**
     * @param lampHeightM     of the lamp above the ground, 0 or more
     * @param eyeHeightM      of the eye above the ground, 0 or more
     * @param groundDistanceM along the ground between the two, 0 or more; not both at the same point
     */
    public static DirectPath between(double lampHeightM, double eyeHeightM, double groundDistanceM) {
        double radius = EFFECTIVE_EARTH_RADIUS_M;
        double half = StrictMath.sin(groundDistanceM / (2 * radius));
        double rise = lampHeightM - eyeHeightM;
        double drop = 2 * half * half;
        double length = Math.sqrt(rise * rise + 4 * (radius + lampHeightM) * (radius + eyeHeightM) * half * half);
        if (!(length > 0 && length < Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException("Lamp and eye must be apart, not " + length + " m");
        }
        double sineAtEye = (rise - (radius + lampHeightM) * drop) / length;
        double sineAtLamp = (-rise - (radius + eyeHeightM) * drop) / length;
        boolean clears = groundDistanceM <= horizonDistanceM(lampHeightM) + horizonDistanceM(eyeHeightM);
        return new DirectPath(length, arcsine(sineAtEye), arcsine(sineAtLamp), lampHeightM, clears);
    }

    /**
     * How far along the ground the horizon lies from a height, in metres. Nothing that shines or looks lies lower than
     * a centimetre, so two things on the ground side by side see each other.
     */
    public static double horizonDistanceM(double heightM) {
        double radius = EFFECTIVE_EARTH_RADIUS_M;
        double h = Math.max(LOWEST_M, heightM);
        return radius * StrictMath.atan(Math.sqrt(h * (2 * radius + h)) / radius);
    }

    private static double arcsine(double sine) {
        return StrictMath.asin(Math.max(-1, Math.min(1, sine)));
    }

    /** How much of a layer of this scale height lies on the path, as a multiple of what lies overhead. */
    public double airOnPath(double scaleHeightM) {
        return ExponentialLayer.on(
                EFFECTIVE_EARTH_RADIUS_M, scaleHeightM, lampHeightM, StrictMath.sin(altitudeAtLampRad), lengthM);
    }
}
