package skytally.photometry;

import java.util.List;
import skytally.citation.Bibliography;
import skytally.citation.Citation;

/**
 * The one constant that ties lux to magnitudes, and with it cd/m² to magnitudes per square second of arc:
 * <pre>
 *   m  = −2.5 log10(E / E0)         E0 = illuminance of magnitude 0, lx
 *   μ  = −2.5 log10(L / L0)         L0 = E0 · (square seconds of arc in a steradian), cd/m²
 * </pre>
 * L0 is always worked out from E0, so the two scales cannot drift apart. A convention: the presets above the
 * atmosphere differ by up to 0.06 mag, which is the uncertainty of the convention itself.
 */
public final class ZeroPoint {

    /** Comparable with nearly all published sky brightness numbers. The default. */
    public static final ZeroPoint TRADITIONAL =
            new ZeroPoint("TRADITIONAL", 2.54e-6, true, "above the atmosphere", "allen-zero-point");

    /** Modern scale, white (Vega-like) star. */
    public static final ZeroPoint CALSPEC_A0 =
            new ZeroPoint("CALSPEC_A0", 2.605e-6, true, "above the atmosphere, white star", "calspec");

    /** Modern scale, Sun-like star, Moon and planets. */
    public static final ZeroPoint CALSPEC_SUN =
            new ZeroPoint("CALSPEC_SUN", 2.685e-6, true, "above the atmosphere, Sun-like star", "calspec");

    /**
     * Only to reproduce lamp numbers made elsewhere with {@code E = 10^((−14.18 − m) / 2.5)}. Extinction is folded
     * into it already, so none may be taken off again, and it has no meaning for a sky.
     */
    public static final ZeroPoint GROUND_14_18 = new ZeroPoint(
            "GROUND_14_18",
            StrictMath.pow(10, -14.18 / 2.5),
            false,
            "at the ground; includes about 0.19 mag of extinction",
            "ground-zero-point");

    private final String name;
    private final double zeroMagnitudeLx;
    private final boolean meantForSky;
    private final String situation;
    private final String source;

    private ZeroPoint(String name, double zeroMagnitudeLx, boolean meantForSky, String situation, String source) {
        if (!(zeroMagnitudeLx > 0 && zeroMagnitudeLx < Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException("E0 must be finite and more than zero lux, not " + zeroMagnitudeLx);
        }
        this.name = name;
        this.zeroMagnitudeLx = zeroMagnitudeLx;
        this.meantForSky = meantForSky;
        this.situation = situation;
        this.source = source;
    }

    /**
     * What an instrument with the Johnson V band reads for one known spectrum.
     *
     * @param zeroMagnitudeLx the photopic illuminance at which that spectrum has V = 0, in lux
     */
    public static ZeroPoint spectral(double zeroMagnitudeLx) {
        return new ZeroPoint("SPECTRAL", zeroMagnitudeLx, true, "Johnson V of this spectrum", "bessell-1990");
    }

    /** The named presets, the default first. */
    public static List<ZeroPoint> presets() {
        return List.of(TRADITIONAL, CALSPEC_A0, CALSPEC_SUN, GROUND_14_18);
    }

    /** Magnitude of a light; it must be more than none. */
    public Magnitude magnitude(Illuminance illuminance) {
        if (!(illuminance.lux() > 0)) {
            throw new IllegalArgumentException("No magnitude belongs to no light");
        }
        return new Magnitude(-2.5 * StrictMath.log10(illuminance.lux() / zeroMagnitudeLx));
    }

    public Illuminance illuminance(Magnitude magnitude) {
        return new Illuminance(zeroMagnitudeLx * Magnitude.ratioOfDifference(-magnitude.value()));
    }

    /**
     * @throws IllegalStateException if this zero point is not one for a sky
     */
    public SurfaceBrightness surfaceBrightness(Luminance luminance) {
        if (!(luminance.candelaPerSquareMetre() > 0)) {
            throw new IllegalArgumentException("No surface brightness belongs to no light");
        }
        return new SurfaceBrightness(
                -2.5 * StrictMath.log10(luminance.candelaPerSquareMetre() / zeroPointLuminanceCdM2()));
    }

    /**
     * @throws IllegalStateException if this zero point is not one for a sky
     */
    public Luminance luminance(SurfaceBrightness brightness) {
        return new Luminance(zeroPointLuminanceCdM2() * Magnitude.ratioOfDifference(-brightness.magArcsec2()));
    }

    /** E0: illuminance of a point of magnitude 0, in lux. */
    public double zeroMagnitudeLx() {
        return zeroMagnitudeLx;
    }

    /**
     * L0: luminance of 0 mag/arcsec², in cd/m².
     *
     * @throws IllegalStateException if this zero point is not one for a sky
     */
    public double zeroPointLuminanceCdM2() {
        if (!meantForSky) {
            throw new IllegalStateException(name + " has extinction folded in and cannot be used for a sky");
        }
        return zeroMagnitudeLx * SurfaceBrightness.SQUARE_ARCSECONDS_PER_STERADIAN;
    }

    public boolean isMeantForSky() {
        return meantForSky;
    }

    public String name() {
        return name;
    }

    /** Where this zero point holds, in words. */
    public String situation() {
        return situation;
    }

    public Citation citation() {
        return Bibliography.cite(source);
    }

    @Override
    public String toString() {
        return name;
    }
}
