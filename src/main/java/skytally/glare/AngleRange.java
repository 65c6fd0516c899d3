package skytally.glare;

import java.util.Locale;

/**
 * The glare angles a formula holds for, both ends included.
 *
 * @param fromDeg more than 0
 * @param toDeg   more than fromDeg, at most 180
 */
public record AngleRange(double fromDeg, double toDeg) {

    public AngleRange {
        if (!(fromDeg > 0 && toDeg > fromDeg && toDeg <= 180)) {
            throw new IllegalArgumentException(
                    "A range of angles rises from more than 0 to at most 180 degrees, not " + fromDeg + " to " + toDeg);
        }
    }

    public boolean contains(double angleDeg) {
        return angleDeg >= fromDeg && angleDeg <= toDeg;
    }

    @Override
    public String toString() {
        return String.format(Locale.ROOT, "%s to %s degrees", plain(fromDeg), plain(toDeg));
    }

    private static String plain(double angleDeg) {
        return angleDeg == Math.rint(angleDeg) ? Long.toString((long) angleDeg) : Double.toString(angleDeg);
    }
}
