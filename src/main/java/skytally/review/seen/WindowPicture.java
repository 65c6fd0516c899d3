package skytally.review.seen;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import skytally.assessment.SeenLamps;
import skytally.assessment.SeenLamps.SeenLamp;
import skytally.charts.WindowView;
import skytally.charts.WindowView.Size;
import skytally.notation.QuantityFormat;
import skytally.project.Place;
import skytally.review.Review;
import skytally.review.TypeNames;
import skytally.review.Whereabouts;
import skytally.scene.Observer;

/**
 * The view from a place, drawn for a desk and for a telephone.
 *
 * @param wide   as one SVG element
 * @param narrow the same
 * @param says   the picture in words
 */
record WindowPicture(String wide, String narrow, String says) {

    private static final int LETTERS_WIDE = 34;
    private static final int LETTERS_NARROW = 24;

    /** Nothing where no lamp sends light to the eye. */
    static Optional<WindowPicture> of(Review review, Place place, Observer observer, TypeNames names) {
        List<SeenLamp> seen = SeenLamps.at(review.shown().scene(), observer);
        if (seen.isEmpty()) {
            return Optional.empty();
        }
        OptionalDouble ground = new Whereabouts(review.project(), place, observer).groundDeg();
        String title = "The view from " + place.mark() + " toward the lights, "
                + review.asked().hour().word();
        String says = says(seen);
        return Optional.of(new WindowPicture(
                new WindowView(
                                "view-wide",
                                title,
                                says,
                                seen,
                                ground,
                                type -> names.of(type).onPicture(LETTERS_WIDE),
                                Size.WIDE)
                        .svg(),
                new WindowView(
                                "view-narrow",
                                title,
                                says,
                                seen,
                                ground,
                                type -> names.of(type).onPicture(LETTERS_NARROW),
                                Size.NARROW)
                        .svg(),
                says));
    }

    private static String says(List<SeenLamp> seen) {
        double highest = seen.stream().mapToDouble(SeenLamp::altitudeDeg).max().orElse(0);
        double lowest = seen.stream().mapToDouble(SeenLamp::altitudeDeg).min().orElse(0);
        SeenLamp brightest =
                seen.stream().reduce((a, b) -> a.allLx() >= b.allLx() ? a : b).orElseThrow();
        String lights = seen.size() == 1 ? "One light sends" : "Lights at " + seen.size() + " points send";
        String between = level(lowest).equals(level(highest))
                ? level(lowest)
                : "from " + level(lowest) + " to " + level(highest);
        return lights + " light here, " + between + ". The brightest, " + brightest.mark() + ", stands on bearing "
                + QuantityFormat.decimals(brightest.bearingDeg(), 1).plain() + "°, " + level(brightest.altitudeDeg())
                + ".";
    }

    private static String level(double altitudeDeg) {
        if (Math.abs(altitudeDeg) < 0.05) {
            return "level";
        }
        return degrees(Math.abs(altitudeDeg)) + (altitudeDeg < 0 ? " below level" : " above level");
    }

    private static String degrees(double value) {
        return QuantityFormat.decimals(value, 1).plain() + "°";
    }
}
