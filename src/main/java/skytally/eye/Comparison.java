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
        return NaturalAnchors.all().stream()
                .filter(anchor -> anchor.kind() == NaturalAnchor.Kind.POINT)
                .filter(anchor -> anchor.illuminance(zeroPoint).compareTo(light) <= 0)
                .max(Comparator.comparing(anchor -> anchor.illuminance(zeroPoint)))
                .map(anchor -> new Comparison(
                        anchor, light.lux() / anchor.illuminance(zeroPoint).lux()));
    }
}
