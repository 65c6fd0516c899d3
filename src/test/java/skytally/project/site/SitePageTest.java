package skytally.project.site;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.UUID;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.boot.test.context.SpringBootTest;
import org.springframework.boot.test.web.server.LocalServerPort;
import skytally.project.LuminaireType;
import skytally.project.Pages;
import skytally.project.Project;
import skytally.project.Projects;
import skytally.project.Saving;
import skytally.project.Values;

@DisplayName("The site and the hours, typed as lines")
@SpringBootTest(webEnvironment = SpringBootTest.WebEnvironment.RANDOM_PORT)
class SitePageTest {

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
        Project empty = Project.named(id, "Shops");
        projects.add(
                empty.withScheme(empty.scheme("proposed")
                        .orElseThrow()
                        .with(List.of(new LuminaireType("B1", Values.NONE)), List.of())),
                Saving.by("", ""));
        at = "/projects/" + id;
    }

    private Project project() {
        return projects.find(id).orElseThrow().project();
    }

    /** 700 ft × 590 ft is 413 000 sq ft: 413 000 / 43 560 = 9.481 acres, 3.837 ha. */
    @Test
    void tellTheAreaWithinTheCornersBesideTheOneStated() throws Exception {
        Pages.Page page = pages.post(
                at + "/site",
                "why",
                "test",
                "outline",
                "0 0\n700 0\n700 590\n0 590",
                "outline-unit",
                "ft",
                "grossArea",
                "9.48",
                "grossArea-unit",
                "acre");
        assertThat(page.words())
                .contains("4 corners; 3.837 ha, 9.481 acres within them.")
                .contains("The corners enclose 3.837 ha, 9.481 acres.")
                .doesNotContain("more than 1 %");
        assertThat(project().site().get("outline").inUse().unit()).isEqualTo("ft");
        page = pages.post(at + "/site", "why", "test", "grossArea", "8.48", "grossArea-unit", "acre");
        assertThat(page.words())
                .contains("The corners enclose 3.837 ha, 9.481 acres: more than 1 % from what is stated.")
                .contains("the claims differ");
    }

    @Test
    void refuseWhatIsNoSiteWithTheLine() throws Exception {
        for (String[] wrong : new String[][] {
            {"outline", "0 0\n10 0", "Corners of the site: A site has at least three corners"},
            {"outline", "0 0\n10 10\n10 0\n0 10", "Corners of the site: The edge from line 3 to line 4 crosses"},
            {"timeZone", "Nowhere/Town", "Time zone: “Nowhere/Town” is not known."},
            {"curfew", "eleven", "Curfew: “eleven” is not a time of day. Write it as in 23:00."},
        }) {
            Pages.Page page = pages.post(at + "/site", "why", "test", wrong[0], wrong[1], "outline-unit", "m");
            assertThat(page.status()).as(wrong[1]).isEqualTo(400);
            assertThat(page.words()).contains(wrong[2]);
        }
        assertThat(project().site()).isEqualTo(Values.NONE);
        pages.post(at + "/site", "why", "test", "timeZone", "-01:00", "curfew", "22:00");
        assertThat(project().site().text("timeZone")).isEqualTo("-01:00");
    }

    @Test
    void standUnderHeadings() throws Exception {
        assertThat(pages.get(at + "/site").body())
                .contains(">Where it is</h2>", ">What applies to it</h2>", ">The ground</h2>")
                .contains("id=\"zoneChosenBy\"", "<textarea", "id=\"zoneReason\"");
        assertThat(pages.get(at + "/lights/proposed/types/B1").body()).contains(">When it is on</h2>");
    }

    @Test
    void keepHoursInTheirOneFormAndTellWhatTheyGive() throws Exception {
        String type = at + "/lights/proposed/types/B1";
        Pages.Page page = pages.post(
                type,
                "doing",
                "save",
                "why",
                "test",
                "schedule",
                "Dusk to 23:00  100 %\n23:00 dawn 30%",
                "lateOutput",
                "0",
                "lateOutput-unit",
                "%");
        Values values = project()
                .scheme("proposed")
                .orElseThrow()
                .type("B1")
                .orElseThrow()
                .values();
        assertThat(values.text("schedule")).isEqualTo("dusk 23:00 100%\n23:00 dawn 30%");
        assertThat(page.words())
                .contains("The hours give 100 %, and it is used (assumed: “dusk 23:00 100%”, curfew at 23:00")
                .contains("The hours give 30 % (assumed: “23:00 dawn 30%”, curfew at 23:00, the hours row by row)."
                        + " What is stated is used until you change it.")
                .contains("the claims differ");
        page = pages.post(type, "doing", "save", "why", "test", "schedule", "dusk 23:00 100%\nlate 30%");
        assertThat(page.status()).isEqualTo(400);
        assertThat(page.words())
                .contains("Hours, row by row: Line 2, “late 30%”: begin with two times, each dusk, dawn or one such as"
                        + " 23:00.");
    }

    @Test
    void readTheWordsOfTheScheduleWhereTheyHaveOneReading() throws Exception {
        String type = at + "/lights/proposed/types/B1";
        Pages.Page page = pages.post(type, "doing", "save", "why", "test", "hours", "movement sensor, all night");
        assertThat(page.words())
                .contains(
                        "By the words above: dusk dawn sensed idle 0% active 100% (assumed: read from “movement sensor,"
                                + " all night”; the two levels are not stated: taken as off and full).");
        page = pages.post(type, "doing", "save", "why", "test", "hours", "match nights only");
        assertThat(page.words()).doesNotContain("By the words above", "The hours give");
    }
}
