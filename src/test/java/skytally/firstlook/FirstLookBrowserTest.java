package skytally.firstlook;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Objects;
import java.util.regex.Pattern;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.openqa.selenium.By;
import org.openqa.selenium.Keys;
import org.openqa.selenium.WebElement;
import org.openqa.selenium.support.ui.Select;
import org.springframework.boot.test.web.server.LocalServerPort;
import skytally.browser.Browser;
import skytally.browser.InBrowser;
import skytally.web.ServerTest;

@InBrowser
@ServerTest
@DisplayName("The first look, in a browser")
class FirstLookBrowserTest {

    private static final String ANSWER = "/?count=24&lumens=5200&distanceM=800";
    private static final String ERRORS =
            "/?count=abc&lumens=&spectralClass=moonlight&tiltDeg=-5&distanceM=%3Cb%3E&glareAngleDeg=0&units=us";
    private static final By ANSWER_HEAD = By.id("answers");

    @LocalServerPort
    private int port;

    @Test
    void goesFromTypingToTheAnswerOnAPlainAddress() {
        try (Browser browser = Browser.on(port)) {
            browser.open("/");
            type(browser, "count", "24");
            type(browser, "lumens", "5 200,5");
            type(browser, "distanceM", "1234");
            new Select(find(browser, "spectralClass")).selectByValue("hps");
            find(browser, By.cssSelector("form .app-button--main")).click();

            browser.awaitText(ANSWER_HEAD, "What you would see, 1 234 m away");
            assertThat(browser.driver().getCurrentUrl())
                    .isEqualTo(browser.address("/?count=24&lumens=5200.5&spectralClass=hps&distanceM=1234"));
            assertThat(find(browser, "lumens").getDomProperty("value")).isEqualTo("5\u00a0200.5");
            assertThat(new Select(find(browser, "spectralClass"))
                            .getFirstSelectedOption()
                            .getText())
                    .isEqualTo("High-pressure sodium (standard)");
            assertThat(find(browser, By.className("app-key-line__figure")).getText())
                    .contains("lx");
        }
    }

    @Test
    void tiltsTheLightsByAButtonAndHangsThemBack() {
        try (Browser browser = Browser.on(port)) {
            browser.open(ANSWER);
            find(browser, By.cssSelector("button[name=tiltTo]")).click();
            browser.awaitAddress("tiltDeg=15");
            assertThat(new Select(find(browser, "tiltDeg"))
                            .getFirstSelectedOption()
                            .getText())
                    .isEqualTo("tilted 15° toward me");
            find(browser, By.cssSelector("button[name=tiltTo]")).click();
            browser.awaitText(By.cssSelector("button[name=tiltTo]"), "Tilt it 15° toward me");
            assertThat(browser.driver().getCurrentUrl()).doesNotContain("tilt");
        }
    }

    @Test
    void isFilledInByKeyboardAloneWithARingAroundWhereOneIs() {
        try (Browser browser = Browser.on(port)) {
            browser.open("/");
            focused(browser).sendKeys(Keys.TAB);
            assertThat(focused(browser).getText()).isEqualTo("Skip to the page");
            for (int i = 0; i < 10 && !"count".equals(focused(browser).getDomAttribute("id")); i++) {
                assertRing(focused(browser));
                focused(browser).sendKeys(Keys.TAB);
            }
            assertThat(focused(browser).getDomAttribute("id")).isEqualTo("count");
            assertRing(focused(browser));
            focused(browser).sendKeys(Keys.chord(Keys.CONTROL, "a"), "12", Keys.TAB);
            assertThat(focused(browser).getDomAttribute("id")).isEqualTo("lumens");
            focused(browser).sendKeys(Keys.TAB);
            assertThat(focused(browser).getDomAttribute("id")).isEqualTo("spectralClass");
            assertRing(focused(browser));
            focused(browser).sendKeys(Keys.TAB);
            focused(browser).sendKeys(Keys.TAB);
            assertThat(focused(browser).getDomAttribute("id")).isEqualTo("mountingHeightM");
            focused(browser).sendKeys(Keys.TAB);
            assertThat(focused(browser).getDomAttribute("id")).isEqualTo("distanceM");
            focused(browser).sendKeys(Keys.chord(Keys.CONTROL, "a"), "300", Keys.ENTER);

            browser.awaitText(ANSWER_HEAD, "What you would see, 300 m away");
            assertThat(browser.driver().getCurrentUrl()).contains("count=12", "distanceM=300");

            WebElement door = find(browser, By.className("app-door"));
            door.sendKeys(Keys.ENTER);
            browser.awaitAddress("#w-");
        }
    }

    @Test
    void opensTheWorkingThatANumberLeadsTo() {
        try (Browser browser = Browser.on(port)) {
            browser.open(ANSWER);
            for (WebElement door : browser.driver().findElements(By.className("app-door"))) {
                String id = Objects.requireNonNull(door.getDomAttribute("href")).substring(1);
                door.sendKeys(Keys.ENTER);
                browser.awaitAddress("#" + id);
                WebElement working = find(browser, By.id(id));
                assertThat(working.findElement(By.xpath("..")).getDomAttribute("open"))
                        .isNotNull();
                assertThat(working.isDisplayed()).isTrue();
                assertThat(working.getText()).contains("Sources:");
            }
        }
    }

    @Test
    void worksWithScriptsOff() {
        try (Browser browser = Browser.withoutScripts(port)) {
            browser.open("/");
            type(browser, "count", "many");
            type(browser, "distanceM", "300");
            find(browser, By.cssSelector("form .app-button--main")).click();

            browser.awaitText(By.id("errors-head"), "There is a problem");
            assertThat(find(browser, "count").getDomAttribute("value")).isEqualTo("many");
            assertThat(find(browser, "distanceM").getDomAttribute("value")).isEqualTo("300");
            type(browser, "count", "24");
            find(browser, By.cssSelector("form .app-button--main")).click();
            browser.awaitText(ANSWER_HEAD, "What you would see, 300 m away");
        }
    }

    @Test
    void leadsFromEachFaultToItsField() {
        try (Browser browser = Browser.on(port)) {
            browser.open(ERRORS);
            assertThat(find(browser, "count").getDomProperty("value")).isEqualTo("abc");
            assertThat(find(browser, "distanceM").getDomProperty("value")).isEqualTo("<b>");
            find(browser, By.cssSelector(".app-errors a[href='#distanceM']")).click();
            browser.awaitAddress("#distanceM");

            assertThat(focused(browser).getDomAttribute("id")).isEqualTo("distanceM");
            focused(browser).sendKeys(Keys.chord(Keys.CONTROL, "a"), "1000", Keys.ENTER);
            browser.awaitAddress("distanceM=304.8");
            assertThat(find(browser, "distanceM").getDomProperty("value")).isEqualTo("1000");
            assertThat(find(browser, By.className("app-errors")).getText())
                    .contains("How many lights")
                    .doesNotContain("Distance");
        }
    }

    @ParameterizedTest(name = "{0}")
    @ValueSource(strings = {"day", "dark", "telescope"})
    void canBeReadByEveryoneWideAndNarrow(String theme) {
        try (Browser browser = Browser.on(port)) {
            for (int width : new int[] {Browser.WIDE, Browser.NARROW}) {
                browser.width(width);
                browser.open(ANSWER + "&theme=" + theme);
                Path picture = browser.screenshot("first-look-" + width + "-" + theme, width);
                assertThat(picture.toFile().length()).isBetween(30_000L, 3_000_000L);
                assertThat(browser.scrollsSideways()).isFalse();
                assertThat(browser.faultsAt(width, theme.equals("day"))).isEmpty();

                browser.open(ERRORS + "&theme=" + theme);
                browser.screenshot("first-look-faults-" + width + "-" + theme, width);
                assertThat(browser.scrollsSideways()).isFalse();
                assertThat(browser.faultsAt(width, theme.equals("day"))).isEmpty();
            }
        }
    }

    @Test
    void staysOnANarrowPageWithEveryWorkingOpen() {
        try (Browser browser = Browser.on(port)) {
            browser.width(Browser.NARROW);
            browser.open("/?count=20000&lumens=1234567.891&distanceM=1234.567&units=us&theme=day");
            browser.driver()
                    .findElements(By.cssSelector("details:not([open]) > summary"))
                    .forEach(bar -> bar.sendKeys(Keys.ENTER));
            browser.screenshot("first-look-open-" + Browser.NARROW, Browser.NARROW);

            assertThat(browser.driver().findElements(By.cssSelector("details:not([open])")))
                    .isEmpty();
            assertThat(browser.scrollsSideways()).isFalse();
            assertThat(browser.accessibilityFaults()).isEmpty();
        }
    }

    @ParameterizedTest(name = "{0}")
    @ValueSource(strings = {"day", "telescope"})
    void prints(String theme) throws Exception {
        try (Browser browser = Browser.on(port)) {
            browser.open(ANSWER + "&theme=" + theme);
            for (Browser.Paper paper : Browser.Paper.values()) {
                String name = "first-look-" + paper.name().toLowerCase(Locale.ROOT) + "-" + theme;
                byte[] pdf = browser.print(name, paper);
                String insides = new String(pdf, StandardCharsets.ISO_8859_1);

                assertThat(insides).startsWith("%PDF-");
                assertThat(Pattern.compile("/Type\\s*/Page\\b")
                                .matcher(insides)
                                .results()
                                .count())
                        .isBetween(2L, 8L);
            }
        }
    }

    private static void assertRing(WebElement element) {
        assertThat(element.getCssValue("outline-style")).isNotEqualTo("none");
        assertThat(Double.parseDouble(element.getCssValue("outline-width").replace("px", "")))
                .isGreaterThanOrEqualTo(2);
    }

    private static WebElement focused(Browser browser) {
        return browser.driver().switchTo().activeElement();
    }

    private static WebElement find(Browser browser, String id) {
        return find(browser, By.id(id));
    }

    private static WebElement find(Browser browser, By where) {
        return browser.driver().findElement(where);
    }

    private static void type(Browser browser, String id, String text) {
        WebElement field = find(browser, id);
        field.clear();
        field.sendKeys(text);
    }
}
