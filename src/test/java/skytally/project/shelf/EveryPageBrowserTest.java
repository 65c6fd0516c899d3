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

/** Looks at every page of a project, in every theme wide, and by day as on a telephone. */
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
        List<String> pages = new ArrayList<>(List.of("/", "/projects"));
        ProjectPages.OF_FERRIN_LANE.forEach(page -> pages.add(project + page));
        return pages;
    }

    @Test
    void hasNothingThatAxeFindsInAnyThemeAndNeverScrollsSideways() {
        List<String> faults = new ArrayList<>();
        try (Browser browser = Browser.on(port)) {
            for (String page : pages()) {
                for (Theme theme : Theme.values()) {
                    browser.width(Browser.WIDE);
                    browser.open(themed(page, theme));
                    if (theme == Theme.DARK) {
                        browser.driver()
                                .executeScript("document.querySelectorAll('details').forEach(one => one.open = true)");
                    }
                    look(browser, page, theme, Browser.WIDE, faults);
                }
                browser.width(Browser.NARROW);
                browser.open(themed(page, Theme.DAY));
                look(browser, page, Theme.DAY, Browser.NARROW, faults);
            }
        }
        assertThat(faults).isEmpty();
    }

    private static String themed(String page, Theme theme) {
        return page + (page.contains("?") ? "&" : "?") + "theme=" + theme.word();
    }

    private static void look(Browser browser, String page, Theme theme, int width, List<String> faults) {
        String name = page.replaceAll("/projects/[0-9a-f-]{36}", "project").replaceAll("[^a-zA-Z0-9-]+", "-");
        browser.screenshot("every" + name + "-" + width + "-" + theme.word(), width);
        browser.accessibilityFaults().forEach(fault -> faults.add(name + " " + width + " " + theme + ": " + fault));
        if (browser.scrollsSideways()) {
            faults.add(name + " scrolls sideways at " + width);
        }
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
