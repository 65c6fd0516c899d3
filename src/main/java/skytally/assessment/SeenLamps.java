package skytally.assessment;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import skytally.atmosphere.Atmosphere;
import skytally.atmosphere.DirectPath;
import skytally.geometry.Direction;
import skytally.geometry.Position;
import skytally.scene.Lamp;
import skytally.scene.Observer;
import skytally.scene.Scene;
import skytally.spectrum.Spectrum;

/**
 * The lamps of a scene as one eye has them before it, each with its own light: where a picture of them is drawn from.
 * Their light adds up to the light at the eye of the assessment.
 */
public final class SeenLamps {

    private SeenLamps() {}

    /**
     * Lamps that hang at one point in one attitude, as seen.
     *
     * @param mark       of the light
     * @param type       mark of its type
     * @param at         where it hangs
     * @param bearingDeg of it seen from the eye, clockwise from north, 0 to 360
     * @param altitudeDeg above the level of the eye
     * @param oneLx      light of one of them at the eye, through the air
     * @param allLx      light of all that hang there
     */
    public record SeenLamp(
            String mark, String type, Position at, double bearingDeg, double altitudeDeg, double oneLx, double allLx) {}

    /** Every lamp that sends light to the eye, in the order of the scene; one behind the horizon or the ground does not. */
    public static List<SeenLamp> at(Scene scene, Observer observer) {
        Atmosphere air = scene.surroundings().air();
        Map<Spectrum, LuminousTransmission> passed = new HashMap<>();
        List<SeenLamp> seen = new ArrayList<>();
        for (Lamp lamp : scene.lamps()) {
            DirectPath path = path(lamp.position(), observer.eye());
            boolean inView = path.clearsTheHorizon() && !observer.ground().hides(lamp.position(), observer.eye());
            double perLumen = inView ? perLumen(lamp, observer.eye(), path) : 0;
            if (perLumen > 0) {
                double through = passed.computeIfAbsent(
                                lamp.spectrum(), spectrum -> new LuminousTransmission(spectrum, air))
                        .along(path, air);
                double one = lamp.flux().lumens() * perLumen * through / (path.lengthM() * path.lengthM());
                if (one * lamp.count() > 0) {
                    seen.add(seen(lamp, observer.eye(), path, one));
                }
            }
        }
        return seen;
    }

    /** Altitude of a point above the level of an eye, in degrees, over the curve of the Earth. */
    public static double altitudeDeg(Position point, Position eye) {
        return StrictMath.toDegrees(path(point, eye).altitudeAtEyeRad());
    }

    private static DirectPath path(Position lamp, Position eye) {
        return DirectPath.between(lamp.heightM(), eye.heightM(), lamp.groundDistanceTo(eye));
    }

    private static double perLumen(Lamp lamp, Position eye, DirectPath path) {
        Direction toEye = Direction.toward(lamp.position().bearingTo(eye), path.altitudeAtLampRad());
        Direction own = lamp.attitude().rotation().turnBack(toEye);
        return lamp.light().perLumen(own.x(), own.y(), own.z());
    }

    private static SeenLamp seen(Lamp lamp, Position eye, DirectPath path, double one) {
        double bearing = StrictMath.toDegrees(eye.bearingTo(lamp.position()));
        return new SeenLamp(
                lamp.mark(),
                lamp.type(),
                lamp.position(),
                (bearing + 360) % 360,
                StrictMath.toDegrees(path.altitudeAtEyeRad()),
                one,
                one * lamp.count());
    }
}
