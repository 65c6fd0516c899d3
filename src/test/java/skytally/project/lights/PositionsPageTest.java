package skytally.project.lights;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.UUID;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.boot.test.context.SpringBootTest;
import org.springframework.boot.test.web.server.LocalServerPort;
import skytally.project.Claim;
import skytally.project.LuminaireType;
import skytally.project.Pages;
import skytally.project.Party;
import skytally.project.Placement;
import skytally.project.Project;
import skytally.project.Projects;
import skytally.project.Saving;
import skytally.project.Scheme;
import skytally.project.Source;
import skytally.project.Stated;
import skytally.project.Values;
import skytally.scene.State;

@DisplayName("Lights put on the plan many at a time")
@SpringBootTest(webEnvironment = SpringBootTest.WebEnvironment.RANDOM_PORT)
class PositionsPageTest {

    @LocalServerPort
    private int port;

    @Autowired
    private Projects projects;

    private Pages pages;
    private UUID id;
    private String at;

    @BeforeEach
    void aScheduleOfTwoTypes() {
        pages = new Pages(port);
        id = UUID.randomUUID();
        Project empty = Project.named(id, "Car park");
        Scheme proposed = empty.scheme("proposed").orElseThrow();
        projects.add(
                empty.withScheme(proposed.with(
                        List.of(
                                new LuminaireType("B1", said("count", "100", "")),
                                new LuminaireType("B2", said("bearing", "30", "°"))),
                        List.of())),
                Saving.by("", ""));
        at = "/projects/" + id + "/lights/proposed/positions";
    }

    private static Values said(String field, String value, String unit) {
        return Values.NONE.with(field, Stated.of(Claim.given(value, unit, Source.reason("test"), Party.APPLICANT)));
    }

    private List<Placement> lights() {
        return projects.find(id)
                .orElseThrow()
                .project()
                .scheme("proposed")
                .orElseThrow()
                .placements();
    }

    private List<String> told() {
        return lights().stream()
                .map(light -> light.mark() + " " + light.values().text("east") + " "
                        + light.values().text("north") + " " + light.values().text("bearing"))
                .toList();
    }

    private Pages.Page block(String... more) throws Exception {
        String[] all = {
            "doing", "add",
            "add", "block",
            "type", "B1",
            "why", "test",
            "startEast", "5",
            "startEast-unit", "m",
            "startNorth", "5",
            "startNorth-unit", "m",
            "rowBearing", "90",
            "rowBearing-unit", "°",
            "rowSpacing", "20",
            "rowSpacing-unit", "m",
            "columnSpacing", "10",
            "columnSpacing-unit", "m"
        };
        String[] sent = new String[all.length + more.length];
        System.arraycopy(all, 0, sent, 0, all.length);
        System.arraycopy(more, 0, sent, all.length, more.length);
        return pages.post(at + "?add=block", sent);
    }

    /** By hand: rows run east from (5, 5), 10 m apart; the second begins 20 m to the right, which is south. */
    @Test
    void standInABlock() throws Exception {
        Pages.Page page = block("rows", "2", "columns", "3");
        assertThat(page.words()).contains("6 lights were added to the plan.");
        assertThat(told())
                .containsExactly(
                        "B1-01 5 5 ", "B1-02 15 5 ", "B1-03 25 5 ", "B1-04 5 -15 ", "B1-05 15 -15 ", "B1-06 25 -15 ");
        Claim claim = lights().get(4).values().get("east").inUse();
        assertThat(claim.state()).isEqualTo(State.ASSUMED);
        assertThat(claim.source().reason())
                .startsWith("light 2 of 3 in row 2 of 2 of a block from 5\u00a0m east, 5\u00a0m north");
        assertThat(page.words())
                .contains("B1: 6 on the plan, 100 on the schedule; 94 without a position stand at the reference point");
    }

    @Test
    void hangInHeadsTurnedFromTheBearingOfTheirPole() throws Exception {
        Pages.Page page =
                block("rows", "1", "columns", "2", "bearing", "300", "bearing-unit", "°", "heads", "0 90° 180 270");
        assertThat(page.words()).contains("8 lights were added to the plan.");
        assertThat(told())
                .containsExactly(
                        "B1-01a 5 5 300",
                        "B1-01b 5 5 30",
                        "B1-01c 5 5 120",
                        "B1-01d 5 5 210",
                        "B1-02a 15 5 300",
                        "B1-02b 15 5 30",
                        "B1-02c 15 5 120",
                        "B1-02d 15 5 210");
        assertThat(lights().get(1).values().get("bearing").inUse().source().reason())
                .startsWith("head 2 of 4, 90° clockwise from the bearing of the pole, 300°");
        block("rows", "1", "columns", "1");
        assertThat(lights().get(8).mark()).isEqualTo("B1-03");
    }

    @Test
    void turnFromTheBearingOfTheirTypeOrOfTheirRing() throws Exception {
        pages.post(
                at,
                "doing",
                "add",
                "add",
                "grid",
                "type",
                "B2",
                "why",
                "test",
                "east",
                "1",
                "east-unit",
                "m",
                "north",
                "2",
                "north-unit",
                "m",
                "mark",
                "P7",
                "heads",
                "0 180");
        assertThat(told()).containsExactly("P7a 1 2 30", "P7b 1 2 210");
        pages.post(
                at + "?add=ring",
                "doing",
                "add",
                "add",
                "ring",
                "type",
                "B1",
                "why",
                "test",
                "howMany",
                "2",
                "radius",
                "10",
                "radius-unit",
                "m",
                "centreEast",
                "0",
                "centreEast-unit",
                "m",
                "centreNorth",
                "0",
                "centreNorth-unit",
                "m",
                "firstBearing",
                "0",
                "firstBearing-unit",
                "°",
                "aim",
                "outward",
                "heads",
                "10 350");
        assertThat(told().subList(2, 6))
                .containsExactly("B1-01a 0 10 10", "B1-01b 0 10 350", "B1-02a 0 -10 190", "B1-02b 0 -10 170");
    }

    @Test
    void areRefusedWithWhatToDo() throws Exception {
        refused("Heads: “400” is no angle from 0 to 360 degrees.", "rows", "1", "columns", "1", "heads", "0 400");
        refused("Heads: the angle 90 stands there twice.", "rows", "1", "columns", "1", "heads", "90 90");
        refused("Heads: type the bearing that their angles are turned from", "rows", "1", "columns", "1", "heads", "0");
        refused(
                "That would be 20001 lights more beside the 0 there are; at most 20000 fit in a scheme.",
                "rows",
                "2000",
                "columns",
                "2000");
        refused(
                "That would be 20800 lights more",
                "rows",
                "100",
                "columns",
                "104",
                "bearing",
                "0",
                "bearing-unit",
                "°",
                "heads",
                "0 180");
        refused("How many rows: fill this in", "columns", "1");
        assertThat(lights()).isEmpty();
    }

    private void refused(String message, String... more) throws Exception {
        Pages.Page page = block(more);
        assertThat(page.status()).as(message).isEqualTo(400);
        assertThat(page.words()).contains(message);
    }

    /** 0 0, 40 0, 40 20, 0 20: the middle is at 20 and 10. */
    @Test
    void withoutAPositionStandAtTheMiddleOfTheSite() throws Exception {
        pages.post(
                "/projects/" + id + "/site", "why", "test", "outline", "0 0\n40 0\n40 20\n0 20", "outline-unit", "m");
        assertThat(pages.get(at).words())
                .contains("100 without a position stand at the middle of the site, 20 m east and 10 m north");
    }
}
