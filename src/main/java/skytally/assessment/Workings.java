package skytally.assessment;

import skytally.eye.PointVisibility;
import skytally.scene.OpenScene;

/**
 * Shows how each number of a place was worked out: the formula, the same with the numbers in it, what went in and how
 * well that is known. Inputs are given to five figures, so that the result can be found again by hand to the digits
 * printed.
 */
final class Workings {

    private final DirectWorkings direct;
    private final GlareWorkings glare;
    private final SkyWorkings sky;

    Workings(PlaceNumbers numbers, OpenScene open) {
        this.direct = new DirectWorkings(numbers, open);
        this.glare = new GlareWorkings(numbers, open);
        this.sky = new SkyWorkings(numbers, open);
    }

    /** The working of a number of the place. */
    Working of(Measure measure) {
        return switch (measure) {
            case DISTANCE -> direct.distance();
            case ALTITUDE -> direct.altitude();
            case INTENSITY -> direct.intensity();
            case ONE_ILLUMINANCE -> direct.oneIlluminance();
            case ILLUMINANCE -> direct.illuminance();
            case WINDOW_ILLUMINANCE -> direct.window();
            case WORST_PLANE -> direct.worstPlane();
            case WORST_PLANE_FACING -> direct.worstPlaneFacing();
            case LEVEL_ILLUMINANCE -> direct.level();
            case WINDOW_WORST -> direct.worstOfWindow();
            case ONE_MAGNITUDE -> direct.magnitude("m₁", "E₁", Measure.ONE_ILLUMINANCE, Measure.ONE_MAGNITUDE);
            case MAGNITUDE -> direct.magnitude("m", "E", Measure.ILLUMINANCE, Measure.MAGNITUDE);
            case ONE_STAR -> direct.star("m₁", Measure.ONE_MAGNITUDE, Measure.ONE_STAR);
            case STAR -> direct.star("m", Measure.MAGNITUDE, Measure.STAR);
            case STANDARD_MAGNITUDE -> direct.standardMagnitude();
            case SCOTOPIC_MAGNITUDE -> direct.darkAdapted();
            case ANGULAR_SIZE -> direct.angularSize();
            case NOTICED_TO ->
                direct.seenTo(Measure.NOTICED_TO, PointVisibility.NAVIGATION_PRACTICE.lux(), "navigation-practice");
            case DETECTED_TO ->
                direct.seenTo(
                        Measure.DETECTED_TO,
                        PointVisibility.detection(PlaceNumbers.naturalOnVisualScale())
                                .lux(),
                        "crumey-2014");
            case UPWARD_SHARE -> direct.share("the level", Measure.UPWARD_SHARE);
            case LOW_SHARE -> direct.share("the level and below 10°", Measure.LOW_SHARE);
            default -> throw new IllegalArgumentException(measure + " belongs to a direction");
        };
    }

    /** The working of a number of one direction looked in. */
    Working of(Measure measure, int look) {
        return switch (measure) {
            case GLARE_ANGLE -> glare.glareAngle(look);
            case VEIL -> glare.veil(look);
            case VEIL_BRIGHTNESS -> glare.veilBrightness(look);
            case VEIL_NATURAL_SKIES -> glare.veilInSkies(look);
            case VEIL_REACH -> glare.veilReach(look);
            case HALO -> glare.halo(look);
            case LIMIT_BESIDE -> glare.limitBeside(look);
            case ROAD_VEIL -> glare.roadVeil(look);
            case THRESHOLD_INCREMENT -> glare.thresholdIncrement(look);
            case SKY_ARTIFICIAL -> sky.artificial(look);
            case SKY_NATURAL -> sky.naturalLuminance(look);
            case SKY_NATURAL_BRIGHTNESS -> sky.naturalBrightness(look);
            case SKY_PRESENT -> sky.presentLuminance(look);
            case SKY_PRESENT_BRIGHTNESS -> sky.presentBrightness(look);
            case SKY_LUMINANCE -> sky.luminance(look);
            case SKY_BRIGHTNESS -> sky.brightness(look);
            case SKY_INCREASE -> sky.increase(look);
            case SKY_INCREASE_OVER_PRESENT -> sky.increaseOverPresent(look);
            case LIMIT_NATURAL -> sky.limit(look, Measure.SKY_NATURAL_BRIGHTNESS, Measure.LIMIT_NATURAL);
            case LIMIT_PRESENT -> sky.limit(look, Measure.SKY_PRESENT_BRIGHTNESS, Measure.LIMIT_PRESENT);
            case LIMIT -> sky.limit(look, Measure.SKY_BRIGHTNESS, Measure.LIMIT);
            case STARS_NATURAL -> sky.stars(look, Measure.LIMIT_NATURAL, Measure.STARS_NATURAL);
            case STARS_PRESENT -> sky.stars(look, Measure.LIMIT_PRESENT, Measure.STARS_PRESENT);
            case STARS -> sky.stars(look, Measure.LIMIT, Measure.STARS);
            default -> throw new IllegalArgumentException(measure + " belongs to the place");
        };
    }
}
