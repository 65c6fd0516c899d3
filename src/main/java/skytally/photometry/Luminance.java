package skytally.photometry;

import java.util.Locale;

/**
 * How bright a surface or a patch of sky looks, in candelas per square metre; finite and never negative.
 * A veil in the eye and a sky add in cd/m², never in magnitudes.
 */
public record Luminance(double candelaPerSquareMetre) implements Comparable<Luminance> {

    /** One nanolambert: 1e-9 lambert, a lambert being 1/π candela per square centimetre. */
    public static final double CANDELA_PER_SQUARE_METRE_PER_NANOLAMBERT = 1e-5 / Math.PI;

    public Luminance {
        if (!(candelaPerSquareMetre >= 0 && candelaPerSquareMetre < Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException(
                    "Luminance must be finite and zero or more cd/m², not " + candelaPerSquareMetre);
        }
    }

    /**
     * A matt (Lambertian) surface under light: {@code L = ρ E / π}.
     *
     * @param reflectance share of the light sent back, 0 to 1
     */
    public static Luminance ofMattSurface(Illuminance onIt, double reflectance) {
        if (!(reflectance >= 0 && reflectance <= 1)) {
            throw new IllegalArgumentException("Reflectance must be 0 to 1, not " + reflectance);
        }
        return new Luminance(reflectance * onIt.lux() / Math.PI);
    }

    public static Luminance ofNanolamberts(double nanolamberts) {
        return new Luminance(nanolamberts * CANDELA_PER_SQUARE_METRE_PER_NANOLAMBERT);
    }

    public double nanolamberts() {
        return candelaPerSquareMetre / CANDELA_PER_SQUARE_METRE_PER_NANOLAMBERT;
    }

    public Luminance plus(Luminance other) {
        return new Luminance(candelaPerSquareMetre + other.candelaPerSquareMetre);
    }

    public Luminance times(double factor) {
        return new Luminance(candelaPerSquareMetre * factor);
    }

    @Override
    public int compareTo(Luminance other) {
        return Double.compare(candelaPerSquareMetre, other.candelaPerSquareMetre);
    }

    @Override
    public String toString() {
        return String.format(Locale.ROOT, "%.4g cd/m²", candelaPerSquareMetre);
    }
}
