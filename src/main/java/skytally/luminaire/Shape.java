package skytally.luminaire;

/**
 * A plain shape of light, for a fitting of which only words are known.
 *
 * @param id             its name in addresses and files
 * @param words          as it reads in a sentence after a comma, such as "flat lens, facing down"
 * @param distribution   the light it gives
 * @param usualTiltDeg   the tilt a person means who says no more than the shape's name
 * @param luminousSizeM  largest dimension of its bright part, in metres, of the usual size (common practice, no source)
 * @param narrowestBeamDeg full width of its beam at half the peak, or 180 where it has none
 */
public record Shape(
        String id,
        String words,
        IntensityDistribution distribution,
        double usualTiltDeg,
        double luminousSizeM,
        double narrowestBeamDeg) {

    /**
     * Whether the inverse-square law may be used at this distance: five times the largest bright dimension, ten times
     * for beams under 10° (common practice, no source; a matt disc on its axis is 1 % off at five).
     */
    public boolean isFarEnough(double distanceM) {
        return distanceM >= nearestM();
    }

    /** Whether it is turned over already, so that raising its street side leans its light the other way. */
    public boolean facesUp() {
        return distribution instanceof TurnedUp;
    }

    /** Whether it is a beam, which may be wider or narrower than its name says. */
    public boolean hasWidth() {
        return narrowestBeamDeg < 180;
    }

    /**
     * The same beam with another width.
     *
     * @param widthDeg full width at half the peak, 1 to 120 degrees
     */
    public IntensityDistribution ofWidth(double widthDeg) {
        if (!hasWidth()) {
            throw new IllegalStateException("The shape " + id + " is no beam");
        }
        IntensityDistribution beam = Beam.ofWidth(widthDeg);
        return facesUp() ? new TurnedUp(beam) : beam;
    }

    /** The distance from which the inverse-square law holds for this shape. */
    public double nearestM() {
        return (narrowestBeamDeg < 10 ? 10 : 5) * luminousSizeM;
    }
}
