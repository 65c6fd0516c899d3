package skytally.photometry;

import java.util.Locale;

/** The strength of a source in one direction, in candelas; finite and never negative. */
public record LuminousIntensity(double candela) implements Comparable<LuminousIntensity> {

    public LuminousIntensity {
        if (!(candela >= 0 && candela < Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException(
                    "Luminous intensity must be finite and zero or more candelas, not " + candela);
        }
    }

    /** The same strength in every direction: flux divided by 4π steradians. */
    public static LuminousIntensity allRound(LuminousFlux flux) {
        return new LuminousIntensity(flux.lumens() / (4 * Math.PI));
    }

    @Override
    public int compareTo(LuminousIntensity other) {
        return Double.compare(candela, other.candela);
    }

    @Override
    public String toString() {
        return String.format(Locale.ROOT, "%.4g cd", candela);
    }
}
