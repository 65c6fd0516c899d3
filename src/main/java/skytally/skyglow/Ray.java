package skytally.skyglow;

import skytally.atmosphere.Atmosphere;
import skytally.atmosphere.ExponentialLayer;
import skytally.atmosphere.Molecules;

/**
 * A straight line of sight through the air around a light on the ground: where it ends, where it is best cut, and for
 * each point on it what a field around the light needs to know of it.
 *
 * <p>Everything is reckoned from the light: the point s metres along has straight distance √(q² + (s − s₀)²) from it,
 * s₀ being nearest. Azimuths never occur. Made once and used for one line after another.
 */
final class Ray {

    /** Where the line is cut: below is most of the haze. */
    private static final double LOW_AIR_M = 4000;
    /** A direction seen from a point has this sine at least: overhead of the light, azimuth has no meaning. */
    private static final double LEAST_SINE = 1e-9;

    private static final double EARTH = Atmosphere.EARTH_RADIUS_M;

    private final LayeredAir air;
    private final double hazeHeight;

    // the beginning
    private double up;
    private double height;
    private double radius;
    private double rising;
    private double climb;
    private double moleculesAtStart;
    private double hazeAtStart;
    private double nearest;
    private double nearestDistance;
    private double end;
    private boolean endsOnGround;
    private final double[] cuts = new double[4];
    private int pieces;

    // the point last asked for
    private double pointDistance;
    private double pointUp;
    private double pointHeight;
    private double molecules;
    private double haze;

    Ray(LayeredAir air) {
        this.air = air;
        this.hazeHeight = air.aerosol().scaleHeightM();
    }

    /**
     * Begins anew at a viewer's eye.
     *
     * @return straight distance of the eye from the light, in metres
     */
    double lookAlong(Sightline line, double top) {
        double turn = line.groundDistanceM() / EARTH;
        double sine = StrictMath.sin(turn);
        double half = StrictMath.sin(turn / 2);
        double cosine = 1 - 2 * half * half;
        double across = (EARTH + line.eyeHeightM()) * sine;
        double above = line.eyeHeightM() - (EARTH + line.eyeHeightM()) * 2 * half * half;
        double distance = Math.sqrt(across * across + above * above);

        double cosineOfZenithAngle = StrictMath.cos(line.zenithAngleRad());
        double inward = StrictMath.sin(line.zenithAngleRad()) * StrictMath.cos(line.azimuthRad());
        double outward = -inward * cosine + cosineOfZenithAngle * sine;
        double upward = inward * sine + cosineOfZenithAngle * cosine;
        double toLight = -(across * outward + above * upward) / distance;
        begin(distance, above, line.eyeHeightM(), cosineOfZenithAngle, Math.max(-1, Math.min(1, toLight)), upward, top);
        return distance;
    }

    /**
     * Begins anew.
     *
     * @param distance    of the beginning from the light, straight, in metres; more than 0
     * @param up          how far it lies up along the light's vertical, in metres; less than its height where Earth curves away
     * @param height      of the beginning above the ground, in metres; 0 or more
     * @param rising      cosine between the line and the vertical at its beginning
     * @param towardLight cosine between the line and the way to the light
     * @param climb       cosine between the line and the light's vertical
     * @param top         where the air ends, in metres
     */
    void begin(double distance, double up, double height, double rising, double towardLight, double climb, double top) {
        this.up = up;
        this.height = height;
        this.rising = rising;
        this.climb = climb;
        radius = EARTH + height;
        moleculesAtStart = air.molecules(height);
        hazeAtStart = air.haze(height);
        nearest = distance * towardLight;
        nearestDistance = distance * Math.sqrt(Math.max(1 - towardLight * towardLight, 1e-24));
        findEnd(top);
        findCuts();
    }

    private void findEnd(double top) {
        double along = radius * rising;
        double toGround = height * (2 * EARTH + height); // (R + h)² − R²
        double belowEye = along * along - toGround;
        endsOnGround = rising < 0 && belowEye > 0;
        end = endsOnGround ? toGround / (-along + Math.sqrt(belowEye)) : fromBelow(along, top);
    }

    /** Along the line to a sphere that its beginning lies within. */
    private double fromBelow(double along, double sphere) {
        double gap = (sphere - height) * (2 * EARTH + sphere + height);
        double root = Math.sqrt(along * along + gap);
        return along > 0 ? gap / (along + root) : root - along;
    }

    private void findCuts() {
        int count = 0;
        cuts[count++] = 0;
        double along = radius * rising;
        if (height < LOW_AIR_M) {
            double leaves = fromBelow(along, LOW_AIR_M);
            if (leaves < end) {
                cuts[count++] = leaves;
            }
        } else {
            double gap = (height - LOW_AIR_M) * (2 * EARTH + height + LOW_AIR_M);
            double within = along * along - gap;
            if (rising < 0 && within > 0) {
                double enters = gap / (Math.sqrt(within) - along);
                double leaves = Math.sqrt(within) - along;
                if (enters < end) {
                    cuts[count++] = enters;
                }
                if (leaves < end) {
                    cuts[count++] = leaves;
                }
            }
        }
        cuts[count] = end;
        pieces = end > 0 ? count : 0;
    }

    /** How many pieces it is cut into; none where it ends at once. */
    int pieces() {
        return pieces;
    }

    double from(int piece) {
        return cuts[piece];
    }

    double to(int piece) {
        return cuts[piece + 1];
    }

    /** Whether a piece runs through the low air, where the haze is. */
    boolean isLow(int piece) {
        double s = (cuts[piece] + cuts[piece + 1]) / 2;
        return heightAt(s) < LOW_AIR_M;
    }

    boolean endsOnGround() {
        return endsOnGround;
    }

    double end() {
        return end;
    }

    /** s of the point nearest the light. */
    double nearest() {
        return nearest;
    }

    /** Distance of that point from the light. */
    double nearestDistance() {
        return nearestDistance;
    }

    /** Where the line crosses the level of the light; not a number where it runs level. */
    double crossesLevel() {
        return -up / climb;
    }

    /** Whether it climbs, reckoned along the light's vertical. */
    boolean climbs() {
        return climb > 0;
    }

    /** Goes to the point s metres along. */
    void goTo(double s) {
        double offset = s - nearest;
        pointDistance = Math.sqrt(nearestDistance * nearestDistance + offset * offset);
        pointUp = up + s * climb;
        pointHeight = heightAt(s);
        molecules = air.molecules(pointHeight);
        haze = air.haze(pointHeight);
    }

    private double heightAt(double s) {
        double gained = s * (2 * radius * rising + s);
        return Math.max(0, height + gained / (radius + Math.sqrt(radius * radius + gained)));
    }

    double pointDistance() {
        return pointDistance;
    }

    double pointHeight() {
        return pointHeight;
    }

    /** Density of the molecules there, 1 at the ground. */
    double molecules() {
        return molecules;
    }

    /** Density of the haze there. */
    double haze() {
        return haze;
    }

    /** Cosine of the light's zenith angle under which the point stands. */
    double pointZenithCosine() {
        return pointUp / pointDistance;
    }

    /** Cosine between the line and the way from the point to the light. */
    double pointTowardLight(double s) {
        return (nearest - s) / pointDistance;
    }

    /**
     * The part of the line's direction that is square to the way to the light and in its vertical plane, upward.
     *
     * @param towardLight {@link #pointTowardLight}
     */
    double pointUpward(double towardLight) {
        double level = Math.sqrt(Math.max(pointDistance * pointDistance - pointUp * pointUp, 0));
        double widest = Math.sqrt(Math.max(1 - towardLight * towardLight, 0));
        if (level < LEAST_SINE * pointDistance) {
            return widest;
        }
        double upward = (towardLight * pointUp + climb * pointDistance) / level;
        return Math.max(-widest, Math.min(widest, upward));
    }

    /** Molecules on the way from the beginning to the point, as a multiple of those overhead. */
    double moleculesOnWay(double s) {
        return ExponentialLayer.between(Molecules.SCALE_HEIGHT_M, radius, rising, s, moleculesAtStart, molecules);
    }

    double hazeOnWay(double s) {
        return ExponentialLayer.between(hazeHeight, radius, rising, s, hazeAtStart, haze);
    }

    /** Molecules on the way from the light to the point. */
    double moleculesFromLight() {
        return ExponentialLayer.between(
                Molecules.SCALE_HEIGHT_M, EARTH, pointZenithCosine(), pointDistance, 1, molecules);
    }

    double hazeFromLight() {
        return ExponentialLayer.between(hazeHeight, EARTH, pointZenithCosine(), pointDistance, 1, haze);
    }
}
