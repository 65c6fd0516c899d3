package skytally.photometry;

import java.util.Locale;

/**
 * Brightness of a point on the astronomers' scale: smaller is brighter, five steps are a factor of one hundred.
 * Means nothing without the {@link ZeroPoint} it was reckoned with. Finite.
 */
public record Magnitude(double value) {

    public Magnitude {
        if (!Double.isFinite(value)) {
            throw new IllegalArgumentException("A magnitude must be finite, not " + value);
        }
    }

    /** How many times brighter than another: {@code 100^((other − this) / 5)}. */
    public double timesBrighterThan(Magnitude other) {
        return ratioOfDifference(other.value - value);
    }

    /** The light ratio of a difference in magnitudes: {@code 100^(difference / 5)}. */
    public static double ratioOfDifference(double differenceMag) {
        return StrictMath.pow(10, 0.4 * differenceMag);
    }

    /** The difference in magnitudes of a light ratio: {@code 2.5 log10(ratio)}. */
    public static double differenceOfRatio(double ratio) {
        if (!(ratio > 0 && ratio < Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException("A light ratio must be finite and more than zero, not " + ratio);
        }
        return 2.5 * StrictMath.log10(ratio);
    }

    @Override
    public String toString() {
        return String.format(Locale.ROOT, "%.3f mag", value);
    }
}
