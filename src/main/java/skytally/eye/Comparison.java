package skytally.eye;

import java.util.Comparator;
import java.util.Optional;
import skytally.photometry.Illuminance;
import skytally.photometry.ZeroPoint;

/**
 * A light beside the natural light that people know and that it comes nearest to from above.
 *
 * @param anchor the natural light, a point or small disc
 * @param times  how many times as much light the other gives, 1 or more
 */
public record Comparison(NaturalAnchor anchor, double times) {

    /** The brightest natural light that is not brighter; none for a light fainter than the faintest star. */
    public static Optional<Comparison> of(Illuminance light, ZeroPoint zeroPoint) {
        return of(light, zeroPoint, NaturalAnchor.Kind.POINT);
    }

    /** The same among skies: what they lay on level ground. None for a light less than that of the starlit sky. */
    public static Optional<Comparison> onGround(Illuminance light, ZeroPoint zeroPoint) {
        return of(light, zeroPoint, NaturalAnchor.Kind.GROUND);
    }

    private static Optional<Comparison> of(Illuminance light, ZeroPoint zeroPoint, NaturalAnchor.Kind kind) {
        return NaturalAnchors.all().stream()
                .filter(anchor -> anchor.kind() == kind)
                .filter(anchor -> anchor.illuminance(zeroPoint).compareTo(light) <= 0)
                .max(Comparator.comparing(anchor -> anchor.illuminance(zeroPoint)))
                .map(anchor -> new Comparison(
                        anchor, light.lux() / anchor.illuminance(zeroPoint).lux()));
    }
}
