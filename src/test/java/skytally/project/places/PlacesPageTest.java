package skytally.project.places;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.UUID;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.boot.test.context.SpringBootTest;
import org.springframework.boot.test.web.server.LocalServerPort;
import skytally.project.Pages;
import skytally.project.Place;
import skytally.project.Project;
import skytally.project.Projects;
import skytally.project.Saving;

@DisplayName("Places typed in each way")
@SpringBootTest(webEnvironment = SpringBootTest.WebEnvironment.RANDOM_PORT)
class PlacesPageTest {

    @LocalServerPort
    private int port;

    @Autowired
    private Projects projects;

    private Pages pages;
    private UUID id;
    private String at;

    @BeforeEach
    void anEmptyProject() {
        pages = new Pages(port);
        id = UUID.randomUUID();
        projects.add(Project.named(id, "Ground"), Saving.by("", ""));
        at = "/projects/" + id;
    }

    private Place place(String mark) {
        return projects.find(id).orElseThrow().project().place(mark).orElseThrow();
    }

    private double metres(String mark, String field) {
        return Double.parseDouble(place(mark).values().text(field));
    }

    private Pages.Page siteAt(String latitude, String longitude) throws Exception {
        return pages.post(
                at + "/site",
                "why",
                "test",
                "latitude",
                latitude,
                "latitude-unit",
                "°",
                "longitude",
                longitude,
                "longitude-unit",
                "°");
    }

    private Pages.Page onGlobe(String latitude, String longitude) throws Exception {
        return pages.post(
                at + "/places?add=globe",
                "add",
                "globe",
                "mark",
                "V1",
                "why",
                "test",
                "latitude",
                latitude,
                "latitude-unit",
                "°",
                "longitude",
                longitude,
                "longitude-unit",
                "°");
    }

    @Test
    void onTheGlobeNeedASiteThatSaysWhereItIs() throws Exception {
        Pages.Page page = onGlobe("52.4", "-25");
        assertThat(page.status()).isEqualTo(400);
        assertThat(page.words()).contains("The site has no latitude and longitude yet.");
        siteAt("52.4", "-25");
        page = onGlobe("-52.4", "-25");
        assertThat(page.status()).isEqualTo(400);
        assertThat(page.words()).contains("km from the reference point; at most 1000 km fit");
        page = onGlobe("95", "-25");
        assertThat(page.words()).contains("Latitude, north positive: “95 °” is outside what may be typed, -90 to 90 °");
    }

    /**
     * North along a meridian of WGS84 from 52.4° to 52.41°: a(1-e²)/(1-e² sin² 52.405°)^1.5 × 0.01° in radians = 1112.750 m,
     * worked out apart from the library.
     */
    @Test
    void onTheGlobeAreShownInAllThreeWays() throws Exception {
        siteAt("52.4", "-25");
        Pages.Page page = onGlobe("52.41", "-25");
        assertThat(page.words()).contains("The place was added.");
        assertThat(metres("V1", "east")).isCloseTo(0, within(0.005));
        assertThat(metres("V1", "north")).isCloseTo(1112.75, within(0.01));
        assertThat(place("V1").values().get("north").inUse().source().reason())
                .startsWith("latitude 52.41°, longitude -25°, by the geodesic of WGS84 from the reference point");
        assertThat(page.words())
                .contains("0.0 m east, 1 112.8 m north 1 112.8 m on a bearing of 0.0° 52.41000° N, 25.00000° W");
        assertThat(pages.get(at + "/places/V1").words()).contains("1 112.8 m on a bearing of 0.0° 52.41000° N");
    }

    @Test
    void moveInOneWayAtATime() throws Exception {
        siteAt("52.4", "-25");
        onGlobe("52.41", "-25");
        String[] polar = {
            "doing",
            "save",
            "why",
            "test",
            "distance",
            "100",
            "distance-unit",
            "m",
            "direction",
            "90",
            "direction-unit",
            "°"
        };
        pages.post(at + "/places/V1", polar);
        assertThat(metres("V1", "east")).isEqualTo(100);
        String[] both = {
            "doing",
            "save",
            "why",
            "test",
            "distance",
            "100",
            "distance-unit",
            "m",
            "direction",
            "90",
            "direction-unit",
            "°",
            "latitude",
            "52.41",
            "latitude-unit",
            "°",
            "longitude",
            "-25",
            "longitude-unit",
            "°"
        };
        Pages.Page page = pages.post(at + "/places/V1", both);
        assertThat(page.status()).isEqualTo(400);
        assertThat(page.words()).contains("The position was typed in two ways.");
        page = pages.post(at + "/places/V1", "doing", "save", "why", "test", "latitude", "52.41", "latitude-unit", "°");
        assertThat(page.words()).contains("Longitude, east positive: fill this in");
    }

    @Test
    void keepTheGroundTowardTheSite() throws Exception {
        siteAt("52.4", "-25");
        onGlobe("52.41", "-25");
        Pages.Page page = pages.post(
                at + "/places/V1",
                "doing",
                "save",
                "ground",
                "1000 118\n\n 0 96 ",
                "looks",
                "camp 200 12.5",
                "horizon",
                "");
        assertThat(page.words()).contains("Saved.");
        assertThat(place("V1").ground())
                .containsExactly(new Place.GroundPoint(0, 96), new Place.GroundPoint(1000, 118));
        assertThat(page.body()).contains("0 96\n1000 118</textarea>");
        for (String[] wrong : new String[][] {
            {"0 96\nhill 100 3", "Line 2, “hill 100 3”: Write a distance and a height in metres"},
            {"0", "Line 1, “0”: Write a distance and a height in metres"},
            {"0 9\n0 10", "Two points of the ground have the distance 0."},
            {"0 99999", "Line 1, “0 99999”: A point of the ground lies 0 to 1000000 m away and -430 to 9000 m"},
            {"1 1\n".repeat(1001), "At most 1000 lines fit."},
        }) {
            page = pages.post(at + "/places/V1", "doing", "save", "ground", wrong[0]);
            assertThat(page.status()).isEqualTo(400);
            assertThat(page.words()).contains(wrong[1]);
        }
        assertThat(place("V1").ground()).hasSize(2);
        pages.post(at + "/places/V1", "doing", "rename", "mark", "V9");
        assertThat(place("V9").ground()).hasSize(2);
    }
}
