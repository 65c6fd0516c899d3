package skytally.luminaire;

import java.util.Arrays;
import java.util.function.ToDoubleFunction;
import org.hipparchus.analysis.integration.gauss.GaussIntegrator;
import org.hipparchus.analysis.integration.gauss.GaussIntegratorFactory;
import skytally.geometry.Attitude;
import skytally.geometry.Rotation;

/**
 * The share of a luminaire's light that goes above a given altitude, as it hangs.
 *
 * <p>Directions at one angle γ from the nadir axis form a ring; the part of it that lies above the altitude is one
 * arc, known in closed form. What is left is an integral along γ, divided where the shape has an edge and where the
 * arc begins or ends, and stretched there so that the arc's square-root ends cost no accuracy.
 */
public final class FluxShare {

    private static final GaussIntegrator ALONG = new GaussIntegratorFactory().legendre(40);
    private static final GaussIntegrator ROUND = new GaussIntegratorFactory().legendre(24);

    /** Ten degrees, the height of the band just above level whose light travels furthest. */
    private static final double LOW_RAD = StrictMath.toRadians(10);

    private final IntensityDistribution light;
    private final Rotation hang;
    private final double axisTiltRad;
    private final double ringTilt; // sine of the nadir axis's tilt
    private final double highestRad; // azimuth, in the own frame, of a ring's highest point

    private FluxShare(IntensityDistribution light, Attitude attitude) {
        this.light = light;
        this.hang = attitude.rotation();
        this.ringTilt = Math.sqrt(hang.zx() * hang.zx() + hang.zy() * hang.zy());
        this.axisTiltRad = StrictMath.atan2(ringTilt, hang.zz());
        this.highestRad = StrictMath.atan2(hang.zy(), hang.zx());
    }

    /** ULR: share at and above the level, as the luminaire hangs; 0 to 1. */
    public static double upward(IntensityDistribution light, Attitude attitude) {
        return greatest(light, attitude, share -> share.above(0));
    }

    /**
     * Share below the level, as the luminaire hangs; 0 to 1. What is left of the share above, unless the light is the
     * brighter of several: then what it sends down is the most any of them does, as is what it sends up.
     */
    public static double downward(IntensityDistribution light, Attitude attitude) {
        return greatest(light, attitude, share -> 1 - share.above(0));
    }

    /** Share between the level and 10° above it, as the luminaire hangs; 0 to 1. */
    public static double low(IntensityDistribution light, Attitude attitude) {
        return greatest(light, attitude, share -> Math.max(0, share.above(0) - share.above(LOW_RAD)));
    }

    /** Share above an altitude of −90° to 90° (in radians); over −90° it is all of it, 1. */
    public static double above(IntensityDistribution light, Attitude attitude, double altitudeRad) {
        if (!(Math.abs(altitudeRad) <= Math.PI / 2 + 1e-12)) {
            throw new IllegalArgumentException("Altitude must be -π/2 to π/2, not " + altitudeRad);
        }
        return greatest(light, attitude, share -> share.above(altitudeRad));
    }

    /** The integral over the whole sphere: 1, and more for one that takes the brighter of several. */
    static double inAll(IntensityDistribution light) {
        return new FluxShare(light, Attitude.LEVEL).sum(-Math.PI / 2);
    }

    private static double greatest(IntensityDistribution light, Attitude attitude, ToDoubleFunction<FluxShare> share) {
        double greatest = 0;
        for (IntensityDistribution reading : light.readings()) {
            greatest = Math.max(greatest, share.applyAsDouble(new FluxShare(reading, attitude)));
        }
        return greatest;
    }

    private double above(double altitudeRad) {
        return Math.min(1, sum(altitudeRad)); // a rounding over would leave less than nothing
    }

    private double sum(double altitudeRad) {
        double[] cuts = cuts(altitudeRad);
        double sum = 0;
        for (int i = 1; i < cuts.length; i++) {
            sum += piece(cuts[i - 1], cuts[i], StrictMath.sin(altitudeRad));
        }
        return sum;
    }

    private double[] cuts(double altitudeRad) {
        double fromNadir = Math.PI / 2 + altitudeRad;
        double[] breaks = light.breaksRad();
        double[] cuts = Arrays.copyOf(breaks, breaks.length + 4);
        cuts[breaks.length] = Math.abs(fromNadir - axisTiltRad);
        double far = fromNadir + axisTiltRad;
        cuts[breaks.length + 1] = far <= Math.PI ? far : 2 * Math.PI - far;
        cuts[breaks.length + 2] = 0;
        cuts[breaks.length + 3] = Math.PI;
        Arrays.sort(cuts);
        return cuts;
    }

    private double piece(double from, double to, double sineOfAltitude) {
        double half = (to - from) / 2;
        if (half <= 0) {
            return 0;
        }
        double middle = (from + to) / 2;
        double sum = 0;
        for (int i = 0; i < ALONG.getNumberOfPoints(); i++) {
            double t = ALONG.getPoint(i);
            double gamma = middle + half * t * (3 - t * t) / 2; // slows down toward both ends
            double step = half * 1.5 * (1 - t * t) * ALONG.getWeight(i);
            sum += ring(gamma, sineOfAltitude) * StrictMath.sin(gamma) * step;
        }
        return sum;
    }

    /** Integral of the intensity over the part of a ring above the altitude, by azimuth. */
    private double ring(double gamma, double sineOfAltitude) {
        double sine = StrictMath.sin(gamma);
        double cosine = StrictMath.cos(gamma);
        double reach = ringTilt * sine;
        double needed = sineOfAltitude + hang.zz() * cosine;
        if (needed >= reach) {
            return 0;
        }
        double halfArc = needed <= -reach ? Math.PI : StrictMath.acos(needed / reach);
        if (light.isRound()) {
            return 2 * halfArc * light.perLumen(sine, 0, -cosine);
        }
        double sum = 0;
        for (int i = 0; i < ROUND.getNumberOfPoints(); i++) {
            double phi = highestRad + halfArc * ROUND.getPoint(i);
            sum += ROUND.getWeight(i) * light.perLumen(sine * StrictMath.cos(phi), sine * StrictMath.sin(phi), -cosine);
        }
        return sum * halfArc;
    }
}
