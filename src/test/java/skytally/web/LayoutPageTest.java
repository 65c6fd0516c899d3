package skytally.web;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.regex.MatchResult;
import java.util.regex.Pattern;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.springframework.boot.test.web.server.LocalServerPort;

@ServerTest
@DisplayName("The layout")
class LayoutPageTest {

    private static final String CAUTION = "An aid to judgement. It does not replace a licensed lighting design, a site"
            + " measurement or the local code; where they differ, they decide.";

    @LocalServerPort
    private int port;

    @Test
    void wrapsAPageThatGivesItEverything() throws Exception {
        String body = Wire.get(port, "/test/form").send().body();

        assertThat(body)
                .startsWith("<!DOCTYPE html>")
                .contains("<title>A form · Skytally</title>", "<a class=\"app-skip\" href=\"#main\">")
                .contains("<span>Left.</span><span>Right.</span>")
                .contains("<dt>Project</dt><dd>A project</dd>", "<dt>Page</dt><dd>A form</dd>")
                .contains("<dt>Conditions</dt><dd>clear air</dd>", "<dt>Result fingerprint</dt><dd>3f9c</dd>")
                .contains(CAUTION)
                .containsPattern("aria-current=\"page\"[^>]*>First look<");
        assertThat(body.split("<main", -1)).hasSize(2);
        assertThat(body.split("<h1", -1)).hasSize(2);
    }

    @Test
    void wrapsAPageThatGivesItATitleOnly() throws Exception {
        assertThat(Wire.get(port, "/test/plain").send().body())
                .contains("<html lang=\"en\"", "data-theme=\"day\"", "<title>Plain · Skytally</title>", CAUTION)
                .contains("<dd>Not kept</dd>", "<dd>none</dd>", "<dd>none until kept</dd>")
                .doesNotContain("aria-current", "null", "th:");
    }

    @Test
    void hasNoScriptAndNoInlineStyle() throws Exception {
        assertThat(Wire.get(port, "/test/form").send().body())
                .doesNotContain("<script", "<style", " style=", " onclick=", "javascript:");
    }

    @Test
    void linksStyleSheetsByWhatIsInThemAndTheyMayBeKept() throws Exception {
        List<String> sheets = Pattern.compile("<link rel=\"(?:stylesheet|icon)\"[^>]*href=\"([^\"]+)\"")
                .matcher(Wire.get(port, "/test/plain").send().body())
                .results()
                .map(found -> found.group(1))
                .toList();

        assertThat(sheets).hasSizeGreaterThan(10).allSatisfy(address -> {
            assertThat(address).matches("/[a-z/-]+-[0-9a-f]{32}\\.(css|svg)");
            Wire.Answer sheet = Wire.get(port, address).send();
            assertThat(sheet.status()).isEqualTo(200);
            assertThat(sheet.header("Cache-Control")).isEqualTo("max-age=31536000");
        });
    }

    @Test
    void bringsItsFontsAlong() throws Exception {
        String page = Wire.get(port, "/test/plain").send().body();
        String tokens = Pattern.compile("/css/tokens-[0-9a-f]+\\.css")
                .matcher(page)
                .results()
                .map(MatchResult::group)
                .findFirst()
                .orElseThrow();

        List<String> fonts = Pattern.compile("url\\(\"(/fonts/[^\"]+)\"\\)")
                .matcher(Wire.get(port, tokens).send().body())
                .results()
                .map(found -> found.group(1))
                .toList();

        assertThat(fonts).hasSize(6).allSatisfy(address -> {
            assertThat(address).matches("/fonts/\\w+-[0-9a-f]{32}\\.ttf");
            assertThat(Wire.get(port, address).send().status()).isEqualTo(200);
        });
    }

    @Test
    void writesTheSameWhateverLanguageTheBrowserPrefers() throws Exception {
        Wire.Answer answer = Wire.get(port, "/test/plain")
                .header("Accept-Language", "de, fr;q=0.5")
                .send();

        assertThat(answer.header("Content-Language")).isEqualTo("en");
        assertThat(answer.body()).contains("First look");
    }

    @Test
    void showsAFieldWithItsUnitAndHint() throws Exception {
        assertThat(Wire.get(port, "/test/form?heightM=6.5").send().body())
                .contains("<label class=\"app-field__label\" for=\"heightM\">")
                .containsPattern("Height\\s+<span class=\"app-visually-hidden\">\\(m\\)</span>")
                .containsPattern(
                        "<input[^>]* aria-describedby=\"heightM-hint\"[^>]* id=\"heightM\" name=\"heightM\" value=\"6.5\"")
                .doesNotContain("aria-invalid", "There is a problem", "heightM-error");
    }

    @Test
    void showsAFaultAtTheTopAndAtItsFieldWithWhatWasTyped() throws Exception {
        String body = Wire.get(port, "/test/form?heightM=%3Cb%3E-6").send().body();

        assertThat(body)
                .contains("There is a problem", "<a href=\"#heightM\">")
                .contains("aria-describedby=\"heightM-hint heightM-error\"", "aria-invalid=\"true\"")
                .contains("value=\"&lt;b&gt;-6\"")
                .containsPattern(
                        "(?s)<p class=\"app-field__error\" id=\"heightM-error\">\\s*<span class=\"app-visually-hidden\">Error:</span>")
                .doesNotContain("<b>-6");
    }

    @Test
    void showsTheSameFaultsFromAListAndByThemselves() throws Exception {
        assertThat(Wire.get(port, "/test/sentence?heightM=-6").send().body())
                .containsPattern("<a href=\"#heightM\">must be greater than 0</a>")
                .containsPattern("(?s)id=\"heightM-error\">.*<span>must be greater than 0</span>");
        assertThat(Wire.get(port, "/test/sentence?heightM=6").send().body())
                .contains("value=\"6\"")
                .doesNotContain("There is a problem", "heightM-error", "_csrf");
    }
}
