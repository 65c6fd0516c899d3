package skytally.naturalsky;

import skytally.citation.Bibliography;
import skytally.citation.Citation;
import skytally.photometry.Illuminance;
import skytally.photometry.Luminance;
import skytally.photometry.Magnitude;
import skytally.photometry.SurfaceBrightness;
import skytally.photometry.ZeroPoint;
import skytally.spectrum.SpectralClasses;
import skytally.spectrum.Spectrum;

/**
 * The clear moonless sky with no lamp under it: a value at the zenith, and a shape that brightens toward the horizon.
 * <pre>
 *   X_vR(Z) = (1 − 0.96 sin² Z)^−1/2                               van Rhijn, airglow layer near 130 km
 *   b(Z)    = b0 [ (1 − f) + f X_vR ] 10^(−0.4 k_V (X_vR − 1))     f = airglow's share of the light
 * </pre>
 * X_vR ends at 5 on the horizon and is not the air mass of a star. Lower than 10 degrees above the horizon the formula is
 * {@linkplain #isIndicative indicative}: real skies darken again there.
 *
 * <p>22.0 mag/arcsec² at the zenith is a fixed yardstick, not tonight: skies of pristine places lie at 21.9 ± 0.2, and up
 * to 0.4 mag brighter at the maximum of the Sun's activity.
 *
 * @param zenith       V band
 * @param airglowShare f, 0 to 1
 * @param kV           extinction in V, mag per air mass, 0 to 3
 * @see "Garstang (1989), Krisciunas and Schaefer (1991), Patat (2003) appendix C"
 */
public record NaturalBackground(SurfaceBrightness zenith, double airglowShare, double kV) {

    /** Clear zenith away from Milky Way and zodiacal light (Falchi et al. 2016). */
    public static final SurfaceBrightness FALCHI_2016_ZENITH = new SurfaceBrightness(22.0);

    /** Airglow's share f in the shape. */
    public static final double PATAT_2003_AIRGLOW_SHARE = 0.6;

    /** Beyond this zenith angle the shape is not to be relied on, degrees. */
    public static final double RELIABLE_TO_ZENITH_ANGLE_DEG = 80;

    /** (R / (R + h))² for a layer at h ≈ 130 km. */
    private static final double VAN_RHIJN_130_KM = 0.96;

    private static final int SIMPSON_INTERVALS = 720;

    public NaturalBackground {
        if (!(airglowShare >= 0 && airglowShare <= 1)) {
            throw new IllegalArgumentException("Airglow's share must be 0 to 1, not " + airglowShare);
        }
        if (!(kV >= 0 && kV <= 3)) {
            throw new IllegalArgumentException("Extinction in V must be 0 to 3 mag per air mass, not " + kV);
        }
    }

    /**
     * The yardstick: 22.0 mag/arcsec² at the zenith, airglow 0.6 of the light.
     *
     * @param kV of the air at the place, mag per air mass
     */
    public static NaturalBackground reference(double kV) {
        return new NaturalBackground(FALCHI_2016_ZENITH, PATAT_2003_AIRGLOW_SHARE, kV);
    }

    /**
     * X_vR: how much longer a slanting line of sight runs through the airglow layer than a vertical one; 1 to 5. Not the
     * air mass of Kasten and Young.
     *
     * @param zenithAngleDeg 0 to 90
     */
    public static double vanRhijn(double zenithAngleDeg) {
        requireAboveHorizon(zenithAngleDeg);
        double sin = StrictMath.sin(StrictMath.toRadians(zenithAngleDeg));
        return 1 / Math.sqrt(1 - VAN_RHIJN_130_KM * sin * sin);
    }

    /**
     * b(Z) / b0: how many times brighter than the zenith.
     *
     * @param zenithAngleDeg 0 to 90
     */
    public double relativeBrightness(double zenithAngleDeg) {
        double vanRhijn = vanRhijn(zenithAngleDeg);
        return (1 - airglowShare + airglowShare * vanRhijn) * Magnitude.ratioOfDifference(-kV * (vanRhijn - 1));
    }

    /**
     * In the V band.
     *
     * @param zenithAngleDeg 0 to 90
     */
    public SurfaceBrightness brightnessAt(double zenithAngleDeg) {
        return new SurfaceBrightness(
                zenith.magArcsec2() - Magnitude.differenceOfRatio(relativeBrightness(zenithAngleDeg)));
    }

    /**
     * True lower than 10 degrees above the horizon, where the shape is not to be relied on.
     *
     * @param zenithAngleDeg 0 to 90
     */
    public static boolean isIndicative(double zenithAngleDeg) {
        requireAboveHorizon(zenithAngleDeg);
        return zenithAngleDeg > RELIABLE_TO_ZENITH_ANGLE_DEG;
    }

    /**
     * Mean spectral radiance in the V band, W m⁻² nm⁻¹ sr⁻¹: what V light of lamps, scattered by the air, is added to.
     *
     * @param zenithAngleDeg 0 to 90
     */
    public double johnsonVRadianceAt(double zenithAngleDeg) {
        return Spectrum.CALSPEC_V_ZERO_W_PER_M2_NM
                * SurfaceBrightness.SQUARE_ARCSECONDS_PER_STERADIAN
                * Magnitude.ratioOfDifference(-brightnessAt(zenithAngleDeg).magArcsec2());
    }

    /**
     * What the eye by day would see, from the spectrum of the natural sky: 187 µcd/m² at 22.0, 9 % above the traditional
     * scale.
     *
     * @param zenithAngleDeg 0 to 90
     */
    public Luminance photopicLuminanceAt(double zenithAngleDeg) {
        return luminanceAt(zenithAngleDeg, byItsSpectrum());
    }

    /**
     * On a stated scale: 171.27 µcd/m² at 22.0 by {@link ZeroPoint#TRADITIONAL}.
     *
     * @param zenithAngleDeg 0 to 90
     * @throws IllegalStateException if the zero point is not one for a sky
     */
    public Luminance luminanceAt(double zenithAngleDeg, ZeroPoint zeroPoint) {
        return zeroPoint.luminance(brightnessAt(zenithAngleDeg));
    }

    /** The zero point that belongs to the spectrum of the natural sky. */
    public static ZeroPoint byItsSpectrum() {
        return ZeroPoint.spectral(SpectralClasses.naturalSky().spectrum().zeroMagnitudeIlluminanceLx());
    }

    /** On open level ground, {@code E = 2π ∫ L cos Z sin Z dZ}; the brighter single stars are not in it. */
    public Illuminance horizontalIlluminance(ZeroPoint zeroPoint) {
        return new Illuminance(2 * Math.PI * zenithLuminance(zeroPoint) * integralOverZenithAngle(true));
    }

    /** On a vertical plane that faces half of the sky and dark ground, {@code E = 2 ∫ L sin² Z dZ}. */
    public Illuminance verticalIlluminance(ZeroPoint zeroPoint) {
        return new Illuminance(2 * zenithLuminance(zeroPoint) * integralOverZenithAngle(false));
    }

    private double zenithLuminance(ZeroPoint zeroPoint) {
        return zeroPoint.luminance(zenith).candelaPerSquareMetre();
    }

    /** Simpson's rule from zenith to horizon over b(Z)/b0 times cos Z sin Z, or times sin² Z. */
    private double integralOverZenithAngle(boolean onLevelGround) {
        double sum = 0;
        for (int i = 0; i <= SIMPSON_INTERVALS; i++) {
            double zenithAngleDeg = 90.0 * i / SIMPSON_INTERVALS;
            double angleRad = StrictMath.toRadians(zenithAngleDeg);
            double sin = StrictMath.sin(angleRad);
            double facing = onLevelGround ? StrictMath.cos(angleRad) : sin;
            int weight = i == 0 || i == SIMPSON_INTERVALS ? 1 : i % 2 == 1 ? 4 : 2;
            sum += weight * relativeBrightness(zenithAngleDeg) * facing * sin;
        }
        return sum * Math.PI / 2 / SIMPSON_INTERVALS / 3;
    }

    /**
     * How many magnitudes brighter a sky is with artificial light on it: {@code 2.5 log10(1 + r)}.
     *
     * @param artificialToNatural r, zero or more, both parts in the same band
     */
    public static double brighteningMag(double artificialToNatural) {
        if (!(artificialToNatural >= 0)) {
            throw new IllegalArgumentException("The ratio of light must be zero or more, not " + artificialToNatural);
        }
        return Magnitude.differenceOfRatio(1 + artificialToNatural);
    }

    /** The shape. The value of the zenith, if it is {@link #FALCHI_2016_ZENITH}, has its own source. */
    public static Citation shapeCitation() {
        return Bibliography.cite("natural-sky-shape");
    }

    /** The zenith value {@link #FALCHI_2016_ZENITH}. */
    public static Citation zenithCitation() {
        return Bibliography.cite("falchi-2016");
    }

    private static void requireAboveHorizon(double zenithAngleDeg) {
        if (!(zenithAngleDeg >= 0 && zenithAngleDeg <= 90)) {
            throw new IllegalArgumentException("Zenith angle must be 0 to 90 degrees, not " + zenithAngleDeg);
        }
    }
}
