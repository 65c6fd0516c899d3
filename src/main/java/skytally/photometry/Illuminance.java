package skytally.photometry;

import java.util.Locale;

/**
 * Luminous flux arriving at a surface, per unit area of that surface.
 * Held in lux (lm/m²); finite and never negative. Light from several sources adds in lux, never in magnitudes.
 */
public record Illuminance(double lux) implements Comparable<Illuminance> {

    public static final Illuminance DARK = new Illuminance(0);

    /** One footcandle (lumen per square foot) in lux: 1 / 0.3048², by definition of the foot. */
    public static final double LUX_PER_FOOTCANDLE = 1 / (0.3048 * 0.3048);

    public Illuminance {
        if (!(lux >= 0 && lux < Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException("Illuminance must be finite and zero or more lux, not " + lux);
        }
    }

    /**
     * Illuminance from one source, by the inverse-square law: {@code E = I cos(i) / d²}.
     * Good while the source is small beside its distance; {@code luminaire} says when it is not.
     *
     * @param towardSurface intensity in the direction of the surface
     * @param distanceM     source to surface, in metres, more than zero
     * @param incidenceRad  angle between the light and the surface's normal, in radians;
     *                      at π/2 or beyond the light is behind the surface and adds nothing
     */
    public static Illuminance from(LuminousIntensity towardSurface, double distanceM, double incidenceRad) {
        if (!(distanceM > 0)) {
            throw new IllegalArgumentException("Distance must be more than zero metres, not " + distanceM);
        }
        double facing = Math.max(0, StrictMath.cos(incidenceRad));
        return new Illuminance(towardSurface.candela() * facing / (distanceM * distanceM));
    }

    public static Illuminance ofFootcandles(double footcandles) {
        return new Illuminance(footcandles * LUX_PER_FOOTCANDLE);
    }

    public double footcandles() {
        return lux / LUX_PER_FOOTCANDLE;
    }

    public Illuminance plus(Illuminance other) {
        return new Illuminance(lux + other.lux);
    }

    public Illuminance times(double factor) {
        return new Illuminance(lux * factor);
    }

    @Override
    public int compareTo(Illuminance other) {
        return Double.compare(lux, other.lux);
    }

    /** For logs and test failures. People read {@code QuantityFormat}. */
    @Override
    public String toString() {
        return String.format(Locale.ROOT, "%.4g lx", lux);
    }
}
