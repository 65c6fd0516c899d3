package skytally.project;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.UUID;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.openqa.selenium.By;
import org.openqa.selenium.Keys;
import org.openqa.selenium.WebElement;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.boot.test.context.SpringBootTest;
import org.springframework.boot.test.web.server.LocalServerPort;
import skytally.browser.Browser;
import skytally.browser.InBrowser;

@InBrowser
@DisplayName("The pages on which a project is described, in a browser")
@SpringBootTest(webEnvironment = SpringBootTest.WebEnvironment.RANDOM_PORT)
class ProjectPagesBrowserTest {

    private static final By DONE = By.className("app-done");

    @LocalServerPort
    private int port;

    @Autowired
    private Projects projects;

    @Test
    void goFromNothingToLightsAndPlacesByKeyboardWithScriptsOff() {
        UUID id;
        try (Browser browser = Browser.withoutScripts(port)) {
            browser.open("/projects");
            type(browser, "title", "From nothing");
            send(browser, "title", "The project is kept.");
            id = UUID.fromString(browser.driver().getCurrentUrl().replaceAll("^.*/projects/([0-9a-f-]{36}).*$", "$1"));

            follow(browser, "Documents");
            type(browser, "mark", "D1");
            type(browser, "title", "Luminaire schedule");
            send(browser, "title", "The document was added.");

            follow(browser, "Site");
            choose(browser, "document", "D1 Luminaire schedule");
            type(browser, "who", "A. Planner");
            type(browser, "latitude", "51.5");
            send(browser, "latitude", "Saved.");

            aType(browser, "A1", "5 200", "20");
            aType(browser, "B.2", "2600", "15");
            aLight(browser, "-36", "37");

            follow(browser, "Places");
            aPlace(browser, "V1", "-12", "86");
            aPlace(browser, "V2", "300", "0");
        }
        Project project = projects.find(id).orElseThrow().project();
        Scheme proposed = project.scheme("proposed").orElseThrow();
        assertThat(proposed.types()).extracting(LuminaireType::mark).containsExactly("A1", "B.2");
        Claim height = proposed.types().get(0).values().get("mountingHeight").inUse();
        assertThat(height.value() + " " + height.unit() + " " + height.source().document() + " " + height.who())
                .isEqualTo("20 ft D1 A. Planner");
        assertThat(proposed.placements()).hasSize(1);
        assertThat(proposed.placements().get(0).values().text("east")).isEqualTo("-36");
        assertThat(project.places()).extracting(Place::mark).containsExactly("V1", "V2");
        assertThat(project.places().get(1).values().text("east")).isEqualTo("300");
    }

    private void aType(Browser browser, String mark, String lumens, String feet) {
        follow(browser, "Lights");
        type(browser, "mark-proposed", mark);
        send(browser, "mark-proposed", "The type was added.");
        choose(browser, "document", "D1 Luminaire schedule");
        type(browser, "lumens", lumens);
        type(browser, "mountingHeight", feet);
        choose(browser, "mountingHeight-unit", "ft");
        send(browser, "lumens", "Saved.");
    }

    private void aLight(Browser browser, String east, String north) {
        follow(browser, "Lights");
        browser.driver()
                .findElement(By.partialLinkText("Positions: What is proposed"))
                .sendKeys(Keys.ENTER);
        browser.awaitText(By.tagName("h1"), "Positions");
        choose(browser, "document", "D1 Luminaire schedule");
        type(browser, "east", east);
        type(browser, "north", north);
        send(browser, "north", "1 light was added to the plan.");
    }

    private void aPlace(Browser browser, String mark, String east, String north) {
        choose(browser, "document", "D1 Luminaire schedule");
        type(browser, "mark", mark);
        type(browser, "east", east);
        type(browser, "north", north);
        send(browser, "mark", "The place was added.");
        assertThat(browser.driver().findElement(By.linkText(mark)).isDisplayed())
                .isTrue();
        browser.driver().findElement(By.linkText(mark)).sendKeys(Keys.ENTER);
        browser.awaitText(By.tagName("h1"), "Place " + mark);
        follow(browser, "Places");
    }

    private static WebElement field(Browser browser, String id) {
        return browser.driver().findElement(By.id(id));
    }

    private static void type(Browser browser, String id, String text) {
        field(browser, id).sendKeys(Keys.chord(Keys.CONTROL, "a"), text);
    }

    /** As at the keyboard: the first letters of a choice lead to it. */
    private static void choose(Browser browser, String id, String words) {
        field(browser, id).sendKeys(words);
        assertThat(field(browser, id)
                        .findElement(By.cssSelector("option:checked"))
                        .getText())
                .isEqualTo(words);
    }

    private static void send(Browser browser, String id, String done) {
        field(browser, id).sendKeys(Keys.ENTER);
        browser.awaitText(DONE, done);
    }

    private static void follow(Browser browser, String page) {
        browser.driver()
                .findElement(By.cssSelector(".app-rooms"))
                .findElement(By.linkText(page))
                .sendKeys(Keys.ENTER);
        browser.awaitText(By.tagName("h1"), page);
    }

    @Test
    void sayWhatIsWrongAndThatAnotherSavedFirst() {
        KeptProject kept = projects.add(Project.named(UUID.randomUUID(), "Two at once"), Saving.by("", ""));
        String at = "/projects/" + kept.project().id();
        try (Browser browser = Browser.on(port)) {
            for (int width : new int[] {Browser.WIDE, Browser.NARROW}) {
                browser.width(width);
                browser.open(at + "/site");
                type(browser, "latitude", "91");
                type(browser, "who", "B");
                field(browser, "latitude").sendKeys(Keys.ENTER);
                browser.awaitText(By.tagName("body"), "There is a problem");
                browser.screenshot("project-faults-" + width, width);
                assertThat(field(browser, "latitude").getDomProperty("value")).isEqualTo("91");
                assertThat(browser.accessibilityFaults()).isEmpty();
                assertThat(browser.scrollsSideways()).isFalse();

                KeptProject now = projects.find(kept.project().id()).orElseThrow();
                projects.save(
                        now.project().withDocuments(List.of(new Document("D" + width, "First", "", "", ""))),
                        now.version(),
                        Saving.by("", ""));
                field(browser, "latitude").sendKeys(Keys.ENTER);
                browser.awaitText(By.tagName("h1"), "It was changed in the meantime");
                browser.screenshot("project-clash-" + width, width);
                assertThat(browser.driver().findElement(By.tagName("main")).getText())
                        .contains("91", "Latitude");
                assertThat(browser.accessibilityFaults()).isEmpty();
                assertThat(browser.scrollsSideways()).isFalse();
            }
        }
    }

    @Test
    void giveBackWhatTheSecondOfTwoTyped() {
        UUID id = projects.add(Project.named(UUID.randomUUID(), "Two windows"), Saving.by("", ""))
                .project()
                .id();
        String site = "/projects/" + id + "/site";
        try (Browser first = Browser.on(port);
                Browser second = Browser.withoutScripts(port)) {
            first.open(site);
            second.open(site);
            type(first, "why", "read off the survey");
            type(first, "latitude", "52.4");
            send(first, "latitude", "Saved.");

            type(second, "why", "read off the letter");
            type(second, "longitude", "-25");
            field(second, "longitude").sendKeys(Keys.ENTER);
            second.awaitText(By.tagName("h1"), "It was changed in the meantime");
            assertThat(second.driver().findElement(By.tagName("main")).getText())
                    .contains("Longitude, east positive", "-25", "read off the letter");

            second.driver()
                    .findElement(By.linkText("Open the page as it stands now"))
                    .sendKeys(Keys.ENTER);
            second.awaitText(By.tagName("h1"), "Site");
            assertThat(field(second, "latitude").getDomProperty("value")).isEqualTo("52.4");
            type(second, "why", "read off the letter");
            type(second, "longitude", "-25");
            send(second, "longitude", "Saved.");
        }
        Values both = projects.find(id).orElseThrow().project().site();
        assertThat(both.text("latitude") + " " + both.text("longitude")).isEqualTo("52.4 -25");
    }
}
