package skytally.web;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.springframework.boot.test.web.server.LocalServerPort;

@ServerTest
@DisplayName("The headers of every answer")
class HeadersPageTest {

    @LocalServerPort
    private int port;

    @ParameterizedTest(name = "GET {0}")
    @ValueSource(
            strings = {
                "/test/form",
                "/test/fails",
                "/there-is-no-such-page",
                "/actuator/health",
                "/actuator/env",
                "/favicon.svg",
                "/a//b"
            })
    void boundWhatABrowserMayDo(String path) throws Exception {
        Wire.Answer answer = Wire.get(port, path).send();

        assertThat(answer.header("Content-Security-Policy"))
                .isEqualTo("default-src 'none'; style-src 'self'; font-src 'self'; img-src 'self'; form-action 'self';"
                        + " base-uri 'none'; frame-ancestors 'self'");
        assertThat(answer.header("X-Content-Type-Options")).isEqualTo("nosniff");
        assertThat(answer.header("X-Frame-Options")).isEqualTo("SAMEORIGIN");
        assertThat(answer.header("Referrer-Policy")).isEqualTo("same-origin");
        assertThat(answer.header("Permissions-Policy"))
                .isEqualTo("camera=(), display-capture=(), geolocation=(), microphone=(), payment=(), usb=()");
        assertThat(answer.header("Cross-Origin-Opener-Policy")).isEqualTo("same-origin");
        assertThat(answer.header("Cross-Origin-Resource-Policy")).isEqualTo("same-origin");
        assertThat(answer.headers()).doesNotContainKeys("server", "x-powered-by");
    }

    @Test
    void areThereWhenTheServerAnswersByItself() throws Exception {
        Wire.Answer answer = Wire.get(port, "/<>").send();

        assertThat(answer.status()).isEqualTo(400);
        assertThat(answer.header("Content-Security-Policy")).isEqualTo(PageHeadersFilter.CONTENT_SECURITY_POLICY);
        assertThat(answer.header("X-Content-Type-Options")).isEqualTo("nosniff");
    }

    @Test
    void keepAPageForAsLongAsItIsShownOnly() throws Exception {
        assertThat(Wire.get(port, "/test/form").send().header("Cache-Control")).isEqualTo("no-cache");
    }

    @Test
    void startNoSession() throws Exception {
        assertThat(Wire.get(port, "/test/form").send().cookies())
                .singleElement()
                .asString()
                .startsWith("skytally-form=")
                .contains("Path=/", "HttpOnly", "SameSite=Strict");
        assertThat(Wire.get(port, "/test/plain").send().cookies()).isEmpty();
    }
}
