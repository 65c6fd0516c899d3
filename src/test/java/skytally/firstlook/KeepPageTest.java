package skytally.firstlook;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.UUID;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.boot.test.context.SpringBootTest;
import org.springframework.boot.test.web.server.LocalServerPort;
import skytally.project.Claim;
import skytally.project.Project;
import skytally.project.Projects;
import skytally.project.SceneDrawing;
import skytally.project.Scheme;
import skytally.project.Values;
import skytally.project.shelf.Visitor;
import skytally.project.shelf.Visitor.Page;
import skytally.scene.State;

@DisplayName("A first look kept as a project")
@SpringBootTest(webEnvironment = SpringBootTest.WebEnvironment.RANDOM_PORT)
class KeepPageTest {

    @LocalServerPort
    private int port;

    @Autowired
    private Projects projects;

    private Project kept(String... sent) throws Exception {
        Page front = new Visitor(port).post("/keep", sent);
        assertThat(front.path()).endsWith("?done=kept");
        assertThat(front.body()).contains("Your first look is kept as a project.");
        return projects.find(UUID.fromString(front.id())).orElseThrow().project();
    }

    @Test
    void isOfferedWithATitleAndEverythingTyped() throws Exception {
        String page = new Visitor(port)
                .get("/?count=24&lumens=5200&distanceM=300&units=us")
                .body();

        assertThat(page)
                .contains("action=\"/keep\"", "24 lights of 5\u00a0200 lm, 300 m away")
                .contains("<input type=\"hidden\" name=\"distanceM\" value=\"300\">")
                .doesNotContain("<input type=\"hidden\" name=\"mountingHeightM\"");
    }

    @Test
    void holdsWhatWasTypedAsGivenAndLeavesGuessesOpen() throws Exception {
        Project project = kept(
                "title",
                "Lamps <b>",
                "count",
                "3",
                "lumens",
                "5200",
                "distanceM",
                "300",
                "shape",
                "beam-60",
                "tiltDeg",
                "15",
                "air",
                "hazy",
                "glareAngleDeg",
                "7");

        assertThat(project.title()).isEqualTo("Lamps <b>");
        Scheme scheme = project.scheme("proposed").orElseThrow();
        Values type = scheme.type("L1").orElseThrow().values();
        assertThat(type.get("lumens").inUse().state()).isEqualTo(State.GIVEN);
        assertThat(type.get("lumens").inUse().source().reason()).isEqualTo("your sentence");
        assertThat(type.text("tilt")).isEqualTo("15");
        assertThat(type.text("shape")).isEqualTo("beam-60");
        assertThat(type.get("mountingHeight").inUse().state()).isEqualTo(State.NOT_KNOWN);
        assertThat(type.get("spectralClass").inUse().state()).isEqualTo(State.NOT_KNOWN);
        assertThat(scheme.placements()).hasSize(3);
        Values place = project.place("P1").orElseThrow().values();
        assertThat(place.text("north")).isEqualTo("300");
        assertThat(place.text("east")).isEqualTo("0");
        assertThat(place.get("eyeHeight").inUse().state()).isEqualTo(State.NOT_KNOWN);
        assertThat(place.text("note")).isEqualTo("Looked at 7° beside the lights.");
        assertThat(project.site().text("air")).isEqualTo("hazy");
        assertThat(project.site().get("groundReflectance").inUse().state()).isEqualTo(State.NOT_KNOWN);
        SceneDrawing.Drawn drawn = SceneDrawing.of(project, scheme, SceneDrawing.Period.EARLY);
        assertThat(drawn.leftOut()).isEmpty();
        assertThat(drawn.unplaced()).isEmpty();
    }

    @Test
    void assumesWhatAProjectHasNoStandInFor() throws Exception {
        Project project = kept("title", "All guessed", "shape", "self-lit-panel");

        Values type = project.scheme("proposed")
                .orElseThrow()
                .type("L1")
                .orElseThrow()
                .values();
        Claim lumens = type.get("lumens").inUse();
        assertThat(lumens.state()).isEqualTo(State.ASSUMED);
        assertThat(lumens.low() + " " + lumens.value() + " " + lumens.high()).isEqualTo("3500 5200 8000");
        assertThat(type.text("tilt")).isEqualTo("90");
        assertThat(type.get("tilt").inUse().source().reason()).isEqualTo("This kind of fitting stands upright.");
    }

    @Test
    void keepsAnyAnswerWithoutAnythingTypedAgain() throws Exception {
        Visitor visitor = new Visitor(port);
        String page = visitor.get("/?form=sentence&units=us&count=2&lumens=9000&mountingHeightFt=20&distanceFt=1000"
                        + "&tiltDeg=15&shape=flat-area&guessed=shape")
                .body();
        assertThat(page).contains("href=\"#keep\"", "id=\"keep\"");
        String form = page.substring(page.indexOf("id=\"keep\""), page.indexOf("</form>", page.indexOf("id=\"keep\"")));
        List<String> sent = new ArrayList<>(List.of("title", "In feet"));
        Matcher hidden = Pattern.compile("type=\"hidden\" name=\"(?!_csrf)([^\"]+)\" value=\"([^\"]*)\"")
                .matcher(form);
        while (hidden.find()) {
            sent.addAll(List.of(hidden.group(1), hidden.group(2)));
        }

        Project project = kept(sent.toArray(String[]::new));
        Values type = project.scheme("proposed")
                .orElseThrow()
                .type("L1")
                .orElseThrow()
                .values();
        assertThat(Double.parseDouble(type.text("mountingHeight"))).isCloseTo(6.096, within(1e-6));
        assertThat(type.text("tilt")).isEqualTo("15");
        assertThat(Double.parseDouble(project.place("P1").orElseThrow().values().text("north")))
                .isCloseTo(304.8, within(1e-6));
        assertThat(type.get("shape").inUse().state()).isEqualTo(State.NOT_KNOWN);
    }

    @Test
    void asksAgainForATitleWithTheSentenceStillThere() throws Exception {
        int before = projects.list().size();

        Page page = new Visitor(port).post("/keep", "title", " ", "lumens", "6000");
        assertThat(page.status()).isEqualTo(400);
        assertThat(page.body()).contains("Enter a title", "name=\"lumens\" value=\"6000\"");
        assertThat(new Visitor(port)
                        .post("/keep", "title", "x", "lumens", "six")
                        .status())
                .isEqualTo(400);
        assertThat(projects.list()).hasSize(before);
    }
}
