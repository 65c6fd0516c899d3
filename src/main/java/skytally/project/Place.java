package skytally.project;

import java.util.List;

/**
 * A place somebody looks from.
 *
 * @param mark    unique in the project
 * @param values  what was said of it
 * @param looks   named directions looked at from it
 * @param horizon altitude of the skyline by bearing, rising in bearing; empty where it is open
 */
public record Place(String mark, Values values, List<NamedLook> looks, List<HorizonPoint> horizon) {

    /** A direction looked at: bearing clockwise from true north and altitude, both in degrees. */
    public record NamedLook(String name, double bearingDeg, double altitudeDeg) {

        public NamedLook {
            if (!(bearingDeg >= 0 && bearingDeg < 360 && altitudeDeg >= -90 && altitudeDeg <= 90)) {
                throw new IllegalArgumentException("A direction has a bearing of 0 to 360 and an altitude of -90 to 90"
                        + " degrees, not " + bearingDeg + " and " + altitudeDeg);
            }
        }
    }

    /** One point of the skyline, in degrees. */
    public record HorizonPoint(double bearingDeg, double altitudeDeg) {

        public HorizonPoint {
            if (!(bearingDeg >= 0 && bearingDeg < 360 && altitudeDeg >= -90 && altitudeDeg < 90)) {
                throw new IllegalArgumentException("A point of the skyline has a bearing of 0 to 360 and an altitude of"
                        + " -90 to 90 degrees, not " + bearingDeg + " and " + altitudeDeg);
            }
        }
    }

    public Place {
        Mark.require(mark);
        looks = List.copyOf(looks);
        horizon = List.copyOf(horizon);
    }
}
