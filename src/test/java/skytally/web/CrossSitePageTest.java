package skytally.web;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.springframework.boot.test.web.server.LocalServerPort;

@ServerTest
@DisplayName("A request from another site")
class CrossSitePageTest {

    @LocalServerPort
    private int port;

    @Test
    void mayFollowALinkToAWholePage() throws Exception {
        assertThat(Wire.get(port, "/test/plain")
                        .header("Sec-Fetch-Site", "cross-site")
                        .header("Sec-Fetch-Mode", "navigate")
                        .header("Sec-Fetch-Dest", "document")
                        .send()
                        .status())
                .isEqualTo(200);
    }

    @ParameterizedTest(name = "{0} {1} {2}")
    @CsvSource({
        "cross-site, no-cors, image",
        "cross-site, no-cors, script",
        "cross-site, cors, empty",
        "cross-site, navigate, iframe",
        "cross-site, navigate, embed",
        "same-site, no-cors, image",
        "same-site, navigate, iframe"
    })
    void mayNotTakeAPageIn(String site, String mode, String destination) throws Exception {
        Wire.Answer answer = Wire.get(port, "/test/plain")
                .header("Sec-Fetch-Site", site)
                .header("Sec-Fetch-Mode", mode)
                .header("Sec-Fetch-Dest", destination)
                .send();

        assertThat(answer.status()).isEqualTo(403);
        assertThat(answer.body()).contains("Sent from another site").doesNotContain("Plain");
    }

    @ParameterizedTest(name = "{0}")
    @ValueSource(strings = {"cross-site", "same-site", "anything-else"})
    void mayNotSendAForm(String site) throws Exception {
        refused(form().header("Sec-Fetch-Site", site)
                .header("Sec-Fetch-Mode", "navigate")
                .header("Sec-Fetch-Dest", "document"));
    }

    @ParameterizedTest(name = "Origin: {0}")
    @ValueSource(strings = {"http://evil.example", "null", "http://localhost:1", "http://localhost", "not an address"})
    void isKnownByItsOriginInABrowserThatDoesNotSayMore(String origin) throws Exception {
        refused(form().header("Origin", origin));
    }

    @ParameterizedTest(name = "Referer: {0}")
    @ValueSource(strings = {"http://evil.example/page", "http://localhost.evil.example/", "about:blank"})
    void isKnownByItsRefererInABrowserThatDoesNotSayMore(String referer) throws Exception {
        refused(form().header("Referer", referer));
    }

    @Test
    void isRefusedForItsOriginWhateverElseItSays() throws Exception {
        refused(form().header("Sec-Fetch-Site", "same-origin").header("Origin", "http://evil.example"));
    }

    @ParameterizedTest(name = "{0}")
    @ValueSource(strings = {"PUT", "DELETE", "PATCH", "OPTIONS"})
    void mayNotUseAnyOtherMethod(String method) throws Exception {
        assertThat(Wire.of(port, method, "/test/plain")
                        .header("Sec-Fetch-Site", "cross-site")
                        .header("Sec-Fetch-Mode", "navigate")
                        .header("Sec-Fetch-Dest", "document")
                        .send()
                        .status())
                .isEqualTo(403);
    }

    @Test
    void isNotWhatAPageOfOursSends() throws Exception {
        Wire.Answer answer = form().header("Sec-Fetch-Site", "same-origin")
                .header("Origin", "http://localhost:" + port)
                .header("Referer", "http://localhost:" + port + "/test/form")
                .send();

        // Only the token is missing, so it comes back to be sent again.
        assertThat(answer.status()).isEqualTo(403);
        assertThat(answer.body()).contains("Send it again");
    }

    private Wire form() {
        return Wire.post(port, "/test/form", "typed=given-back");
    }

    private static void refused(Wire request) throws Exception {
        Wire.Answer answer = request.send();

        assertThat(answer.status()).isEqualTo(403);
        assertThat(answer.body())
                .contains("Sent from another site")
                .doesNotContain("Send it again", "given-back", "_csrf");
        assertThat(answer.cookies()).isEmpty();
    }
}
