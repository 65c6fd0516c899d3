package skytally.web;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.util.Locale;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.openqa.selenium.By;
import org.openqa.selenium.Keys;
import org.springframework.boot.test.web.server.LocalServerPort;
import skytally.browser.Browser;
import skytally.browser.InBrowser;

@InBrowser
@ServerTest
@DisplayName("A failure, in a browser")
class ErrorsBrowserTest {

    @LocalServerPort
    private int port;

    @Test
    void canBeReadWideAndNarrowInEveryTheme() {
        try (Browser browser = Browser.on(port)) {
            for (Switches.Theme theme : Switches.Theme.values()) {
                for (int width : new int[] {Browser.WIDE, Browser.NARROW}) {
                    browser.width(width);
                    browser.open("/there-is-no-such-page?theme=" + theme.word());
                    browser.screenshot("error-404-" + width + "-" + theme.word(), width);

                    assertThat(browser.driver().findElement(By.tagName("h1")).getText())
                            .isEqualTo("There is no such page");
                    assertThat(browser.faultsAt(width, theme == Switches.Theme.DAY))
                            .isEmpty();
                    assertThat(browser.scrollsSideways()).isFalse();
                }
            }
        }
    }

    @Test
    void atAFieldCanBeReadWideAndNarrow() {
        try (Browser browser = Browser.on(port)) {
            for (int width : new int[] {Browser.WIDE, Browser.NARROW}) {
                browser.width(width);
                browser.open("/test/form?heightM=-6");
                browser.screenshot("form-faults-" + width, width);

                assertThat(browser.accessibilityFaults()).isEmpty();
                assertThat(browser.scrollsSideways()).isFalse();
            }
        }
    }

    @Test
    void keepsTheThemeThatWasSwitchedTo() {
        try (Browser browser = Browser.on(port)) {
            browser.open("/test/form");
            browser.driver().findElement(By.linkText("telescope")).click();
            browser.awaitAddress("theme=telescope");
            browser.open("/there-is-no-such-page");

            assertThat(browser.driver().findElement(By.tagName("html")).getDomAttribute("data-theme"))
                    .isEqualTo("telescope");
        }
    }

    @Test
    void ofAnExpiredFormIsMendedByOneKeyWithScriptsOff() {
        try (Browser browser = Browser.withoutScripts(port)) {
            browser.open("/test/form");
            browser.driver().findElement(By.name("heightM")).sendKeys("six \"m\" <b>");
            browser.driver().manage().deleteAllCookies();
            browser.driver().findElement(By.cssSelector("main button")).click();

            browser.awaitText(By.tagName("h1"), "The form had expired");
            browser.screenshot("form-expired", Browser.WIDE);
            browser.driver().findElement(By.cssSelector("main button")).sendKeys(Keys.ENTER);

            browser.awaitText(By.tagName("body"), "heightM=");
            assertThat(browser.driver().findElement(By.tagName("body")).getText())
                    .contains("heightM=[six \"m\" <b>]", "from=[here]");
        }
    }

    @Test
    void canBeReadByKeyboardAndOnPaper() {
        try (Browser browser = Browser.on(port)) {
            browser.open("/there-is-no-such-page");

            for (Browser.Paper paper : Browser.Paper.values()) {
                byte[] printed = browser.print("error-404-" + paper.name().toLowerCase(Locale.ROOT), paper);
                assertThat(new String(printed, 0, 5, StandardCharsets.US_ASCII)).isEqualTo("%PDF-");
            }

            browser.driver().switchTo().activeElement().sendKeys(Keys.TAB);
            assertThat(browser.driver().switchTo().activeElement().getText()).isEqualTo("Skip to the page");
            browser.driver().switchTo().activeElement().sendKeys(Keys.ENTER);
            browser.awaitAddress("#main");
        }
    }
}
