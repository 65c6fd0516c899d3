package skytally.project.lights;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.UUID;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.boot.test.context.SpringBootTest;
import org.springframework.boot.test.web.server.LocalServerPort;
import skytally.project.Cases;
import skytally.project.Claim;
import skytally.project.Field;
import skytally.project.Fields;
import skytally.project.Pages;
import skytally.project.Project;
import skytally.project.Projects;
import skytally.project.Saving;
import skytally.scene.State;

@DisplayName("The schedule and the page of a type")
@SpringBootTest(webEnvironment = SpringBootTest.WebEnvironment.RANDOM_PORT)
class LightsPageTest {

    @LocalServerPort
    private int port;

    @Autowired
    private Projects projects;

    private Pages pages;
    private UUID id;
    private String lights;

    @BeforeEach
    void aSportsGround() {
        pages = new Pages(port);
        Project ground = Cases.aSportsGround();
        id = projects.add(
                        new Project(
                                UUID.randomUUID(),
                                "Ground",
                                ground.documents(),
                                ground.site(),
                                ground.schemes(),
                                ground.places()),
                        Saving.by("", ""))
                .project()
                .id();
        lights = "/projects/" + id + "/lights";
    }

    private Pages.Page typed(String mark, String... namesAndValues) throws Exception {
        List<String> sent = new ArrayList<>(List.of("doing", "save", "document", "D1", "party", "applicant"));
        sent.addAll(List.of(namesAndValues));
        if (sent.contains("tilt")) {
            sent.addAll(List.of("tilt-low", "", "tilt-high", "")); // the range of the tilt before
        }
        Pages.Page saved = pages.post(lights + "/proposed/types/" + mark, sent.toArray(String[]::new));
        assertThat(saved.status()).as(saved.words()).isEqualTo(200);
        return saved;
    }

    private Claim shape(String mark) {
        return projects.find(id)
                .orElseThrow()
                .project()
                .scheme("proposed")
                .orElseThrow()
                .type(mark)
                .orElseThrow()
                .values()
                .get("shape")
                .inUse();
    }

    @Test
    void readTheShapeFromTheWordsAndSayItsWidthAndBothShares() throws Exception {
        Pages.Page page = typed(
                "A1",
                "shapeWords",
                "round-beam floodlight, no visor",
                "tilt",
                "64",
                "upwardShare",
                "4.0",
                "bearing",
                "120");

        assertThat(page.words())
                .contains("Saved. The shape was read from the words of the schedule and is assumed")
                .contains("Tilted 64° from straight down, it sends 4 % of its light above the level, and 3.37 %")
                .contains("4 % are stated: a beam 36° wide, where it has fallen to half, sends just that")
                .contains("Reckoned as: floodlight with a beam of 60° (assumed).")
                .contains("On the first night 96 000 lm are reckoned to leave each (given: D1, row A1).")
                .doesNotContain("No bearing is stated");
        assertThat(page.body()).contains("<svg class=\"app-tilt\"", "app-tilt__up", "href=\"/guide#words\"");
        assertThat(shape("A1").value()).isEqualTo("beam-60");
        assertThat(shape("A1").state()).isEqualTo(State.ASSUMED);
        assertThat(shape("A1").source().reason()).startsWith("“round-beam floodlight, no visor” taken as");

        assertThat(typed("A1", "shapeWords", "flat-glass area light", "tilt", "0", "upwardShare", "0")
                        .words())
                .contains("The shape was read from the words", "0 % are stated, and the shape agrees.");
        assertThat(shape("A1").value()).isEqualTo("flat-area");
        assertThat(typed("A1", "shape", "flat-road").words()).contains("Saved. What was not changed");
        assertThat(typed("A1", "shapeWords", "louvred bollard").words()).contains("Saved. What was not changed");
        assertThat(shape("A1").value()).isEqualTo("flat-road");
    }

    @Test
    void tellAShapeAndAShareThatCannotBothBeTrue() throws Exception {
        assertThat(typed("A2", "shapeWords", "louvred bollard", "upwardShare", "6.4", "lumens", "700")
                        .words())
                .contains("The claims differ: the shape sends 0 % above the level, and 6.4 % are stated.")
                .contains("the shape with 12.8 % of its light sent to all sides alike");
        assertThat(pages.get(lights).words())
                .contains("6.4 % 6.4 % stated, 0 % by its shape")
                .contains("Share above the level: its shape and what is stated differ.");
        assertThat(typed("A2", "shapeWords", "clear globe on post", "upwardShare", "52")
                        .words())
                .contains("The claims differ: the shape sends 50 % above the level, and 52 % are stated.")
                .contains("so the shape is reckoned with as it is");
    }

    @Test
    void sayWhichLightsLackABearingThatMatters() throws Exception {
        assertThat(typed("A1", "shape", "beam-30", "tilt", "60").words())
                .contains("No bearing is stated for 2 of its 2 lights on the plan, though it matters");
        pages.post(
                lights + "/proposed/positions/A1-01",
                "doing",
                "save",
                "document",
                "D1",
                "bearing",
                "200",
                "tilt",
                "90");
        assertThat(pages.get(lights + "/proposed/types/A1").words())
                .contains("No bearing is stated for 1 of its 2 lights on the plan")
                .contains("On the plan 1 of its 2 lights have a tilt of their own. They hang at 60° to 90°");
        assertThat(typed("A1", "tilt", "0").words()).doesNotContain("No bearing is stated");
    }

    @Test
    void sayWhatIsReckonedToLeaveALuminaire() throws Exception {
        assertThat(pages.get(lights + "/proposed/types/A2").words())
                .contains("Neither lumens nor watts are stated, so this type is left out");
        assertThat(typed("A2", "watts", "150").words())
                .contains("On the first night 16 500 lm are reckoned to leave each (assumed: 150 W times 110 lm/W");
        assertThat(pages.get(lights).words()).contains("16 500 lm worked out");
        assertThat(typed("A2", "lumens", "28000", "lumensBasis", "lamp-initial", "lightOutputRatio", "0.72")
                        .words())
                .contains("20 160 lm are reckoned to leave each (worked out: the lamp's 28 000 lm times 0.72)");
    }

    @Test
    void areReadAsAScheduleOfTheTrade() throws Exception {
        Pages.Page page = pages.get(lights);
        assertThat(page.words())
                .contains("Mark For Count Lumens Watts Light source Shape Tilt Mounting height")
                .contains("Above the level as tilted", "96 000 lm")
                .contains("Lumens of each: the claims differ.")
                .contains("1 of 22 values given");
        typed("A1", "count", "24");
        assertThat(pages.get(lights).words()).contains("24 on the schedule, 2 on the plan.");
    }

    @Test
    void haveEachFieldOnceUnderAHeading() throws Exception {
        String body = pages.get(lights + "/proposed/types/A1").body();
        for (Field field : Fields.of(Field.Subject.TYPE)) {
            assertThat(body.split(" id=\"" + field.name() + "\"", -1))
                    .as(field.name())
                    .hasSize(2);
        }
        assertThat(body)
                .containsSubsequence(
                        ">What it is<",
                        " id=\"shapeWords\"",
                        ">Its light<",
                        " id=\"lumens\"",
                        ">How it hangs<",
                        " id=\"tilt\"",
                        "<svg",
                        ">When it is on<",
                        " id=\"hours\"",
                        ">If it exists already<");
    }

    @Test
    void takeWordsThatAreNoWordsAsData() throws Exception {
        Pages.Page page = typed("A2", "shapeWords", "<script>alert(1)</script> globe");
        assertThat(page.body()).doesNotContain("<script");
        assertThat(shape("A2").value()).isEqualTo("all-round");
        assertThat(typed("A1", "shapeWords", "as agreed").words())
                .contains("The words of the schedule name none of the plain shapes.");
        assertThat(shape("A1").state()).isEqualTo(State.NOT_KNOWN);
    }
}
