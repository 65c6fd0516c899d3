package skytally.review;

import java.util.List;
import java.util.Locale;
import skytally.assessment.Figure;
import skytally.notation.QuantityFormat;
import skytally.scene.Look;
import skytally.scene.Observer;

/** What the directions looked in are called. */
public final class LookNames {

    private static final List<String> COMPASS = List.of("north", "east", "south", "west");

    private LookNames() {}

    /** As a line of a table: {@code 30° up, toward the site}. */
    public static String of(Look look) {
        if (look.id().equals(Look.ZENITH)) {
            return "Overhead";
        }
        String altitude = up(90 - look.zenithAngleDeg());
        if (look.id().equals(Look.TOWARD_SITE)) {
            return altitude + ", toward the site";
        }
        if (COMPASS.contains(look.id())) {
            return altitude + ", " + look.id();
        }
        return look.id() + " (" + altitude + ", bearing " + bearing(look) + ")";
    }

    private static String up(double altitudeDeg) {
        String degrees = QuantityFormat.atMost(Math.abs(altitudeDeg) < 1e-9 ? 0 : altitudeDeg, 3)
                        .plain() + "°";
        return altitudeDeg >= 0 ? degrees + " up" : degrees;
    }

    private static String bearing(Look look) {
        double degrees = StrictMath.toDegrees(
                StrictMath.atan2(look.direction().x(), look.direction().y()));
        return QuantityFormat.decimals((degrees + 360) % 360, 0).plain() + "°";
    }

    /** The name of a figure with the direction it belongs to. */
    public static String named(Figure figure, Observer observer) {
        String within = figure.key().substring(observer.mark().length() + 1);
        return observer.looks().stream()
                .filter(look -> within.startsWith(look.id() + "/"))
                .findFirst()
                .map(look -> figure.name() + ", " + direction(look))
                .orElse(figure.name());
    }

    private static String direction(Look look) {
        if (look.purpose() == Look.Purpose.GLARE) {
            return "looking 10° beside the site";
        }
        if (look.purpose() != Look.Purpose.SKY) {
            return "in the direction of travel";
        }
        String name = of(look);
        return look.id().equals(Look.ZENITH) ? name.toLowerCase(Locale.ROOT) : name;
    }
}
