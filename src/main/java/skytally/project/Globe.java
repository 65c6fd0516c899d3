package skytally.project;

import java.util.Optional;
import java.util.OptionalDouble;
import net.sf.geographiclib.Geodesic;
import net.sf.geographiclib.GeodesicData;
import skytally.project.Field.Subject;

/**
 * Where the reference point is on the WGS84 ellipsoid, and with it every other point: east and north are the distance
 * and bearing of the shortest way along the ground.
 *
 * @param latitudeDeg  of the reference point, north positive
 * @param longitudeDeg of the reference point, east positive
 */
public record Globe(double latitudeDeg, double longitudeDeg) {

    /** Latitude and longitude in degrees. */
    public record LatLong(double latitudeDeg, double longitudeDeg) {}

    /** Distance in metres and bearing in degrees from the reference point. */
    public record Way(double distanceM, double bearingDeg) {}

    /** Of a site that says where it is. */
    public static Optional<Globe> of(Values site) {
        OptionalDouble latitude = number("latitude", site);
        OptionalDouble longitude = number("longitude", site);
        return latitude.isEmpty() || longitude.isEmpty()
                ? Optional.empty()
                : Optional.of(new Globe(latitude.getAsDouble(), longitude.getAsDouble()));
    }

    private static OptionalDouble number(String field, Values site) {
        return Reading.of(Subject.SITE, field, site).stream()
                .mapToDouble(Reading::number)
                .findFirst();
    }

    /** The way to a point, along the geodesic. */
    public Way to(double latitude, double longitude) {
        GeodesicData way = Geodesic.WGS84.Inverse(latitudeDeg, longitudeDeg, latitude, longitude);
        return new Way(way.s12, (way.azi1 + 360) % 360);
    }

    /** The point at the end of a way, along the geodesic. */
    public LatLong at(Way way) {
        GeodesicData end = Geodesic.WGS84.Direct(latitudeDeg, longitudeDeg, way.bearingDeg, way.distanceM);
        return new LatLong(end.lat2, end.lon2);
    }
}
