package skytally.review;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Objects;
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
import skytally.project.Project;
import skytally.project.Projects;
import skytally.web.Switches.Theme;

@InBrowser
@DisplayName("The pages that show results, in a browser")
@SpringBootTest(webEnvironment = SpringBootTest.WebEnvironment.RANDOM_PORT)
class ReviewBrowserTest {

    @LocalServerPort
    private int port;

    @Autowired
    private Projects projects;

    @Test
    void canBeReadByEveryoneWideAndNarrowAndOnPaper() {
        Project project = Reviewed.sample(projects, "ferrin-lane");
        try (Browser browser = Browser.on(port)) {
            for (String page : List.of("seen/VA8", "sky/VA8")) {
                for (int width : new int[] {Browser.WIDE, Browser.NARROW}) {
                    String name = open(browser, project, page, Theme.DAY, width);
                    browser.screenshot(name, width);
                    assertThat(browser.faultsAt(width, true)).as(name).isEmpty();
                    assertThat(browser.scrollsSideways()).as(name).isFalse();
                }
                for (Theme theme : List.of(Theme.DARK, Theme.TELESCOPE)) { // which change colours and nothing else
                    String name = open(browser, project, page, theme, Browser.WIDE);
                    browser.screenshot(name, Browser.WIDE);
                    assertThat(browser.faultsAt(Browser.WIDE, false)).as(name).isEmpty();
                }
                byte[] pdf = browser.print(page.replace('/', '-'), Browser.Paper.A4);
                assertThat(pdf.length).isBetween(20_000, 3_000_000);
            }
        }
    }

    private static String open(Browser browser, Project project, String page, Theme theme, int width) {
        browser.width(width);
        browser.open("/projects/" + project.id() + "/" + page + "?theme=" + theme.word());
        return page.replace('/', '-') + "-" + width + "-" + theme.word();
    }

    @Test
    void areWalkedByKeyboardWithScriptsOff() {
        Project project = Reviewed.sample(projects, "ferrin-lane");
        try (Browser browser = Browser.withoutScripts(port)) {
            browser.open("/projects/" + project.id() + "/places");
            press(browser, ".app-rooms", "Seen");
            browser.awaitText(By.tagName("h1"), "VA1 Bedroom window");
            press(browser, ".app-place-links", "VA8");
            browser.awaitText(By.tagName("h1"), "VA8 Observatory");
            press(browser, ".app-switches", "late");
            browser.awaitText(By.className("app-block"), "late, clear air");
            press(browser, "#who ~ *, section[aria-labelledby=who]", "sky glow");
            browser.awaitAddress("harm=glow#who");
            assertThat(browser.driver()
                            .findElement(By.cssSelector(".app-grid caption"))
                            .getText())
                    .contains("Share of the sky glow overhead");
            press(browser, ".app-harm__more", "all directions");
            browser.awaitText(By.tagName("h1"), "The sky at VA8 Observatory");
            assertThat(browser.driver().getCurrentUrl()).contains("hour=late");
        }
    }

    private static void press(Browser browser, String part, String link) {
        browser.driver().findElements(By.cssSelector(part)).stream()
                .flatMap(found -> found.findElements(By.linkText(link)).stream())
                .findFirst()
                .orElseThrow()
                .sendKeys(Keys.ENTER);
    }

    @Test
    void openTheWorkingThatANumberLeadsTo() {
        Project project = Reviewed.sample(projects, "ferrin-lane");
        try (Browser browser = Browser.on(port)) {
            browser.open("/projects/" + project.id() + "/seen/VA8");
            for (WebElement door : browser.driver().findElements(By.cssSelector(".app-harm__figure .app-door"))) {
                String id = Objects.requireNonNull(door.getDomAttribute("href")).substring(1);
                door.sendKeys(Keys.ENTER);
                browser.awaitAddress("#" + id);
                WebElement working = browser.driver().findElement(By.id(id));
                assertThat(working.isDisplayed()).isTrue();
                assertThat(working.getText()).contains("Sources:");
            }
        }
    }
}
