package skytally.project.shelf;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.openqa.selenium.By;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.boot.test.context.SpringBootTest;
import org.springframework.boot.test.web.server.LocalServerPort;
import skytally.browser.Browser;
import skytally.browser.InBrowser;
import skytally.project.Projects;
import skytally.project.Saving;
import skytally.web.Switches.Theme;

/** Looks at every page of a project, by day wide and as on a telephone; in the other themes at its contrast. */
@InBrowser
@SpringBootTest(webEnvironment = SpringBootTest.WebEnvironment.RANDOM_PORT)
@DisplayName("Every page of a project, in a browser")
class EveryPageBrowserTest {

    @LocalServerPort
    private int port;

    @Autowired
    private Projects projects;

    private List<String> pages() {
        String project = "/projects/"
                + projects.add(
                                Copies.withFreshId(Samples.byName("ferrin-lane").orElseThrow()),
                                Saving.by("", "A sample"))
                        .project()
                        .id();
        List<String> pages = new ArrayList<>(List.of("/projects", "/guide"));
        ProjectPages.OF_FERRIN_LANE.forEach(page -> pages.add(project + page));
        return pages;
    }

    @Test
    void hasNothingThatAxeFindsInAnyThemeAndNeverScrollsSideways() {
        List<String> faults = new ArrayList<>();
        try (Browser browser = Browser.on(port)) {
            for (String page : pages()) {
                for (int width : new int[] {Browser.WIDE, Browser.NARROW}) {
                    open(browser, page, Theme.DAY, width);
                    browser.screenshot("every" + name(page) + "-" + width, width);
                    note(faults, page + " at " + width, browser.faultsAt(width, true));
                    if (browser.scrollsSideways()) {
                        faults.add(page + " scrolls sideways at " + width);
                    }
                }
                for (Theme theme : List.of(Theme.DARK, Theme.TELESCOPE)) {
                    open(browser, page, theme, Browser.WIDE);
                    note(faults, page + " " + theme, browser.faultsAt(Browser.WIDE, false));
                }
            }
        }
        assertThat(faults).isEmpty();
    }

    /** By day and wide with all that opens open, else as it comes. */
    private static void open(Browser browser, String page, Theme theme, int width) {
        browser.width(width);
        browser.open(page + (page.contains("?") ? "&" : "?") + "theme=" + theme.word());
        if (width == Browser.WIDE && theme == Theme.DAY) {
            browser.driver().executeScript("document.querySelectorAll('details').forEach(one => one.open = true)");
        }
    }

    private static void note(List<String> faults, String where, List<String> found) {
        found.forEach(fault -> faults.add(where + ": " + fault));
    }

    private static String name(String page) {
        return page.replaceAll("/projects/[0-9a-f-]{36}", "-project").replaceAll("[^a-zA-Z0-9-]+", "-");
    }

    @Test
    void readsTheSameWithScriptsOff() {
        try (Browser browser = Browser.withoutScripts(port)) {
            for (String page : pages()) {
                browser.open(page);
                assertThat(browser.driver().findElements(By.tagName("h1")))
                        .as(page)
                        .hasSize(1);
                assertThat(browser.driver().findElement(By.tagName("main")).getText())
                        .as(page)
                        .hasSizeGreaterThan(100);
                assertThat(browser.driver()
                                .findElement(By.cssSelector(".app-block__caution"))
                                .getText())
                        .startsWith("An aid to judgement.");
            }
        }
    }
}
