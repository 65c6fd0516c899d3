package skytally.assessment;

import java.util.EnumSet;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import skytally.scene.Look;
import skytally.scene.Observer;

/** The numbers worked out for every place, and for every direction looked in there. */
enum Measure {
    DISTANCE(null, "direct/distance", "Distance along the line of sight", Unit.METRE),
    ALTITUDE(null, "direct/altitude", "Height of the light above the level of the eye", Unit.DEGREE),
    INTENSITY(null, "direct/intensity", "Strength of one lamp toward the place", Unit.CANDELA),
    ONE_ILLUMINANCE(null, "direct/one-lamp-illuminance", "Light at the eye from the brightest single lamp", Unit.LUX),
    ILLUMINANCE(null, "direct/illuminance", "Light at the eye from all lamps together", Unit.LUX),
    WINDOW_ILLUMINANCE(null, "direct/window-illuminance", "Light on the window, outside of the glass", Unit.LUX),
    WORST_PLANE(null, "direct/worst-plane-illuminance", "Light on the upright plane that gets most", Unit.LUX),
    WORST_PLANE_FACING(null, "direct/worst-plane-facing", "Bearing that plane faces", Unit.DEGREE),
    LEVEL_ILLUMINANCE(null, "direct/level-illuminance", "Light on a level plane there, facing up", Unit.LUX),
    WINDOW_WORST(null, "direct/window-worst-illuminance", "Light on the brightest point of the window", Unit.LUX),
    ONE_MAGNITUDE(null, "direct/one-lamp-magnitude", "Magnitude of the brightest single lamp", Unit.MAGNITUDE),
    MAGNITUDE(null, "direct/magnitude", "Magnitude of all lamps together", Unit.MAGNITUDE),
    ONE_STAR(null, "direct/one-lamp-star-overhead", "Star overhead that equals one lamp", Unit.MAGNITUDE),
    STAR(null, "direct/star-overhead", "Star overhead that equals all together", Unit.MAGNITUDE),
    STANDARD_MAGNITUDE(
            null, "direct/one-lamp-standard-magnitude", "Magnitude of one lamp at 1 km without air", Unit.MAGNITUDE),
    SCOTOPIC_MAGNITUDE(
            null,
            "direct/one-lamp-magnitude-dark-adapted",
            "Magnitude of one lamp to the dark-adapted eye, against a Sun-like star",
            Unit.MAGNITUDE),
    ANGULAR_SIZE(null, "direct/angular-size", "Width of the bright part as seen", Unit.ARCMINUTE),
    NOTICED_TO(null, "direct/noticed-to", "Distance to which one lamp is reliably noticed", Unit.METRE),
    DETECTED_TO(null, "direct/detected-to", "Distance to which one lamp can just be made out", Unit.METRE),
    UPWARD_SHARE(null, "lamp/upward-share", "Share sent above the level as it hangs", Unit.SHARE_PERCENT),
    LOW_SHARE(null, "lamp/low-angle-share", "Share sent between the level and 10° above it", Unit.SHARE_PERCENT),

    GLARE_ANGLE(Look.Purpose.GLARE, "glare/angle", "Angle between the lights and where one looks", Unit.DEGREE),
    VEIL(Look.Purpose.GLARE, "glare/veil", "Veil in the eye", Unit.CANDELA_PER_SQUARE_METRE),
    VEIL_BRIGHTNESS(
            Look.Purpose.GLARE, "glare/veil-brightness", "The veil as a sky", Unit.MAGNITUDE_PER_SQUARE_ARCSECOND),
    VEIL_NATURAL_SKIES(Look.Purpose.GLARE, "glare/natural-skies", "The veil in natural skies", Unit.NATURAL_SKIES),
    VEIL_REACH(Look.Purpose.GLARE, "glare/reach", "Angle inside which the veil exceeds a natural sky", Unit.DEGREE),
    HALO(Look.Purpose.GLARE, "glare/halo", "Light the air scatters there", Unit.CANDELA_PER_SQUARE_METRE),

    LIMIT_BESIDE(
            Look.Purpose.GLARE,
            "eye/limit-in-view",
            "Faintest star beside the lights, with them in view",
            Unit.MAGNITUDE),

    ROAD_VEIL(Look.Purpose.ROAD, "glare/veil", "Veil in a driver's eye", Unit.CANDELA_PER_SQUARE_METRE),
    THRESHOLD_INCREMENT(Look.Purpose.ROAD, "glare/threshold-increment", "Threshold increment", Unit.PERCENT),

    SKY_ARTIFICIAL(Look.Purpose.SKY, "sky/artificial", "Sky glow of the lights", Unit.CANDELA_PER_SQUARE_METRE),
    SKY_NATURAL(Look.Purpose.SKY, "sky/natural", "Natural sky", Unit.CANDELA_PER_SQUARE_METRE),
    SKY_NATURAL_BRIGHTNESS(
            Look.Purpose.SKY, "sky/natural-brightness", "Natural sky", Unit.MAGNITUDE_PER_SQUARE_ARCSECOND),
    SKY_PRESENT(Look.Purpose.SKY, "sky/present", "Sky as it is", Unit.CANDELA_PER_SQUARE_METRE),
    SKY_PRESENT_BRIGHTNESS(
            Look.Purpose.SKY, "sky/present-brightness", "Sky as it is", Unit.MAGNITUDE_PER_SQUARE_ARCSECOND),
    SKY_LUMINANCE(Look.Purpose.SKY, "sky/luminance", "Sky with the lights", Unit.CANDELA_PER_SQUARE_METRE),
    SKY_BRIGHTNESS(Look.Purpose.SKY, "sky/brightness", "Sky with the lights", Unit.MAGNITUDE_PER_SQUARE_ARCSECOND),
    SKY_INCREASE(Look.Purpose.SKY, "sky/increase", "Increase over the natural sky, V band", Unit.PERCENT),
    SKY_INCREASE_OVER_PRESENT(
            Look.Purpose.SKY, "sky/increase-over-present", "Increase over the sky as it is, V band", Unit.PERCENT),
    LIMIT_NATURAL(Look.Purpose.SKY, "eye/limit-natural", "Faintest star under the natural sky", Unit.MAGNITUDE),
    LIMIT_PRESENT(Look.Purpose.SKY, "eye/limit-present", "Faintest star under the sky as it is", Unit.MAGNITUDE),
    LIMIT(Look.Purpose.SKY, "eye/limit", "Faintest star with the lights", Unit.MAGNITUDE),
    STARS_NATURAL(Look.Purpose.SKY, "eye/stars-natural", "Stars above the horizon under the natural sky", Unit.STARS),
    STARS_PRESENT(Look.Purpose.SKY, "eye/stars-present", "Stars above the horizon under the sky as it is", Unit.STARS),
    STARS(Look.Purpose.SKY, "eye/stars", "Stars above the horizon with the lights", Unit.STARS);

    private final Look.@Nullable Purpose purpose;
    private final String path;
    private final String title;
    private final Unit unit;

    Measure(Look.@Nullable Purpose purpose, String path, String title, Unit unit) {
        this.purpose = purpose;
        this.path = path;
        this.title = title;
        this.unit = unit;
    }

    private static final Set<Measure> OVERHEAD = EnumSet.of(STARS, STARS_NATURAL, STARS_PRESENT);
    private static final Set<Measure> OF_PRESENT = EnumSet.of(
            SKY_PRESENT,
            SKY_PRESENT_BRIGHTNESS,
            SKY_LUMINANCE,
            SKY_INCREASE_OVER_PRESENT,
            LIMIT_PRESENT,
            STARS_PRESENT);

    /** Whether it is asked of a place as a whole rather than of a direction looked in. */
    boolean isOf(Observer observer) {
        return purpose == null && (this != WINDOW_WORST || observer.pane().isPresent());
    }

    /** Whether it is asked of a direction looked in, in a scene that tells of the present sky or does not. */
    boolean isOf(Look look, boolean presentKnown) {
        return purpose == look.purpose()
                && (!OVERHEAD.contains(this) || look.id().equals(Look.ZENITH))
                && (presentKnown || !OF_PRESENT.contains(this));
    }

    String title() {
        return title;
    }

    Unit unit() {
        return unit;
    }

    /** Its path within a place. */
    String path(Look look) {
        return look.id() + "/" + path;
    }

    String path() {
        return path;
    }
}
