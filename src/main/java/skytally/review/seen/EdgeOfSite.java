package skytally.review.seen;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import skytally.assessment.Assessment;
import skytally.figures.NumberRow;
import skytally.figures.Quantity;
import skytally.geometry.Position;
import skytally.notation.QuantityFormat;
import skytally.review.Review;
import skytally.web.Switches.Units;

/**
 * The worst point of the property line, as a part of the page.
 *
 * @param where it lies from the reference point
 * @param rows  what falls on it, each with its working
 */
record EdgeOfSite(String where, List<NumberRow> rows) {

    private static final Position REFERENCE = new Position(0, 0, 0);
    private static final List<String> MEASURES = List.of(
            "direct/worst-plane-illuminance",
            "direct/worst-plane-facing",
            "direct/level-illuminance",
            "direct/illuminance",
            "direct/one-lamp-illuminance",
            "direct/distance");

    /** Nothing where the corners of the site are not known. */
    static Optional<EdgeOfSite> of(Review review) {
        return review.shown()
                .assessment()
                .flatMap(found -> Optional.ofNullable(found.eyes().get(Assessment.PROPERTY_LINE))
                        .map(eye -> new EdgeOfSite(
                                where(eye, review.asked().units()),
                                rows(found, review.asked().units()))));
    }

    private static String where(Position eye, Units units) {
        double bearing = Math.toDegrees(REFERENCE.bearingTo(eye));
        return Quantity.length(Math.abs(eye.eastM()), 3, units) + (eye.eastM() < 0 ? " west and " : " east and ")
                + Quantity.length(Math.abs(eye.northM()), 3, units) + (eye.northM() < 0 ? " south" : " north")
                + " of the reference point, "
                + Quantity.length(REFERENCE.groundDistanceTo(eye), 3, units) + " on bearing "
                + QuantityFormat.decimals((bearing + 360) % 360, 0).plain() + "°";
    }

    private static List<NumberRow> rows(Assessment found, Units units) {
        List<NumberRow> rows = new ArrayList<>();
        for (String measure : MEASURES) {
            found.find(Assessment.PROPERTY_LINE, measure)
                    .filter(figure -> figure.range().isPresent())
                    .ifPresent(figure -> rows.add(NumberRow.of(figure, figure.name(), units, false)));
        }
        return rows;
    }
}
