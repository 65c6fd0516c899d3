package skytally.browser;

import com.deque.html.axecore.results.Results;
import com.deque.html.axecore.results.Rule;
import com.deque.html.axecore.selenium.AxeBuilder;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.Base64;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.stream.Stream;
import org.openqa.selenium.By;
import org.openqa.selenium.OutputType;
import org.openqa.selenium.StaleElementReferenceException;
import org.openqa.selenium.WebDriverException;
import org.openqa.selenium.chrome.ChromeDriver;
import org.openqa.selenium.chrome.ChromeDriverService;
import org.openqa.selenium.chrome.ChromeOptions;
import org.openqa.selenium.print.PageSize;
import org.openqa.selenium.print.PrintOptions;
import org.openqa.selenium.support.ui.ExpectedConditions;
import org.openqa.selenium.support.ui.WebDriverWait;

/**
 * Headless Chromium on the pages of one running server, with a profile of its own that goes when it is closed.
 * Its clock, language and fonts are the machine's; its width is asked for.
 */
public final class Browser implements AutoCloseable {

    static final Path CHROMIUM = Path.of("/usr/bin/chromium");
    static final Path DRIVER = Path.of("/usr/bin/chromedriver");

    /** Wide enough for all twelve columns. */
    public static final int WIDE = 1280;

    /** A telephone held upright. */
    public static final int NARROW = 390;

    private static final int HEIGHT = 900;
    private static final String OF_ANOTHER_PAGE = "does not belong to the document";
    private static final Duration PATIENCE = Duration.ofSeconds(60);

    private final int port;
    private final Path profile;
    private final ChromeDriver driver;

    private Browser(int port, boolean scripts) {
        this.port = port;
        try {
            profile = Files.createTempDirectory("skytally-browser");
        } catch (IOException cannot) {
            throw new UncheckedIOException(cannot);
        }
        ChromeOptions options = new ChromeOptions();
        options.setBinary(CHROMIUM.toFile());
        options.addArguments(
                "--headless=new",
                "--no-sandbox",
                "--disable-gpu",
                "--disable-dev-shm-usage",
                "--disable-quic",
                "--no-first-run",
                "--disable-background-networking",
                "--disable-component-update",
                "--disable-sync",
                "--hide-scrollbars",
                "--lang=en",
                "--user-data-dir=" + profile);
        if (!scripts) {
            options.setExperimentalOption("prefs", Map.of("profile.managed_default_content_settings.javascript", 2));
        }
        driver = new ChromeDriver(
                new ChromeDriverService.Builder()
                        .usingDriverExecutable(DRIVER.toFile())
                        .build(),
                options);
        driver.manage().timeouts().pageLoadTimeout(PATIENCE).scriptTimeout(PATIENCE.multipliedBy(3));
        width(WIDE);
    }

    /** A browser on the server at that port of this computer. */
    public static Browser on(int port) {
        return new Browser(port, true);
    }

    /** The same, for a person who has switched scripts off. */
    public static Browser withoutScripts(int port) {
        return new Browser(port, false);
    }

    /** Opens a page by its path and query. */
    public void open(String path) {
        driver.get(address(path));
    }

    /** The whole address of a path on this server. */
    public String address(String path) {
        return "http://localhost:" + port + path;
    }

    /** The driver, for everything a person does: finding, typing, pressing keys. */
    public ChromeDriver driver() {
        return driver;
    }

    /** Waits until something on the page has that text in it: after a press of a key, the next page is on its way. */
    public void awaitText(By where, String text) {
        new WebDriverWait(driver, PATIENCE)
                .ignoring(StaleElementReferenceException.class)
                .until(page -> hasText(where, text));
    }

    /** Between two pages the driver may find an element of the one and ask the other for its text. */
    private Boolean hasText(By where, String text) {
        try {
            return ExpectedConditions.textToBePresentInElementLocated(where, text)
                    .apply(driver);
        } catch (WebDriverException failed) {
            if (String.valueOf(failed.getMessage()).contains(OF_ANOTHER_PAGE)) {
                return false;
            }
            throw failed;
        }
    }

    /** Waits until the address has that in it. */
    public void awaitAddress(String part) {
        new WebDriverWait(driver, PATIENCE).until(ExpectedConditions.urlContains(part));
    }

    /** Makes the page that many CSS pixels wide. */
    public void width(int pixels) {
        device(pixels, HEIGHT);
    }

    /** Whether some of the page lies beyond its side, so that it could be scrolled there. */
    public boolean scrollsSideways() {
        return number("cssContentSize") > number("cssLayoutViewport");
    }

    /** A picture of the whole page at that width, in the build directory's {@code screenshots}. */
    public Path screenshot(String name, int widthPixels) {
        width(widthPixels);
        device(widthPixels, (int) Math.ceil(measure("cssContentSize", "height")));
        Path file = write(name + ".png", driver.getScreenshotAs(OutputType.BYTES));
        width(widthPixels);
        return file;
    }

    private static Path write(String name, byte[] content) {
        try {
            Path directory = Path.of(System.getProperty("skytally.build-directory", "target"), "screenshots");
            return Files.write(Files.createDirectories(directory).resolve(name), content);
        } catch (IOException cannot) {
            throw new UncheckedIOException(cannot);
        }
    }

    /** The papers that pages are printed on. */
    public enum Paper {
        /** 210 by 297 mm. */
        A4(29.7, 21.0),
        /** 8.5 by 11 inches. */
        LETTER(27.94, 21.59);

        private final PageSize size;

        Paper(double heightCm, double widthCm) {
            size = new PageSize(heightCm, widthCm);
        }
    }

    /** The page as it is printed, as a PDF, also left beside the pictures. */
    public byte[] print(String name, Paper paper) {
        PrintOptions options = new PrintOptions();
        options.setPageSize(paper.size);
        byte[] pdf = Base64.getDecoder().decode(driver.print(options).getContent());
        write(name + ".pdf", pdf);
        return pdf;
    }

    /**
     * What axe finds against the page, one line for each element; none is the aim. Needs scripts, which the page's
     * own policy does not take from the driver.
     */
    public List<String> accessibilityFaults() {
        return faults(new AxeBuilder());
    }

    /** The same of all but the contrast of text, which is the same at every width. */
    public List<String> layoutFaults() {
        return faults(new AxeBuilder().disableRules(List.of("color-contrast")));
    }

    /** The same of nothing but the contrast of text, which is all that another theme can change. */
    public List<String> contrastFaults() {
        return faults(new AxeBuilder().withRules(List.of("color-contrast")));
    }

    /**
     * What axe finds at a width and in a theme, each rule looked at where it can differ: all of them by day on a wide page,
     * all but contrast by day on a narrow one, and contrast alone in a theme that changes colours and nothing else.
     */
    public List<String> faultsAt(int width, boolean day) {
        if (!day) {
            return contrastFaults();
        }
        return width == WIDE ? accessibilityFaults() : layoutFaults();
    }

    private List<String> faults(AxeBuilder axe) {
        Results results = axe.analyze(driver);
        if (results.isErrored()) {
            throw new IllegalStateException("axe could not look at the page: " + results.getErrorMessage());
        }
        return results.getViolations().stream().flatMap(Browser::lines).toList();
    }

    private static Stream<String> lines(Rule rule) {
        return rule.getNodes().stream()
                .map(node ->
                        rule.getId() + ": " + rule.getHelp() + ": " + node.getHtml() + " " + node.getFailureSummary());
    }

    private void device(int width, int height) {
        driver.executeCdpCommand(
                "Emulation.setDeviceMetricsOverride",
                Map.of("width", width, "height", height, "deviceScaleFactor", 1, "mobile", false));
    }

    private double number(String box) {
        return measure(box, box.equals("cssContentSize") ? "width" : "clientWidth");
    }

    /** Asked of the browser, not of the page, so that it works with scripts off. */
    private double measure(String box, String side) {
        Map<?, ?> metrics = driver.executeCdpCommand("Page.getLayoutMetrics", Map.of());
        Map<?, ?> found = Objects.requireNonNull((Map<?, ?>) metrics.get(box), box);
        return ((Number) Objects.requireNonNull(found.get(side), side)).doubleValue();
    }

    @Override
    public void close() {
        driver.quit();
        try (Stream<Path> left = Files.walk(profile)) {
            for (Path file : left.sorted(Comparator.reverseOrder()).toList()) {
                Files.deleteIfExists(file);
            }
        } catch (IOException cannot) {
            throw new UncheckedIOException("The browser's profile could not be removed", cannot);
        }
    }
}
