package skytally.project;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Map;
import java.util.UUID;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.boot.test.context.SpringBootTest;
import org.springframework.boot.test.web.server.LocalServerPort;
import skytally.scene.State;

@DisplayName("The pages on which a project is described")
@SpringBootTest(webEnvironment = SpringBootTest.WebEnvironment.RANDOM_PORT)
class ProjectPagesTest {

    private static final String NASTY = "<script>alert(1)</script>\"'&";

    @LocalServerPort
    private int port;

    @Autowired
    private Projects projects;

    private Pages pages;
    private String at;
    private UUID id;

    @BeforeEach
    void aSportsGround() {
        pages = new Pages(port);
        Project ground = Cases.aSportsGround();
        id = projects.add(
                        new Project(
                                UUID.randomUUID(),
                                "Ground <b>",
                                ground.documents(),
                                ground.site(),
                                ground.schemes(),
                                ground.places()),
                        Saving.by("", ""))
                .project()
                .id();
        at = "/projects/" + id;
    }

    private Project project() {
        return projects.find(id).orElseThrow().project();
    }

    private Scheme proposed() {
        return project().scheme("proposed").orElseThrow();
    }

    private Values type(String mark) {
        return proposed().type(mark).orElseThrow().values();
    }

    @Test
    void eachOpensAndLeadsToTheOthers() throws Exception {
        for (String page : new String[] {
            "/documents",
            "/documents/D1",
            "/site",
            "/lights",
            "/lights/proposed/types/A1",
            "/lights/proposed/positions",
            "/lights/existing/positions",
            "/lights/proposed/positions?add=polar",
            "/lights/proposed/positions?add=row",
            "/lights/proposed/positions?add=ring",
            "/lights/proposed/positions/A1-01",
            "/places",
            "/places?add=polar",
            "/places/VA1"
        }) {
            Pages.Page opened = pages.get(at + page);
            assertThat(opened.status()).as(page).isEqualTo(200);
            assertThat(opened.body())
                    .as(page)
                    .contains("href=\"" + at + "/site\"", "href=\"" + at + "/lights\"", "href=\"" + at + "/places\"")
                    .contains("Ground &lt;b&gt;")
                    .doesNotContain("Ground <b>", " style=", "<script", "??", "th:");
        }
        for (String nothing : new String[] {
            "/lights/option/positions",
            "/lights/proposed/types/A9",
            "/lights/proposed/positions/X",
            "/places/X",
            "/documents/X"
        }) {
            assertThat(pages.get(at + nothing).status()).as(nothing).isEqualTo(404);
        }
        assertThat(pages.get("/projects/" + UUID.randomUUID() + "/site").status())
                .isEqualTo(404);
        assertThat(pages.get("/projects/clash").status()).isEqualTo(404);
    }

    @Test
    void sayWhatStandsInForWhatIsNotKnown() throws Exception {
        assertThat(pages.get(at + "/lights/proposed/types/A2").words())
                .contains("not known 6 m stands in, 5 to 8: A usual column; common practice, no source.");
        assertThat(pages.get(at + "/lights").words()).contains("6 m stands in not known", "0 of 11");
        assertThat(pages.get(at + "/site").words()).contains("Nothing stands in for it.");
    }

    @Test
    void keepWhatIsTypedAsGivenAndTheClaimsAddUp() throws Exception {
        String page = at + "/lights/proposed/types/A1";
        Pages.Page saved = pages.post(
                page,
                "doing",
                "save",
                "document",
                "D1",
                "party",
                "applicant",
                "who",
                "A. Planner",
                "mountingHeight",
                "20",
                "mountingHeight-unit",
                "ft",
                "lumens",
                "96000",
                "lumens-unit",
                "lm");
        assertThat(saved.status()).isEqualTo(200);
        assertThat(saved.words()).contains("Saved.");
        assertThat(saved.body()).contains("value=\"A. Planner\"").containsPattern("value=\"D1\" selected");
        Claim height = type("A1").get("mountingHeight").inUse();
        assertThat(height.value() + " " + height.unit()).isEqualTo("20 ft");
        assertThat(height.state()).isEqualTo(State.GIVEN);
        assertThat(type("A1").get("lumens")).isEqualTo(proposedBefore("lumens"));

        pages.post(page, "doing", "save", "why", "paced out", "mountingHeight", "7", "mountingHeight-unit", "m");
        assertThat(type("A1").get("mountingHeight").claims()).hasSize(2);
        assertThat(type("A1").get("mountingHeight").inUse().state()).isEqualTo(State.ASSUMED);
        assertThat(pages.get(page).words())
                .contains("the claims differ", "20 ft", "D1 Luminaire schedule; the applicant's, A. Planner, 20");
        assertThat(Cases.history(projects, id)).hasSize(3);
    }

    private static Stated proposedBefore(String field) {
        return Cases.aSportsGround()
                .scheme("proposed")
                .orElseThrow()
                .type("A1")
                .orElseThrow()
                .values()
                .get(field);
    }

    @Test
    void keepWhatWasTypedWhenSomeOfItIsWrong() throws Exception {
        Project before = project();
        Pages.Page refused = pages.post(
                at + "/lights/proposed/types/A1",
                "doing",
                "save",
                "document",
                "D1",
                "tilt",
                "200",
                "use",
                NASTY,
                "lumens",
                NASTY);
        assertThat(refused.status()).isEqualTo(400);
        assertThat(refused.body())
                .contains("There is a problem", "href=\"#tilt\"", "href=\"#lumens\"", "aria-invalid=\"true\"")
                .contains("value=\"200\"", "value=\"&lt;script&gt;alert(1)&lt;/script&gt;&quot;&#39;&amp;\"")
                .doesNotContain("<script");
        assertThat(project()).isEqualTo(before);
    }

    @Test
    void escapeEveryTextThatIsKept() throws Exception {
        pages.post(at + "/documents", "mark", "D2", "title", NASTY, "date", NASTY, "revision", NASTY, "from", NASTY);
        pages.post(
                at + "/lights/proposed/types/A1",
                "doing",
                "save",
                "document",
                "D2",
                "who",
                NASTY,
                "why",
                NASTY,
                "use",
                NASTY,
                "use-place",
                NASTY,
                "hours",
                NASTY,
                "note",
                NASTY);
        pages.post(
                at + "/places/VA1",
                "doing",
                "save",
                "document",
                "D2",
                "what",
                NASTY,
                "looks",
                NASTY + " 1 2",
                "horizon",
                "");
        pages.post(at + "/site", "why", NASTY, "grossArea", "2", "grossArea-unit", "ha");
        assertThat(type("A1").text("note")).isEqualTo(NASTY);
        assertThat(project().place("VA1").orElseThrow().looks().get(0).name()).isEqualTo(NASTY);
        for (String page : new String[] {
            "/documents",
            "/documents/D2",
            "/lights",
            "/lights/proposed/types/A1",
            "/lights/proposed/positions",
            "/lights/proposed/positions?add=row",
            "/places",
            "/places/VA1",
            "/site"
        }) {
            assertThat(pages.get(at + page).body())
                    .as(page)
                    .contains("&lt;script&gt;")
                    .doesNotContain("<script");
        }
    }

    @Test
    void giveBackWhatWasTypedWhenAnotherSavedFirst() throws Exception {
        String page = at + "/places/VA1";
        Pages.Page opened = pages.get(page);
        pages.post(page, "doing", "save", "document", "D1", "what", "bedroom", "looks", "", "horizon", "");
        Project first = project();
        Pages.Page clash = pages.postFrom(
                opened,
                page,
                "doing",
                "save",
                "why",
                "seen " + NASTY,
                "party",
                "objector",
                "eyeHeight",
                "",
                "eyeHeight-unit",
                "ft",
                "what",
                "kitchen",
                "what-used",
                "0",
                "looks",
                "",
                "horizon",
                "");
        assertThat(clash.status()).isEqualTo(409);
        assertThat(clash.words())
                .contains("It was changed in the meantime", "kitchen", "What it is", "seen &lt;script");
        assertThat(clash.body())
                .contains("href=\"" + page + "\"")
                .contains("an objector&#39;s")
                .doesNotContain("<script", "what-used", "name=\"_csrf\"", "Height of the eye");
        assertThat(project()).isEqualTo(first);
    }

    @Test
    void addRenameAndRemoveATypeWithItsLights() throws Exception {
        Pages.Page added = pages.post(at + "/lights", "scheme", "existing", "mark", "E1");
        assertThat(added.path()).isEqualTo(at + "/lights/existing/types/E1");
        assertThat(project().scheme("existing").orElseThrow().type("E1")).isPresent();

        Pages.Page twice = pages.post(at + "/lights", "scheme", "existing", "mark", "E1");
        assertThat(twice.status()).isEqualTo(400);
        assertThat(twice.words()).contains("Two luminaire types have the mark E1");
        assertThat(pages.post(at + "/lights", "scheme", "existing", "mark", "no mark <b>")
                        .words())
                .contains("A mark has 1 to 40 letters");

        String page = at + "/lights/proposed/types/A1";
        assertThat(pages.post(page, "doing", "rename", "mark", "A2").status()).isEqualTo(400);
        assertThat(pages.post(page, "doing", "rename", "mark", "B.1").path()).endsWith("/types/B.1");
        assertThat(proposed().placementsOf("B.1")).hasSize(2);
        assertThat(pages.get(at + "/lights/proposed/types/B.1").words())
                .contains("With B.1 go all claims of its 2 values and its 2 lights on the plan.");
        pages.post(at + "/lights/proposed/types/B.1", "doing", "remove");
        assertThat(proposed().types()).extracting(LuminaireType::mark).containsExactly("A2");
        assertThat(proposed().placements()).extracting(Placement::mark).containsExactly("A2-01");
    }

    @Test
    void putLightsOnThePlanInEveryWay() throws Exception {
        String page = at + "/lights/proposed/positions";
        pages.post(
                page,
                "doing",
                "add",
                "add",
                "grid",
                "type",
                "A2",
                "document",
                "D1",
                "east",
                "10",
                "east-unit",
                "ft",
                "north",
                "-3",
                "north-unit",
                "m");
        assertThat(light("A2-02").get("east").inUse().unit()).isEqualTo("ft");

        pages.post(
                page,
                "doing",
                "add",
                "add",
                "polar",
                "type",
                "A2",
                "mark",
                "P1",
                "document",
                "D1",
                "distance",
                "100",
                "distance-unit",
                "m",
                "direction",
                "90",
                "direction-unit",
                "°");
        assertThat(light("P1").text("east")).isEqualTo("100");
        assertThat(light("P1").text("north")).isEqualTo("0");
        assertThat(light("P1").get("east").inUse().state()).isEqualTo(State.WORKED_OUT);
        assertThat(light("P1").get("east").inUse().source().reason())
                .isEqualTo("100\u00a0m on a bearing of 90° from the reference point");

        pages.post(
                page,
                "doing",
                "add",
                "add",
                "row",
                "type",
                "A2",
                "document",
                "D1",
                "howMany",
                "3",
                "startEast",
                "0",
                "startNorth",
                "0",
                "endEast",
                "20",
                "endNorth",
                "10",
                "tilt",
                "5");
        assertThat(light("A2-04").text("east") + " " + light("A2-04").text("north"))
                .isEqualTo("10 5");
        assertThat(light("A2-05").text("tilt")).isEqualTo("5");

        pages.post(
                page,
                "doing",
                "add",
                "add",
                "ring",
                "type",
                "A2",
                "why",
                "as drawn",
                "howMany",
                "4",
                "centreEast",
                "100",
                "centreNorth",
                "0",
                "radius",
                "10",
                "firstBearing",
                "0",
                "aim",
                "inward");
        Values east = light("A2-07");
        assertThat(east.text("east") + " " + east.text("north") + " " + east.text("bearing"))
                .isEqualTo("110 0 270");
        assertThat(east.get("east").inUse().state()).isEqualTo(State.ASSUMED);
        assertThat(pages.get(page).words()).contains("110.0 m on a bearing of 90.0°", "Lights 1 to 12 of 12");

        Pages.Page open =
                pages.post(page, "doing", "add", "add", "row", "type", "A2", "document", "D1", "howMany", "3");
        assertThat(open.status()).isEqualTo(400);
        assertThat(open.words()).contains("Start, east of the reference point: fill this in");
        Pages.Page many = pages.post(
                page,
                "doing",
                "add",
                "add",
                "row",
                "type",
                "A2",
                "document",
                "D1",
                "howMany",
                "20000",
                "startEast",
                "0",
                "startNorth",
                "0",
                "endEast",
                "20",
                "endNorth",
                "10");
        assertThat(many.words())
                .contains("That would be 20000 lights more beside the 12 there are; at most 20000 fit in a scheme.");

        pages.post(page, "doing", "remove", "light", "P1", "light", "A1-01");
        assertThat(proposed().placement("P1")).isEmpty();
        assertThat(proposed().placements()).hasSize(10);
    }

    private Values light(String mark) {
        return proposed().placement(mark).orElseThrow().values();
    }

    @Test
    void putPlacesByGridAndByDistanceAndBearing() throws Exception {
        pages.post(
                at + "/places",
                "add",
                "polar",
                "mark",
                "V1",
                "document",
                "D1",
                "distance",
                "6000",
                "direction",
                "0",
                "what",
                "Observatory",
                "kind",
                "observatory");
        Values observatory = project().place("V1").orElseThrow().values();
        assertThat(observatory.text("north")).isEqualTo("6000");
        assertThat(observatory.byField()).doesNotContainKeys("distance", "direction");
        assertThat(pages.get(at + "/places").words()).contains("V1 Observatory", "6 000.0 m on a bearing of 0.0°");

        String page = at + "/places/V1";
        pages.post(
                page,
                "doing",
                "save",
                "document",
                "D1",
                "distance",
                "100",
                "direction",
                "270",
                "looks",
                "the dome 10 20,5\nzenith 0 90",
                "horizon",
                "180 2\n90 3");
        Place moved = project().place("V1").orElseThrow();
        assertThat(moved.values().get("east").claims()).extracting(Claim::value).containsExactly("0", "-100");
        assertThat(moved.looks())
                .containsExactly(new Place.NamedLook("the dome", 10, 20.5), new Place.NamedLook("zenith", 0, 90));
        assertThat(moved.horizon()).extracting(Place.HorizonPoint::bearingDeg).containsExactly(90.0, 180.0);

        Pages.Page refused = pages.post(
                page,
                "doing",
                "save",
                "document",
                "D1",
                "distance",
                "100",
                "direction",
                "270",
                "east",
                "5",
                "looks",
                "10 20\nname",
                "horizon",
                "400 1");
        assertThat(refused.status()).isEqualTo(400);
        assertThat(refused.words())
                .contains("Line 1, “10 20”", "Line 2, “name”", "Line 1, “400 1”")
                .contains("10 20");
        Pages.Page both =
                pages.post(page, "doing", "save", "document", "D1", "distance", "100", "direction", "270", "east", "5");
        assertThat(both.words()).contains("The position was typed in two ways. Do one or the other.");

        pages.post(page, "doing", "rename", "mark", "V2");
        assertThat(pages.post(at + "/places/V2", "doing", "remove").words()).contains("The place was removed.");
        assertThat(project().places()).extracting(Place::mark).containsExactly("VA1", "VA8");
    }

    @Test
    void keepADocumentThatValuesRestOn() throws Exception {
        Pages.Page list = pages.get(at + "/documents");
        assertThat(list.words()).containsPattern("D1 Luminaire schedule 2026-10-01 A the club 1\\d");
        Pages.Page kept = pages.post(at + "/documents/D1", "doing", "remove");
        assertThat(kept.status()).isEqualTo(400);
        assertThat(project().document("D1")).isPresent();
        pages.post(at + "/documents/D1", "doing", "save", "mark", "S1", "title", "Schedule");
        assertThat(type("A1").get("lumens").inUse().source().document()).isEqualTo("S1");
        assertThat(pages.post(at + "/documents", "mark", "S1", "title", "Again").words())
                .contains("Two documents have the mark S1");
        assertThat(pages.post(at + "/documents", "mark", "D3").words()).contains("write what stands on the document");
        pages.post(at + "/documents", "mark", "D3", "title", "Plan");
        pages.post(at + "/documents/D3", "doing", "remove");
        assertThat(project().documents()).extracting(Document::mark).containsExactly("S1");
    }

    @Test
    void refuseASiteThatCannotBe() throws Exception {
        Pages.Page refused =
                pages.post(at + "/site", "document", "D1", "latitude", "91", "timeZone", "Mars/Base", "curfew", "late");
        assertThat(refused.words())
                .contains("outside what may be typed, -90 to 90 °", "“Mars/Base” is not known", "not a time of day");
        pages.post(at + "/site", "document", "D1", "latitude", "51", "timeZone", "Europe/London", "curfew", "22:30");
        assertThat(project().site().text("curfew")).isEqualTo("22:30");
        assertThat(Map.copyOf(project().site().byField())).containsKeys("latitude", "timeZone");
    }
}
