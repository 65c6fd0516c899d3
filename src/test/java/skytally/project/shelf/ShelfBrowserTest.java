package skytally.project.shelf;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.openqa.selenium.By;
import org.openqa.selenium.Keys;
import org.springframework.boot.test.context.SpringBootTest;
import org.springframework.boot.test.web.server.LocalServerPort;
import skytally.browser.Browser;
import skytally.browser.InBrowser;

@InBrowser
@SpringBootTest(webEnvironment = SpringBootTest.WebEnvironment.RANDOM_PORT)
@DisplayName("Projects, in a browser")
class ShelfBrowserTest {

    @LocalServerPort
    private int port;

    @Test
    void openFromTheStartPageByKeyboardWithScriptsOff() {
        try (Browser browser = Browser.withoutScripts(port)) {
            for (String title : List.of("Ferrin Lane recreation ground", "Sillow Gateway", "Ostrel Valley")) {
                browser.open("/");
                browser.driver().findElement(By.linkText("Projects")).sendKeys(Keys.ENTER);
                browser.awaitText(By.tagName("h1"), "Projects");
                browser.driver()
                        .findElement(By.xpath("//li[contains(., '" + title + "')]//button"))
                        .sendKeys(Keys.ENTER);
                browser.awaitText(By.tagName("h1"), title);
                assertThat(browser.driver()
                                .findElement(By.cssSelector("[role=status]"))
                                .getText())
                        .isEqualTo("The sample is opened as a project of its own.");
            }
        }
    }

    @Test
    void keepAFirstLookAndTakeBackItsNewTitle() {
        try (Browser browser = Browser.on(port)) {
            browser.open("/?count=24&lumens=5200&distanceM=300");
            browser.driver().findElement(By.id("title")).submit();
            browser.awaitText(By.tagName("h1"), "24 lights of 5 200 lm, 300 m away");
            browser.driver().findElement(By.id("title")).clear();
            browser.driver().findElement(By.id("title")).sendKeys("By the meadow", Keys.ENTER);
            browser.awaitText(By.tagName("h1"), "By the meadow");
            browser.driver().findElement(By.linkText("History and undo")).sendKeys(Keys.ENTER);
            browser.awaitText(By.tagName("h1"), "History");
            browser.driver()
                    .findElement(By.xpath("//button[.='Take back save 2']"))
                    .click();
            browser.awaitText(By.cssSelector("[role=status]"), "The save is taken back.");
            assertThat(browser.driver().findElement(By.tagName("main")).getText())
                    .contains("Taken back by save 3.");
        }
    }

    @Test
    void tellALongSaveOnAPageOfItsOwn() {
        try (Browser browser = Browser.on(port)) {
            browser.open("/projects");
            browser.driver()
                    .findElement(By.xpath("//li[contains(., 'Ostrel')]//button"))
                    .sendKeys(Keys.ENTER);
            browser.awaitText(By.tagName("h1"), "Ostrel");
            browser.driver().findElement(By.linkText("History and undo")).sendKeys(Keys.ENTER);
            browser.awaitText(By.tagName("h1"), "History");
            browser.driver()
                    .findElement(By.partialLinkText("changes of save 1"))
                    .sendKeys(Keys.ENTER);
            browser.awaitText(By.tagName("h1"), "Save 1");
            browser.screenshot("projects-step", Browser.NARROW);
            assertThat(browser.accessibilityFaults()).isEmpty();
            assertThat(browser.scrollsSideways()).isFalse();
        }
    }

    @Test
    void tellWhatIsWrongWithAFormWhereItIs() {
        try (Browser browser = Browser.on(port)) {
            for (int width : new int[] {Browser.WIDE, Browser.NARROW}) {
                browser.width(width);
                browser.open("/projects");
                browser.driver().findElement(By.xpath("//button[.='Open it']")).sendKeys(Keys.ENTER);
                browser.awaitText(By.cssSelector("[role=alert]"), "Choose a project file");
                browser.screenshot("projects-fault-" + width, width);
                assertThat(browser.accessibilityFaults()).isEmpty();
                assertThat(browser.scrollsSideways()).isFalse();
            }
        }
    }
}
