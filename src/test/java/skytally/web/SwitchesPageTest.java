package skytally.web;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.springframework.boot.test.web.server.LocalServerPort;

@ServerTest
@DisplayName("The switches")
class SwitchesPageTest {

    @LocalServerPort
    private int port;

    @ParameterizedTest(name = "?{0} with cookie {1}: {2}")
    @CsvSource({
        "'', '', metric day",
        "units=us, '', us day",
        "units=us&theme=dark, '', us dark",
        "theme=telescope, '', metric telescope",
        "'', dark, metric dark",
        "theme=day, dark, metric day",
        "theme=TELESCOPE, dark, metric dark",
        "theme=sepia, '', metric day",
        "units=furlongs, '', metric day",
        "'', <sepia>, metric day",
        "theme=dark&theme=telescope, '', metric dark"
    })
    void areThoseOfTheAddressThenOfTheBrowserThenPlain(String query, String cookie, String inForce) throws Exception {
        Wire request = Wire.get(port, "/test/switches?" + query);
        if (!cookie.isEmpty()) {
            request.header("Cookie", "skytally-theme=" + cookie);
        }

        assertThat(request.send().body()).isEqualTo(inForce);
    }

    @Test
    void areLinksThatKeepTheRestOfTheAddress() throws Exception {
        String body = Wire.get(port, "/test/form?count=24&note=a%20%26%20%C3%BC&units=us&units=metric&empty=")
                .send()
                .body();

        assertThat(body)
                .contains("href=\"?count=24&amp;note=a%20%26%20%C3%BC&amp;empty=&amp;units=metric\"")
                .contains(
                        "href=\"?count=24&amp;note=a%20%26%20%C3%BC&amp;units=us&amp;units=metric&amp;empty=&amp;theme=dark\"")
                .containsPattern("aria-current=\"true\"[^>]*>feet, footcandles<")
                .containsPattern("aria-current=\"true\"[^>]*>day<");
        assertThat(body.split("aria-current=\"true\"", -1)).hasSize(3);
    }

    @Test
    void areLinksOnAPageWithoutAQueryToo() throws Exception {
        assertThat(Wire.get(port, "/test/form").send().body())
                .contains("href=\"?units=us\"", "href=\"?theme=telescope\"");
    }

    @Test
    void cannotBreakOutOfTheirLinks() throws Exception {
        assertThat(Wire.get(port, "/test/form?a='onmouseover='x&b=%22%3E%3Cb%3E")
                        .send()
                        .body())
                .contains("b=%22%3E%3Cb%3E&amp;units=us")
                .doesNotContain("'onmouseover='", "\"><b>");
    }

    @Test
    void rememberTheThemeThatWasSwitchedTo() throws Exception {
        assertThat(Wire.get(port, "/test/plain?theme=dark").send().cookies())
                .singleElement()
                .asString()
                .startsWith("skytally-theme=dark; Path=/; Max-Age=31536000;")
                .contains("HttpOnly", "SameSite=Lax");
    }

    @ParameterizedTest(name = "?{0}")
    @ValueSource(strings = {"", "theme=sepia", "units=us"})
    void rememberNothingElse(String query) throws Exception {
        assertThat(Wire.get(port, "/test/plain?" + query).send().cookies()).isEmpty();
    }

    @ParameterizedTest(name = "Sec-Fetch-Site: {0}")
    @ValueSource(strings = {"cross-site", "none"})
    void doNotLetAQuotedAddressChangeWhatIsRemembered(String site) throws Exception {
        Wire.Answer answer = Wire.get(port, "/test/plain?theme=dark")
                .header("Sec-Fetch-Site", site)
                .header("Sec-Fetch-Mode", "navigate")
                .header("Sec-Fetch-Dest", "document")
                .send();

        assertThat(answer.body()).contains("data-theme=\"dark\"");
        assertThat(answer.cookies()).isEmpty();
    }

    @ParameterizedTest(name = "{0}")
    @ValueSource(
            strings = {"/test/plain", "/there-is-no-such-page", "/test/fails", "/test/plain?a=%zz", "/actuator/env"})
    void holdOnEveryPageAndOnThoseOfFailures(String path) throws Exception {
        assertThat(Wire.get(port, path)
                        .header("Cookie", "skytally-theme=telescope")
                        .send()
                        .body())
                .contains("data-theme=\"telescope\"");
    }
}
