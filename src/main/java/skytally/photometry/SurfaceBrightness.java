package skytally.photometry;

import java.util.Locale;

/**
 * Brightness of a sky on the astronomers' scale, in magnitudes per square second of arc: smaller is brighter. Finite.
 */
public record SurfaceBrightness(double magArcsec2) {

    /** Square seconds of arc in one steradian: (180 · 3600 / π)². */
    public static final double SQUARE_ARCSECONDS_PER_STERADIAN = squareArcsecondsPerSteradian();

    public SurfaceBrightness {
        if (!Double.isFinite(magArcsec2)) {
            throw new IllegalArgumentException("A surface brightness must be finite, not " + magArcsec2);
        }
    }

    private static double squareArcsecondsPerSteradian() {
        double arcsecondsPerRadian = 180 * 3600 / Math.PI;
        return arcsecondsPerRadian * arcsecondsPerRadian;
    }

    @Override
    public String toString() {
        return String.format(Locale.ROOT, "%.3f mag/arcsec²", magArcsec2);
    }
}
