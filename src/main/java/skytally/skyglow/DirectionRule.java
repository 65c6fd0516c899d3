package skytally.skyglow;

import skytally.atmosphere.Atmosphere;

/**
 * The directions in which a point of the grid looks around to sum up the radiance it receives, with the solid angle
 * each stands for. One side of the vertical plane through the light stands for both.
 *
 * <p>γ, from the way to the light, is spread as γ = γ₀ sinh(T x) with γ₀ = 4 km / R, so that the glow over a light
 * far away, about a degree wide, gets its share. It is cut where the horizon's circle begins and ends, and each
 * circle of directions where it meets the horizon, for the radiance jumps there.
 */
final class DirectionRule {

    private static final double GLOW_M = 4000;
    private static final double WIDEST = 3;
    private static final double NOTHING = 1e-5;
    private static final double LITTLE = 0.02;

    /**
     * How many directions.
     *
     * @param rings   circles about the way to the light
     * @param sky     directions on the part of a circle above the horizon
     * @param ground  on the part below
     * @param whole   on a circle that does not meet the horizon
     */
    record Density(int rings, int sky, int ground, int whole) {}

    private final Density density;
    private final double[] towardLight;
    private final double[] upward;
    private final double[] solidAngle;
    private int count;

    // the place
    private double lightRising; // zenith cosine of the way to the light
    private double upwardRising; // zenith cosine of the direction square to it, upward
    private double horizonRising;

    DirectionRule(Density density) {
        this.density = density;
        int most = (density.rings() + 8) * Math.max(density.whole(), density.sky() + density.ground());
        towardLight = new double[most];
        upward = new double[most];
        solidAngle = new double[most];
    }

    /**
     * Looks around anew.
     *
     * @param distance from the light, straight, in metres
     * @param up       along the light's vertical
     * @param height   above the ground
     */
    void lookAround(double distance, double up, double height) {
        double earth = Atmosphere.EARTH_RADIUS_M;
        double radius = earth + height;
        double level = Math.sqrt(Math.max(0, distance * distance - up * up));
        lightRising = -(distance + earth * up / distance) / radius;
        upwardRising = earth * (level / distance) / radius;
        horizonRising = -Math.sqrt(height * (2 * earth + height)) / radius;
        count = 0;

        double glow = Math.min(WIDEST, GLOW_M / distance);
        double stretch = asinh(Math.PI / glow);
        double toLight = StrictMath.acos(Math.max(-1, Math.min(1, lightRising)));
        double toHorizon = StrictMath.acos(horizonRising);
        double begins = Math.abs(toHorizon - toLight);
        double ends = Math.min(toHorizon + toLight, 2 * Math.PI - toHorizon - toLight);
        double first = asinh(Math.min(begins, ends) / glow) / stretch;
        double second = asinh(Math.max(begins, ends) / glow) / stretch;
        addRings(0, first, glow, stretch);
        addRings(first, second, glow, stretch);
        addRings(second, 1, glow, stretch);
    }

    private static double asinh(double x) {
        return StrictMath.log(x + Math.sqrt(x * x + 1));
    }

    private void addRings(double from, double to, double glow, double stretch) {
        double length = to - from;
        if (length < NOTHING) {
            return;
        }
        GaussRule rule = GaussRule.of(length < LITTLE ? 1 : Math.max(2, (int) Math.rint(density.rings() * length)));
        for (int i = 0; i < rule.count(); i++) {
            double x = from + length * (1 + rule.nodes()[i]) / 2;
            double angle = glow * StrictMath.sinh(stretch * x);
            double breadth = glow * stretch * StrictMath.cosh(stretch * x) * rule.weights()[i] * length / 2;
            addRing(StrictMath.cos(angle), StrictMath.sin(angle), breadth);
        }
    }

    private void addRing(double cosine, double sine, double breadth) {
        double offset = horizonRising - cosine * lightRising;
        double swing = sine * upwardRising;
        if (offset <= -swing || offset >= swing) {
            addArc(cosine, sine, breadth, 0, Math.PI, density.whole());
            return;
        }
        double horizon = StrictMath.acos(offset / swing);
        addGauss(cosine, sine, breadth, 0, horizon, density.sky());
        addGauss(cosine, sine, breadth, horizon, Math.PI, density.ground());
    }

    /** A whole circle: midpoints, the best there is for what repeats itself. */
    private void addArc(double cosine, double sine, double breadth, double from, double to, int nodes) {
        double width = (to - from) / nodes;
        for (int i = 0; i < nodes; i++) {
            add(cosine, sine, from + (i + 0.5) * width, 2 * sine * breadth * width);
        }
    }

    private void addGauss(double cosine, double sine, double breadth, double from, double to, int nodes) {
        GaussRule rule = GaussRule.of(nodes);
        double half = (to - from) / 2;
        for (int i = 0; i < nodes; i++) {
            add(cosine, sine, from + half * (1 + rule.nodes()[i]), 2 * sine * breadth * half * rule.weights()[i]);
        }
    }

    private void add(double cosine, double sine, double azimuth, double weight) {
        towardLight[count] = cosine;
        upward[count] = sine * StrictMath.cos(azimuth);
        solidAngle[count] = weight;
        count++;
    }

    int count() {
        return count;
    }

    /** Cosine between a direction and the way to the light. */
    double towardLight(int direction) {
        return towardLight[direction];
    }

    /** Component of a direction square to the way to the light, upward. */
    double upward(int direction) {
        return upward[direction];
    }

    double solidAngle(int direction) {
        return solidAngle[direction];
    }

    /** Cosine between a direction and the vertical of the point. */
    double rising(int direction) {
        return towardLight[direction] * lightRising + upward[direction] * upwardRising;
    }
}
