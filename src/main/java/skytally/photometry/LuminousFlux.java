package skytally.photometry;

import java.util.Locale;

/** All the light a source gives, in lumens; finite and never negative. */
public record LuminousFlux(double lumens) implements Comparable<LuminousFlux> {

    public LuminousFlux {
        // Stated as what must hold, so that NaN is refused with the rest.
        if (!(lumens >= 0 && lumens < Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException("Luminous flux must be finite and zero or more lumens, not " + lumens);
        }
    }

    public LuminousFlux times(double factor) {
        return new LuminousFlux(lumens * factor);
    }

    @Override
    public int compareTo(LuminousFlux other) {
        return Double.compare(lumens, other.lumens);
    }

    @Override
    public String toString() {
        return String.format(Locale.ROOT, "%.4g lm", lumens);
    }
}
