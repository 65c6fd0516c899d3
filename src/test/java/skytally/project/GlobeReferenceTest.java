package skytally.project;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;

@DisplayName("Ways along the globe")
class GlobeReferenceTest {

    /**
     * Wellington to Salamanca, the example of the inverse problem in the documentation of GeographicLib: 19959679.267 m,
     * starting on 161.067669986°.
     */
    @Test
    void areThoseOfThePublishedExample() {
        Globe.Way way = new Globe(-41.32, 174.81).to(40.96, -5.50);
        assertThat(way.distanceM()).isCloseTo(19_959_679.267, within(1e-3));
        assertThat(way.bearingDeg()).isCloseTo(161.067669986, within(1e-9));
    }

    /** The example of the direct problem there: 20 000 km from Perth on 225° is at 32.11195529°, -63.95925278°. */
    @Test
    void endWhereThePublishedExampleEnds() {
        Globe.LatLong end = new Globe(-32.06, 115.74).at(new Globe.Way(20_000_000, 225));
        assertThat(end.latitudeDeg()).isCloseTo(32.11195529, within(1e-8));
        assertThat(end.longitudeDeg()).isCloseTo(-63.95925278, within(1e-8));
    }

    /**
     * Independent of the library, over a short way: a small step north is M dφ and one east is N cos φ dλ, with the radii
     * of curvature of WGS84 (a = 6378137 m, f = 1/298.257223563) worked out here.
     */
    @Test
    void areCloseByWhatTheRadiiOfCurvatureGive() {
        double a = 6_378_137;
        double f = 1 / 298.257223563;
        double e2 = f * (2 - f);
        double latitude = Math.toRadians(52.4);
        double w2 = 1 - e2 * Math.pow(Math.sin(latitude), 2);
        double m = a * (1 - e2) / Math.pow(w2, 1.5);
        double n = a / Math.sqrt(w2);
        Globe.Way north = new Globe(52.4, -25).to(52.401, -25);
        assertThat(north.distanceM()).isCloseTo(m * Math.toRadians(0.001), within(0.001));
        assertThat(north.bearingDeg()).isCloseTo(0, within(1e-9));
        Globe.Way west = new Globe(52.4, -25).to(52.4, -25.001);
        assertThat(west.distanceM()).isCloseTo(n * Math.cos(latitude) * Math.toRadians(0.001), within(0.001));
        assertThat(west.bearingDeg()).isCloseTo(270, within(0.001));
    }

    @Test
    void leadThereAndBack() {
        Globe globe = new Globe(-33.5, 100);
        Globe.LatLong end = globe.at(new Globe.Way(8200, 342.4));
        Globe.Way way = globe.to(end.latitudeDeg(), end.longitudeDeg());
        assertThat(way.distanceM()).isCloseTo(8200, within(1e-6));
        assertThat(way.bearingDeg()).isCloseTo(342.4, within(1e-9));
    }
}
