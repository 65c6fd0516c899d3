package skytally.review;

import java.math.BigDecimal;
import java.util.Optional;
import java.util.OptionalDouble;
import skytally.assessment.SeenLamps;
import skytally.figures.Quantity;
import skytally.geometry.Position;
import skytally.notation.QuantityFormat;
import skytally.project.Field.Subject;
import skytally.project.Fields;
import skytally.project.Place;
import skytally.project.Project;
import skytally.project.entry.Amount;
import skytally.scene.Observer;
import skytally.web.Switches.Units;

/** Where a place lies from the reference point of the project, in words. */
public final class Whereabouts {

    private static final double SAME_SPOT_M = 1;
    private static final double LEVEL_M = 0.05;

    private final Place place;
    private final Observer observer;
    private final Position reference;

    public Whereabouts(Project project, Place place, Observer observer) {
        this.place = place;
        this.observer = observer;
        double siteGround = Amount.of(project.site().get("groundHeight").inUse())
                .map(BigDecimal::doubleValue)
                .orElse(0.0);
        double ownGround = Amount.of(place.values().get("groundHeight").inUse())
                .map(BigDecimal::doubleValue)
                .orElse(siteGround);
        reference =
                new Position(0, 0, Math.max(0, observer.eye().heightM() - eyeAboveGroundM() - ownGround + siteGround));
    }

    /** Of the eye above its own ground, in metres. */
    private double eyeAboveGroundM() {
        return Amount.of(place.values().get("eyeHeight").inUse())
                .map(BigDecimal::doubleValue)
                .orElseGet(() -> Double.parseDouble(Fields.find(Subject.PLACE, "eyeHeight")
                        .orElseThrow()
                        .standIn()
                        .orElseThrow()
                        .likely()));
    }

    /** Such as {@code 6 km from the reference point of the site on bearing 28°, the eye 158 m above the ground at the reference point}. */
    public String said(Units units) {
        double distance = reference.groundDistanceTo(observer.eye());
        String above = height(units);
        if (distance < SAME_SPOT_M) {
            return "At the reference point of the site, " + above + ".";
        }
        double bearing = (StrictMath.toDegrees(reference.bearingTo(observer.eye())) + 360) % 360;
        return Quantity.length(distance, 2, units) + " from the reference point of the site on bearing "
                + QuantityFormat.decimals(bearing, 0).plain() + "°, " + above + ".";
    }

    private String height(Units units) {
        double rise = observer.eye().heightM() - reference.heightM();
        if (Math.abs(rise) < LEVEL_M) {
            return "the eye level with the ground at the reference point";
        }
        return "the eye " + Quantity.length(Math.abs(rise), 2, units) + (rise > 0 ? " above" : " below")
                + " the ground at the reference point";
    }

    /** How high the eye is above its own ground. */
    public String eyeHeight(Units units) {
        return Quantity.length(eyeAboveGroundM(), 2, units).plain();
    }

    /** Which way the window or wall there faces, in degrees from north. */
    public String facing() {
        double degrees = StrictMath.toDegrees(
                StrictMath.atan2(observer.facing().x(), observer.facing().y()));
        return QuantityFormat.decimals((degrees + 360) % 360, 0).plain() + "°";
    }

    /** Altitude of the ground at the reference point, as the eye sees it; nothing for an eye that stands there. */
    public OptionalDouble groundDeg() {
        return reference.groundDistanceTo(observer.eye()) < SAME_SPOT_M
                ? OptionalDouble.empty()
                : OptionalDouble.of(SeenLamps.altitudeDeg(reference, observer.eye()));
    }

    /** The kind of a place, as the choices are named; nothing where nobody said. */
    public static Optional<String> kind(Place place) {
        String kind = place.values().text("kind");
        return kind.isEmpty() ? Optional.empty() : Optional.of(kind);
    }
}
