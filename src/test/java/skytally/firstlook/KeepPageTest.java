package skytally.firstlook;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.UUID;
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
