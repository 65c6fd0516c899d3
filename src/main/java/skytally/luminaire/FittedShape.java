package skytally.luminaire;

import java.util.OptionalDouble;
import org.hipparchus.analysis.UnivariateFunction;
import org.hipparchus.analysis.solvers.BrentSolver;
import skytally.geometry.Attitude;

/**
 * A plain shape made to agree with the share of light that somebody states goes above the level, as the luminaire hangs.
 *
 * <p>A beam has a width, and the width is what gives way: of all beams from 1° to 120° wide, the one is taken that sends
 * the stated share up. There is at most one. With the axis below the level, the part of a ring about it that lies above
 * the level only grows with the ring, and a wider beam has more of its light in wide rings; with the axis above the
 * level, the same holds of what goes down. With the axis level every width sends half up, and none fits another share.
 *
 * <p>Where no width fits, or the shape has none and sends another share up by more than half a point, the two claims
 * disagree, and in each direction the brighter of the two is taken: see {@link #allRoundPart}.
 *
 * @param shape        as named
 * @param light        what is reckoned with
 * @param beamWidthDeg full width of its beam at half the peak, fitted or its own, or 180 where it has none
 * @param statedShare  share stated to go above the level, 0 to 1, or nothing
 * @param shapeShare   share the shape sends above the level as it hangs, with that width; 0 to 1
 * @param fit          what came of it
 * @param allRoundPart where the claims disagree, the part p of an all-round source that makes the stated share: the light
 *                     is then {@code max[ i₀, (1 − p) i₀ + p / 4π ]}; 0 where there is no such part, or no need of one
 */
public record FittedShape(
        Shape shape,
        IntensityDistribution light,
        double beamWidthDeg,
        OptionalDouble statedShare,
        double shapeShare,
        Fit fit,
        double allRoundPart) {

    /** What came of the claim and the shape. */
    public enum Fit {
        /** Nobody stated a share. */
        NOTHING_STATED,
        /** The shape sends the stated share up as it is. */
        AS_STATED,
        /** The width of its beam was worked out so that it does. */
        WIDTH_WORKED_OUT,
        /** It does not, and no width would. */
        DIFFERS
    }

    /** How near a share must come to be the stated one. */
    public static final double EXACT = 1e-6;

    /** How far a shape without a fitting width may be off before the claims disagree: half a point, our choice. */
    public static final double TOLERANCE = 0.005;

    private static final double NARROWEST_DEG = 1;
    private static final double WIDEST_DEG = 120;

    /**
     * @param stated share above the level, 0 to 1, or nothing
     * @param hang   how it hangs; its bearing does not matter
     */
    public static FittedShape of(Shape shape, OptionalDouble stated, Attitude hang) {
        double own = FluxShare.upward(shape.distribution(), hang);
        if (stated.isEmpty()) {
            return asItIs(shape, stated, own, Fit.NOTHING_STATED);
        }
        double share = stated.getAsDouble();
        if (!(share >= 0 && share <= 1)) {
            throw new IllegalArgumentException("A share above the level must be 0 to 1, not " + share);
        }
        if (Math.abs(own - share) <= EXACT) {
            return asItIs(shape, stated, own, Fit.AS_STATED);
        }
        OptionalDouble width = shape.hasWidth() ? widthThatSends(shape, share, hang) : OptionalDouble.empty();
        if (width.isPresent()) {
            IntensityDistribution beam = shape.ofWidth(width.getAsDouble());
            double fitted = FluxShare.upward(beam, hang);
            return new FittedShape(shape, beam, width.getAsDouble(), stated, fitted, Fit.WIDTH_WORKED_OUT, 0);
        }
        return Math.abs(own - share) <= TOLERANCE
                ? asItIs(shape, stated, own, Fit.AS_STATED)
                : brighter(shape, stated, own);
    }

    private static FittedShape asItIs(Shape shape, OptionalDouble stated, double own, Fit fit) {
        return new FittedShape(shape, shape.distribution(), shape.narrowestBeamDeg(), stated, own, fit, 0);
    }

    /** An all-round source sends half up, however it hangs: (1 − p) · own + p / 2 = stated. */
    private static FittedShape brighter(Shape shape, OptionalDouble stated, double own) {
        double part = (stated.getAsDouble() - own) / (0.5 - own);
        if (!(part > 0 && part <= 1)) {
            return asItIs(shape, stated, own, Fit.DIFFERS);
        }
        IntensityDistribution light = new Brighter(shape.distribution(), part);
        return new FittedShape(shape, light, shape.narrowestBeamDeg(), stated, own, Fit.DIFFERS, part);
    }

    private static OptionalDouble widthThatSends(Shape shape, double share, Attitude hang) {
        // No beam sends exactly nothing or all of it up; a quarter of what counts as exact does.
        double wanted = Math.min(1 - EXACT / 4, Math.max(EXACT / 4, share));
        UnivariateFunction excess = width -> FluxShare.upward(shape.ofWidth(width), hang) - wanted;
        double narrowest = excess.value(NARROWEST_DEG);
        double widest = excess.value(WIDEST_DEG);
        if (Math.abs(widest) <= EXACT / 4) {
            return OptionalDouble.of(WIDEST_DEG);
        }
        if (narrowest * widest > 0 || Math.abs(widest - narrowest) < EXACT / 4) {
            return OptionalDouble.empty();
        }
        double width = new BrentSolver(1e-12, 1e-10, 1e-9).solve(200, excess, NARROWEST_DEG, WIDEST_DEG);
        return Math.abs(FluxShare.upward(shape.ofWidth(width), hang) - share) <= EXACT
                ? OptionalDouble.of(width)
                : OptionalDouble.empty();
    }

    /** Whether what is stated and what the shape sends up cannot both be true. */
    public boolean differs() {
        return fit == Fit.DIFFERS;
    }

    /** Whether it was a width that made it agree. */
    public boolean hasWidthWorkedOut() {
        return fit == Fit.WIDTH_WORKED_OUT;
    }

    /** The distance from which the inverse-square law holds, for a bright part of this size; as {@link Shape} has it. */
    public double nearestM(double luminousSizeM) {
        return (beamWidthDeg < 10 ? 10 : 5) * luminousSizeM;
    }

    /** Whether the light changes when it is turned about the vertical, hung with this tilt and roll. */
    public static boolean bearingMatters(IntensityDistribution light, double tiltDeg, double rollDeg) {
        if (light instanceof AllRound) {
            return false;
        }
        boolean upright = (tiltDeg == 0 || tiltDeg == 180) && (rollDeg == 0 || Math.abs(rollDeg) == 180);
        return !(light.isRound() && upright);
    }
}
